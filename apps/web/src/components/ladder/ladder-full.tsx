import type { Rung } from "@emberladder/diagnosis";
import type { Stage, UnitProfile } from "@emberladder/furnace";
import { useTranslation } from "react-i18next";
import { circuitsOf } from "./circuits.ts";
import type { CircuitRung } from "./circuits.ts";
import { CircuitRungDrawing } from "./circuit-rung.tsx";
import { LadderList } from "./ladder-list.tsx";

const WIDTH = 328;
const LEFT = 20;
const RIGHT = 308;
const RUNG = 58;
const STOPPED = 104;

/**
 * The full ladder by circuit, as the trade draws it: two ladders broken at the transformer, line below and 24 V
 * above. Each contact has its device's name above it; the volts read are written on the rung. Rungs without a
 * circuit are named in one line on top.
 */
export function LadderFull({
  rungs,
  profile,
  stopped,
}: {
  rungs: readonly Rung[];
  profile: UnitProfile;
  stopped: Stage | null;
}) {
  const { t } = useTranslation();
  const { line, control, seenOnly } = circuitsOf(rungs, profile);
  const heightOf = (rows: readonly CircuitRung[]) =>
    rows.reduce((sum, row) => sum + (row.rung.stage === stopped ? STOPPED : RUNG), 0);
  const controlHeight = heightOf(control);
  const lineTop = controlHeight + 120;
  const total = lineTop + heightOf(line) + 40;
  return (
    <figure className="flex flex-col gap-2">
      <figcaption className="text-field text-quiet">
        {t("ladder.noCircuit", { rungs: seenOnly.map((rung) => rung.number).join(", ") })}
      </figcaption>
      <svg viewBox={`0 0 ${WIDTH} ${total}`} className="block w-full" aria-hidden="true">
        <g fontSize={16} fill="var(--ink)">
          <text x={LEFT - 8} y={18} className="numeric" fontWeight={600}>
            {"R"}
          </text>
          <text x={RIGHT} y={18} className="numeric" fontWeight={600}>
            {"C"}
          </text>
          <text x={WIDTH / 2} y={18} textAnchor="middle" fill="var(--quiet)">
            {t("ladder.control")}
          </text>
          <path
            d={`M${LEFT} 26V${controlHeight + 60}H${WIDTH / 2 - 50}M${RIGHT} 26V${controlHeight + 60}H${WIDTH / 2 + 50}`}
            fill="none"
            stroke="var(--ink)"
            strokeWidth="var(--rail)"
          />
          <Transformer y={controlHeight + 60} />
          <text x={LEFT + 4} y={controlHeight + 88} fill="var(--quiet)">
            {t("ladder.transformer")}
          </text>
          {profile.plate.transformerVa && (
            <text
              x={RIGHT - 4}
              y={controlHeight + 88}
              textAnchor="end"
              className="numeric"
              fill="var(--quiet)"
            >
              {`${profile.plate.transformerVa} VA`}
            </text>
          )}
          <path
            d={`M${WIDTH / 2 - 50} ${controlHeight + 100}H${LEFT}V${total - 24}M${WIDTH / 2 + 50} ${controlHeight + 100}H${RIGHT}V${total - 24}`}
            fill="none"
            stroke="var(--ink)"
            strokeWidth="var(--rail)"
          />
          <text x={LEFT - 8} y={total - 6} className="numeric" fontWeight={600}>
            {"L1"}
          </text>
          <text x={RIGHT - 4} y={total - 6} className="numeric" fontWeight={600}>
            {"N"}
          </text>
          <text x={WIDTH / 2} y={total - 6} textAnchor="middle" fill="var(--quiet)">
            {`${profile.plate.ratedVolts ?? 120} V, ${t("ladder.line")}`}
          </text>
        </g>
        {placeRungs(control, 20, stopped).map(({ row, at }) => (
          <CircuitRungDrawing
            key={row.rung.stage}
            row={row}
            y={at}
            left={LEFT}
            right={RIGHT}
            isStopped={row.rung.stage === stopped}
          />
        ))}
        {placeRungs(line, lineTop, stopped).map(({ row, at }) => (
          <CircuitRungDrawing
            key={row.rung.stage}
            row={row}
            y={at}
            left={LEFT}
            right={RIGHT}
            isStopped={row.rung.stage === stopped}
          />
        ))}
      </svg>
      <p className="text-field text-quiet">{t("ladder.legend")}</p>
      <LadderList rungs={rungs} />
    </figure>
  );
}

/** Each rung of a circuit with the height of its bar, the highest rung first; the stopped one takes more room. */
function placeRungs(
  rows: readonly CircuitRung[],
  start: number,
  stopped: Stage | null,
): { row: CircuitRung; at: number }[] {
  return rows.toReversed().reduce<{ placed: { row: CircuitRung; at: number }[]; y: number }>(
    ({ placed, y }, row) => ({
      placed: [...placed, { row, at: y + 34 }],
      y: y + (row.rung.stage === stopped ? STOPPED : RUNG),
    }),
    { placed: [], y: start },
  ).placed;
}

function Transformer({ y }: { y: number }) {
  const arcs = (base: number, up: boolean) =>
    Array.from({ length: 5 }, (_, index) => {
      const x = WIDTH / 2 - 50 + index * 20;
      return `M${x} ${base}a10 ${up ? 12 : 12} 0 0 ${up ? 1 : 0} 20 0`;
    }).join("");
  return (
    <g fill="none" stroke="var(--ink)" strokeWidth={2.4}>
      <path d={arcs(y, false)} />
      <path d={`M${WIDTH / 2 - 54} ${y + 18}h108M${WIDTH / 2 - 54} ${y + 23}h108`} strokeWidth={1.8} />
      <path d={arcs(y + 40, true)} />
    </g>
  );
}
