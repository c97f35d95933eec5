import { formatChain, isInSegment, parseChain, resolveChain, roundLimit } from "./bands-chain.ts";
import type { Chain, Segment } from "./bands-chain.ts";
import { BANDS } from "./bands-data.ts";
import type { Band, PercentBase } from "./bands-types.ts";
import type { CheckId } from "./checks/check-ids.ts";
import type { CheckPower, WayId } from "./checks/check-types.ts";
import type { ReadingStage, ReadingUnit } from "./codes.ts";
import type { UnitProfile } from "./profile.ts";
import { evaluateVariant } from "./variant.ts";

/** Where and how a reading is taken; whatever is left out is not known. */
export interface ReadingSituation {
  stage?: ReadingStage;
  power?: CheckPower;
  /** One of the check's ways: how it is taken, or which of its readings it is. */
  way?: string;
}

/** A band in numbers for one unit. */
export interface ResolvedBand {
  readonly check: CheckId;
  readonly key: string;
  readonly unit: ReadingUnit;
  readonly quantity: Band["quantity"];
  readonly way?: WayId;
  /** Lowest first; together they hold every number, infinity included, exactly once. */
  readonly segments: readonly Segment[];
  /** The chain in numbers, as the record keeps it: `F < 108 <= M < 110 <= G`. */
  readonly text: string;
  readonly from: "default" | "plate" | "override";
  /** Where the figures of an override come from. */
  readonly source?: string;
}

const bandsOfCheck = new Map<CheckId, Band[]>();
for (const band of BANDS) bandsOfCheck.set(band.check, [...(bandsOfCheck.get(band.check) ?? []), band]);

/** The bands of a check as the catalogue has them, unresolved. */
export function bandsOf(check: CheckId): readonly Band[] {
  return bandsOfCheck.get(check) ?? [];
}

/** Volts of the igniter's element: what the plate says, else 24 V for a pilot's element and 120 V for a main one. */
export function elementVolts(profile: UnitProfile): 120 | 80 | 24 {
  return profile.plate.igniterVolts ?? (profile.codes.ignition === "IPH" ? 24 : 120);
}

function wayMeant(band: Band, { way, stage }: ReadingSituation): string | undefined {
  if (way !== undefined) return way;
  // A blower's delay is told by where in the cycle it was timed.
  if (band.check === "ck-blower-timing" && stage === "satisfied") return "off-delay";
  return undefined;
}

function holds(band: Band, profile: UnitProfile, situation: ReadingSituation): boolean {
  const { codes, options, plate } = profile;
  if (band.when && evaluateVariant(band.when, { codes, options }) === false) return false;
  const isOther = plate.ratedVolts !== undefined && plate.ratedVolts !== 120;
  if (band.supply && (band.supply === "other") !== isOther) return false;
  const way = wayMeant(band, situation);
  if (band.way && way !== undefined && siblingWays(band.check).has(way) && band.way !== way) return false;
  if (band.load && band.load !== loadAt(situation)) return false;
  if (band.power && situation.power && situation.power !== "any") {
    if ((band.power === "OFF") !== (situation.power === "OFF")) return false;
  }
  if (band.place === "at-speed" && situation.stage === "draft-rest") return false;
  if (band.place === "at-rest" && situation.stage === "draft-proved") return false;
  if (band.element && band.element !== elementVolts(profile)) return false;
  if (band.igniter && (elementVolts(profile) === 24 || band.igniter !== (plate.igniterKind ?? "unstated"))) {
    return false;
  }
  if (band.fire && band.fire !== fireMeant(profile, way)) return false;
  return (band.needsPlate ?? []).every((figure) => plate[figure] !== undefined);
}

function siblingWays(check: CheckId): Set<string> {
  return new Set(bandsOf(check).flatMap((band) => band.way ?? []));
}

function loadAt({ stage, power }: ReadingSituation): "idle" | "loaded" {
  if (stage === undefined || stage === "any") return power === "ON-call" ? "loaded" : "idle";
  return stage === "power" || stage === "idle" ? "idle" : "loaded";
}

