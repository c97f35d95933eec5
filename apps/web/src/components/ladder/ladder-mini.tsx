import type { Rung } from "@emberladder/diagnosis";
import { RungBar } from "./rung-bar.tsx";

/** The ladder in a list: how high the unit climbed and where the gap is. A shut-off unit stands on a block. */
export function LadderMini({ rungs, shutOff }: { rungs: readonly Rung[]; shutOff?: boolean }) {
  const height = 74;
  const foot = shutOff ? height - 10 : height - 2;
  const gap = (foot - 2) / (rungs.length + 0.5);
  return (
    <svg viewBox={`0 0 26 ${height}`} width={26} height={height} aria-hidden="true" className="shrink-0">
      <line x1={6} x2={6} y1={2} y2={foot} stroke="var(--ink)" strokeWidth={2} />
      <line x1={20} x2={20} y1={2} y2={foot} stroke="var(--ink)" strokeWidth={2} />
      <g transform={`translate(0 0)`}>
        {rungs.map((rung, index) => (
          <g key={rung.stage} transform={`translate(6.5 ${foot - gap * (index + 0.7)}) scale(0.5)`}>
            <RungBar rung={rung} left={0} right={26} y={0} />
          </g>
        ))}
      </g>
      {shutOff && <rect x={2} y={foot} width={22} height={8} fill="var(--ink)" />}
    </svg>
  );
}
