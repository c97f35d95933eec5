import type { DiagnosisState } from "@emberladder/diagnosis";
import { format } from "date-fns";
import { useTranslation } from "react-i18next";
import { StepShape } from "#components/record/step-shape.tsx";
import type { Step } from "#components/record/steps-of.ts";

const WIDTH = 1000;
const LEFT = 90;

/**
 * True time along x, three lanes: steps by their shapes, the unit's power and gas, what was out. Scrubbed by
 * the slider under it, by arrow keys, or by tapping a mark.
 */
export function TimeLine({
  steps,
  state,
  at,
  onGo,
}: {
  steps: readonly Step[];
  state: DiagnosisState;
  at: number;
  onGo: (to: number) => void;
}) {
  const { t } = useTranslation();
  const first = steps[0]?.at ?? 0;
  const last = Math.max(steps.at(-1)?.at ?? first, first + 60_000);
  const xOf = (time: number) => LEFT + ((time - first) / (last - first)) * (WIDTH - LEFT - 20);
  const now = steps[at - 1]?.at ?? first;
  const out = state.putBacks.slice(0, 5);
  const burns = state.watches.map((watch) => ({ from: watch.at, to: watch.ended?.at ?? watch.at + 60_000 }));
  const ticks = Array.from({ length: 6 }, (_, index) => first + ((last - first) * index) / 5);
  const height = 84 + out.length * 18;
  return (
    <section aria-label={t("review.timeLine")} className="border-b-3 border-ink bg-sunk px-4 py-3 desk:px-6">
      <div className="overflow-x-auto" tabIndex={0} role="region" aria-label={t("review.timeLine")}>
        <svg
          viewBox={`0 0 ${WIDTH} ${height}`}
          className="block w-full min-w-[720px]"
          role="img"
          aria-label={t("review.timeLineWords", { count: steps.length })}
        >
          {ticks.map((tick) => (
            <g key={tick}>
              <line x1={xOf(tick)} x2={xOf(tick)} y1={20} y2={height} stroke="var(--hair)" />
              <text
                x={xOf(tick)}
                y={14}
                fontSize={13}
                textAnchor="middle"
                className="numeric"
                fill="var(--quiet)"
              >
                {format(tick, "HH:mm")}
              </text>
            </g>
          ))}
          {[t("review.lanes.steps"), t("review.lanes.calls"), t("review.lanes.out")].map((lane, index) => (
            <text key={lane} x={0} y={[40, 64, 88][index]} fontSize={14} fontWeight={600} fill="var(--ink)">
              {lane}
            </text>
          ))}
          {burns.map((burn) => (
            <line
              key={burn.from}
              x1={xOf(burn.from)}
              x2={Math.max(xOf(burn.to), xOf(burn.from) + 6)}
              y1={59}
              y2={59}
              stroke="var(--proven)"
              strokeWidth={8}
            />
          ))}
          {out.map((item, index) => (
            <g key={`${item.eventId}:${item.entry}`}>
              <rect
                x={xOf(item.at)}
                y={76 + index * 18}
                width={Math.max(4, xOf(item.restored?.at ?? last) - xOf(item.at))}
                height={10}
                fill={item.kind === "jumper-fitted" ? "var(--bypassed)" : "var(--surface)"}
                stroke="var(--ink)"
                strokeWidth={1.5}
              />
              <text
                x={Math.max(xOf(item.at) - 6, LEFT + 90)}
                y={86 + index * 18}
                fontSize={13}
                textAnchor="end"
                fill="var(--quiet)"
              >
                {t(`trade:putBack.what.${item.what}`)}
              </text>
            </g>
          ))}
          {steps.map((step) => (
            <g key={step.id} className="cursor-pointer" onClick={() => onGo(step.number)}>
              <StepShape mark={step.mark} x={xOf(step.at)} y={35} />
            </g>
          ))}
          <line x1={xOf(now)} x2={xOf(now)} y1={18} y2={height} stroke="var(--ink)" strokeWidth={2.5} />
        </svg>
      </div>
      <label className="mt-2 flex items-center gap-3 text-small text-quiet">
        {t("review.scrub")}
        <input
          type="range"
          min={1}
          max={steps.length}
          value={at}
          onChange={(event) => onGo(Number(event.target.value))}
          className="h-12 grow accent-ink"
        />
      </label>
      <ul className="flex flex-wrap gap-x-5 text-small text-quiet" aria-label={t("review.marks")}>
        {(["reading", "look", "door", "left-tree", "watch", "proof"] as const).map((mark) => (
          <li key={mark} className="flex items-center gap-1.5">
            <svg viewBox="0 0 16 16" width={16} height={16} aria-hidden="true">
              <StepShape mark={mark} x={8} y={8} />
            </svg>
            {t(`review.markNames.${mark}`)}
          </li>
        ))}
      </ul>
    </section>
  );
}
