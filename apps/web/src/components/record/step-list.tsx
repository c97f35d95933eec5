import { useTranslation } from "react-i18next";
import type { Step } from "./steps-of.ts";
import { StepShape } from "./step-shape.tsx";
import { useStepWords } from "./use-step-words.ts";

/** All steps in their order; what was taken back is struck through and kept. */
export function StepList({
  steps,
  at,
  onGo,
}: {
  steps: readonly Step[];
  at: number;
  onGo: (to: number) => void;
}) {
  const { t } = useTranslation();
  const words = useStepWords();
  return (
    <section aria-label={t("review.allSteps")}>
      <h2 className="mb-1 text-field font-semibold desk:text-desk">{t("review.allSteps")}</h2>
      <ol className="max-h-[60vh] overflow-y-auto border-y-1 border-hair" aria-label={t("review.allSteps")}>
        {steps.map((step) => {
          const { title, value } = words(step);
          return (
            <li key={step.id}>
              <button
                type="button"
                onClick={() => onGo(step.number)}
                aria-current={step.number === at ? "step" : undefined}
                className={`flex min-h-12 w-full items-center gap-2 py-1 text-left text-field desk:min-h-8 desk:text-small ${step.number === at ? "border-l-6 border-ink bg-surface pl-2" : "pl-3.5"}`}
              >
                <svg viewBox="0 0 16 16" width={16} height={16} className="shrink-0" aria-hidden="true">
                  <StepShape mark={step.mark} x={8} y={8} />
                </svg>
                <span className={step.undone ? "line-through" : ""}>
                  <span className="numeric text-quiet">{step.time.slice(0, 5)}</span> {title}
                  {value ? `: ${value}` : ""}
                </span>
              </button>
            </li>
          );
        })}
      </ol>
    </section>
  );
}
