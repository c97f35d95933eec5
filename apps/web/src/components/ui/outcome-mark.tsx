import type { Outcome } from "@emberladder/furnace";

/** Mark of an outcome, told by shape: disc with tick, half circle, gap. */
export function OutcomeMark({ outcome }: { outcome: Outcome }) {
  return (
    <svg viewBox="0 0 26 20" width={26} height={20} aria-hidden="true" className="shrink-0">
      {outcome === "good" && (
        <>
          <circle cx={13} cy={10} r={9} fill="var(--ink)" />
          <path d="M8.5 10.5l3 3 6-7" fill="none" stroke="var(--ground)" strokeWidth={2.4} />
        </>
      )}
      {outcome === "marginal" && (
        <>
          <circle cx={13} cy={10} r={8} fill="none" stroke="var(--ink)" strokeWidth={2.4} />
          <path d="M13 2a8 8 0 0 1 0 16z" fill="var(--ink)" />
        </>
      )}
      {outcome === "fail" && (
        <path d="M1 10h7M18 10h7M9 2v16M17 2v16" stroke="var(--ink)" strokeWidth={3.2} />
      )}
    </svg>
  );
}