function fireMeant(profile: UnitProfile, way: string | undefined): "high" | "low" | undefined {
  if (profile.codes.staging === "1S") return "high";
  if (way === "low-fire") return "low";
  if (way === "high-fire") return "high";
  // A modulating unit is classed only at a rate it was forced to.
  return profile.codes.staging === "2S" ? "high" : undefined;
}

/** The figure a percent band is of, in volts or amps; undefined where the plate does not state it. */
export function percentBase(
  base: PercentBase,
  profile: UnitProfile,
): { unit: "V" | "A"; figure: number } | undefined {
  const { plate } = profile;
  if (base === "ratedVolts") return { unit: "V", figure: plate.ratedVolts ?? 120 };
  const figure = base === "transformerAmps" ? plate.transformerVa && plate.transformerVa / 24 : plate[base];
  return figure === undefined ? undefined : { unit: "A", figure };
}

/**
 * The bands that hold for a check on one unit in one situation, in numbers; the first one of a unit counts. What
 * the unit's plate states replaces the default numbers, and a band overridden for the unit replaces both. A band
 * in percent of a plate figure is given a second time in volts or amps where that figure is known. Empty where
 * the reading has no class, such as a temperature rise without the plate's range.
 */
export function resolveBands(
  check: CheckId,
  profile: UnitProfile,
  situation: ReadingSituation = {},
): ResolvedBand[] {
  const holding = bandsOf(check).filter((band) => holds(band, profile, situation));
  return holding.flatMap((band, index) => {
    const override = overrideOf(band, index === 0, profile);
    const chain = override?.chain ?? band.chain;
    const segments = resolveChain(chain, profile.plate);
    if (!segments) return [];
    const usesPlate = chain.edges.some(
      ({ at }) => typeof at !== "number" && profile.plate[at.plate] !== undefined,
    );
    const resolved: ResolvedBand = {
      check,
      key: band.key,
      unit: band.unit,
      quantity: band.quantity,
      way: band.way,
      segments,
      text: formatSegments(segments),
      from: override ? "override" : usesPlate || band.needsPlate ? "plate" : "default",
      source: override?.source,
    };
    const base = band.percentOf && percentBase(band.percentOf, profile);
    return base ? [resolved, scaleBand(resolved, base)] : [resolved];
  });
}

function overrideOf(
  band: Band,
  isFirst: boolean,
  profile: UnitProfile,
): { chain: Chain; source: string } | undefined {
  const found = profile.bands.findLast(
    (override) => override.check === band.check && (override.when ? override.when === band.key : isFirst),
  );
  const parsed = found && parseChain(found.chain);
  return found && parsed?.ok ? { chain: parsed.chain, source: found.source } : undefined;
}

function scaleBand(band: ResolvedBand, base: { unit: "V" | "A"; figure: number }): ResolvedBand {
  const scale = (percent: number) => roundLimit((percent * base.figure) / 100);
  const segments = band.segments.map((s) => ({ ...s, from: scale(s.from), to: scale(s.to) }));
  return {
    ...band,
    unit: base.unit,
    segments,
    text: formatSegments(segments),
    from: band.from === "default" ? "plate" : band.from,
  };
}

function formatSegments(segments: readonly Segment[]): string {
  return formatChain({
    classes: segments.map((segment) => segment.outcome),
    edges: segments.slice(0, -1).map((s) => ({ at: s.to, belongsTo: s.toInclusive ? "lower" : "upper" })),
  });
}

/** The class of a number in a band; `stop` is told apart from fail. Every number has one, infinity included. */
export function classInBand(band: ResolvedBand, value: number): Segment["outcome"] {
  const measured = band.quantity === "magnitude" ? Math.abs(value) : value;
  const segment = band.segments.find((candidate) => isInSegment(candidate, measured));
  // A NaN is the only number outside all segments; it is no reading, and counts as failed.
  return segment?.outcome ?? "fail";
}
