/** Three drawings for pages without a unit: a cold ladder, a missing rung, a phone with a gap. */

function Rails({ height }: { height: number }) {
  return (
    <g stroke="var(--ink)" strokeWidth="var(--rail)">
      <path d={`M20 4v${height - 8}M84 4v${height - 8}`} />
    </g>
  );
}

/** Nothing to climb: a ladder with every rung waiting. */
export function ColdLadderDrawing() {
  return (
    <svg viewBox="0 0 104 132" width={104} height={132} aria-hidden="true">
      <Rails height={132} />
      {[20, 43, 66, 89, 112].map((y) => (
        <path key={y} d={`M20 ${y}h64`} stroke="var(--rule)" strokeWidth={2} />
      ))}
    </svg>
  );
}

/** Nothing here: one rung of the ladder is not there. */
export function MissingRungDrawing() {
  return (
    <svg viewBox="0 0 104 132" width={104} height={132} aria-hidden="true">
      <Rails height={132} />
      {[20, 43, 89, 112].map((y) => (
        <path key={y} d={`M20 ${y}h64`} stroke="var(--rule)" strokeWidth={2} />
      ))}
      <path d="M14 66h12M78 66h12" stroke="var(--ink)" strokeWidth={4} />
    </svg>
  );
}

/** A fault of ours: a phone whose line is broken, not the unit's ladder. */
export function FailedDrawing() {
  return (
    <svg viewBox="0 0 104 132" width={104} height={132} fill="none" stroke="var(--ink)" aria-hidden="true">
      <rect x={20} y={4} width={64} height={124} rx={8} strokeWidth="var(--rail)" />
      <path d="M32 66h12M60 66h12M46 54v24M58 54v24" strokeWidth={4} />
    </svg>
  );
}
