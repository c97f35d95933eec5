import type { Outcome } from "@emberladder/furnace";
import { scaleOfBand } from "./scale-of-band.ts";
import type { ScaleSegment } from "./scale-of-band.ts";

/**
 * The expected band as a linear, clipped scale on which the reading lands as it is typed: a slot for the good
 * band, dotted for marginal, a bare bar for out. Each zone has its name in the words of the check. A value
 * beyond the ends sits at the end with an arrow.
 */
export function BandScale({
  segments,
  value,
  words,
  format,
}: {
  segments: readonly ScaleSegment[];
  value?: number;
  words: Record<Outcome, string>;
  format: (value: number) => string;
}) {
  const width = 296;
  const scale = scaleOfBand(segments, width);
  const at = value === undefined ? undefined : scale.place(value);
  const good = value !== undefined && scale.outcomeAt(value) === "good";
  return (
    <svg
      viewBox={`0 0 ${width} 92`}
      className="block w-full"
      role="img"
      aria-label={scale.zones.map((zone) => `${words[zone.outcome]} ${zone.label(format)}`).join(", ")}
    >
      {scale.zones.map((zone) => (
        <g key={zone.from}>
          {zone.outcome === "good" && (
            <rect
              x={zone.x0}
              y={24}
              width={zone.x1 - zone.x0}
              height={20}
              fill="var(--surface)"
              stroke="var(--ink)"
              strokeWidth={2.5}
            />
          )}
          {zone.outcome === "marginal" && (
            <rect
              x={zone.x0}
              y={27}
              width={zone.x1 - zone.x0}
              height={14}
              fill="var(--surface)"
              stroke="var(--ink)"
              strokeWidth={1.8}
              strokeDasharray="2 2.5"
            />
          )}
          {zone.outcome === "fail" && (
            <line x1={zone.x0} x2={zone.x1} y1={34} y2={34} stroke="var(--ink)" strokeWidth={5} />
          )}
        </g>
      ))}
      {scale.edges.map((edge) => (
        <g key={edge.value}>
          <line x1={edge.x} x2={edge.x} y1={42} y2={49} stroke="var(--ink)" strokeWidth={1.5} />
          <text
            x={edge.labelX}
            y={64}
            textAnchor="middle"
            className="numeric"
            fontSize={16}
            fill="var(--ink)"
          >
            {format(edge.value)}
          </text>
        </g>
      ))}
      {scale.names.map((name) => (
        <text
          key={name.x}
          x={name.x}
          y={85}
          textAnchor="middle"
          fontSize={16}
          fontWeight={600}
          fill="var(--ink)"
        >
          {words[name.outcome]}
        </text>
      ))}
      {at && (
        <g
          className="band-marker"
          fill={good ? "var(--proven)" : "var(--ink)"}
          style={{ transform: `translateX(${at.x}px)` }}
        >
          <path d="M-11 2h22l-11 17z" />
          <path d="M0 19v25" stroke={good ? "var(--proven)" : "var(--ink)"} strokeWidth={2.5} />
          {at.beyond !== 0 && <path d={at.beyond > 0 ? "M14 4l8 6-8 6z" : "M-14 4l-8 6 8 6z"} />}
        </g>
      )}
    </svg>
  );
}
