import type { Outcome } from "@emberladder/furnace";

/** One piece of a band: a class and the values it covers; open ends are infinite. */
export interface ScaleSegment {
  outcome: Outcome | "stop";
  from: number;
  to: number;
}

interface Zone {
  outcome: Outcome;
  from: number;
  x0: number;
  x1: number;
  label: (format: (value: number) => string) => string;
}

const LEAST_ZONE = 38;

/**
 * Geometry of a band drawn `width` wide: where each zone lies, where the edges are labelled, where a value
 * lands. Linear between the outer edges of the band with a margin for what lies outside; a zone too narrow to
 * be seen is widened, so that every zone can be told apart.
 */
export function scaleOfBand(segments: readonly ScaleSegment[], width: number) {
  const edges = segments.slice(1).map((segment) => segment.from);
  const least = edges[0] ?? 0;
  const most = edges.at(-1) ?? least;
  const span = most - least || Math.abs(most) || 1;
  const weights = segments.map((segment) => {
    const low = Number.isFinite(segment.from) ? segment.from : least - span * 0.9;
    const high = Number.isFinite(segment.to) ? segment.to : most + span * 0.9;
    return Math.max(high - low, span * 0.02);
  });
  const total = weights.reduce((sum, weight) => sum + weight, 0);
  const raw = weights.map((weight) => Math.max(LEAST_ZONE, (weight / total) * width));
  const stretch = width / raw.reduce((sum, piece) => sum + piece, 0);
  let x = 0;
  const zones: Zone[] = segments.map((segment, index) => {
    const x0 = x;
    x += (raw[index] ?? 0) * stretch;
    return {
      outcome: segment.outcome === "stop" ? "fail" : segment.outcome,
      from: segment.from,
      x0,
      x1: x,
      label: (format) =>
        [
          Number.isFinite(segment.from) ? `from ${format(segment.from)}` : "",
          Number.isFinite(segment.to) ? `to ${format(segment.to)}` : "",
        ]
          .filter(Boolean)
          .join(" "),
    };
  });
  const place = (value: number): { x: number; beyond: -1 | 0 | 1 } => {
    const index = Math.max(
      0,
      segments.findIndex((segment) => value < segment.to || segment.to === Infinity),
    );
    const segment = segments[index];
    const zone = zones[index];
    if (!segment || !zone) return { x: 0, beyond: 0 };
    const low = Number.isFinite(segment.from) ? segment.from : least - span * 0.9;
    const high = Number.isFinite(segment.to) ? segment.to : most + span * 0.9;
    const share = (value - low) / (high - low || 1);
    const beyond = share < 0 ? -1 : share > 1 ? 1 : 0;
    return { x: zone.x0 + Math.min(1, Math.max(0, share)) * (zone.x1 - zone.x0), beyond };
  };
  return {
    zones,
    edges: zones
      .slice(1)
      .map((zone) => ({ value: zone.from, x: zone.x0, labelX: Math.min(width - 18, Math.max(18, zone.x0)) })),
    names: namesOf(zones, width),
    place,
    outcomeAt: (value: number): Outcome | undefined => {
      const { x: at } = place(value);
      return zones.find((zone) => at >= zone.x0 && at <= zone.x1)?.outcome;
    },
  };
}

/** Where the names of the zones stand: the good one always, a neighbour where there is room for it. */
function namesOf(zones: readonly Zone[], width: number): { outcome: Outcome; x: number }[] {
  const room = 84;
  const good = zones.find((zone) => zone.outcome === "good");
  const placed: { outcome: Outcome; x: number }[] = [];
  const tryPlace = (zone: Zone) => {
    const x = Math.min(width - room / 2, Math.max(room / 2, (zone.x0 + zone.x1) / 2));
    if (placed.every((name) => Math.abs(name.x - x) >= room)) placed.push({ outcome: zone.outcome, x });
  };
  if (good) tryPlace(good);
  zones.filter((zone) => zone.outcome === "fail").forEach(tryPlace);
  zones.filter((zone) => zone.outcome === "marginal").forEach(tryPlace);
  return placed;
}
