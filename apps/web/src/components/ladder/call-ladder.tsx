import { lazy, Suspense } from "react";

const DiagnosisMini = lazy(() =>
  import("./diagnosis-mini.tsx").then((module) => ({ default: module.DiagnosisMini })),
);

/**
 * The ladder beside a call: as far as the diagnosis on this phone has climbed, cold where there is none. The
 * model that draws the rungs is fetched only where something was recorded.
 */
export function CallLadder({ diagnosisId, isShutOff }: { diagnosisId: string | null; isShutOff: boolean }) {
  const cold = <ColdMini isShutOff={isShutOff} />;
  if (!diagnosisId) return cold;
  return (
    <Suspense fallback={cold}>
      <DiagnosisMini diagnosisId={diagnosisId} cold={cold} />
    </Suspense>
  );
}

const RUNGS = 15;
const HEIGHT = 74;

function ColdMini({ isShutOff }: { isShutOff: boolean }) {
  const foot = isShutOff ? HEIGHT - 10 : HEIGHT - 2;
  const gap = (foot - 4) / (RUNGS + 1);
  return (
    <svg viewBox={`0 0 26 ${HEIGHT}`} width={26} height={HEIGHT} aria-hidden="true" className="shrink-0">
      {[...Array(RUNGS).keys()].map((rung) => (
        <path key={rung} d={`M6 ${foot - gap * (rung + 1)}h14`} stroke="var(--rule)" strokeWidth={1} />
      ))}
      <path d={`M6 2V${foot}M20 2V${foot}`} stroke="var(--ink)" strokeWidth={2} />
      {isShutOff && <rect x={2} y={foot} width={22} height={8} fill="var(--stopped)" />}
    </svg>
  );
}
