import type { Rung } from "@emberladder/diagnosis";
import { useTranslation } from "react-i18next";
import { LadderList } from "#components/ladder/ladder-list.tsx";
import { RungBar } from "#components/ladder/rung-bar.tsx";
import { useRungFigures } from "#components/ladder/use-rung-figures.ts";
import { formatNumber } from "#lib/format-number.ts";

const STEP = 30;

/** The ladder beside the record: rails at the left, names and readings in a column at the right. */
export function LadderDesk({ rungs }: { rungs: readonly Rung[] }) {
  const { t } = useTranslation();
  const figuresOf = useRungFigures();
  const height = rungs.length * STEP + 16;
  return (
    <div>
      <svg viewBox={`0 0 340 ${height}`} className="block w-full max-w-[344px]" aria-hidden="true">
        <path d={`M14 4V${height - 4}M112 4V${height - 4}`} stroke="var(--ink)" strokeWidth="var(--rail)" />
        {rungs.map((rung, index) => {
          const y = height - 8 - STEP * (index + 0.5);
          const value =
            rung.state === "stopped"
              ? t("ladder.stoppedLabel")
              : rung.reading
                ? figuresOf(rung, true)
                : rung.atS === undefined
                  ? ""
                  : `${formatNumber(rung.atS)} s`;
          return (
            <g key={rung.stage}>
              <RungBar rung={rung} left={14} right={112} y={y} />
              <text
                x={128}
                y={y + 5}
                fontSize={14}
                fontWeight={rung.state === "proven" || rung.state === "stopped" ? 600 : 400}
                fill={rung.state === "waiting" ? "var(--quiet)" : "var(--ink)"}
              >
                {`${rung.number} ${t(`trade:stages.${rung.stage}.name`)}`}
              </text>
              <text
                x={338}
                y={y + 5}
                fontSize={13}
                textAnchor="end"
                className="numeric"
                fontWeight={600}
                fill="var(--ink)"
              >
                {value}
              </text>
            </g>
          );
        })}
      </svg>
      <LadderList rungs={rungs} />
    </div>
  );
}
