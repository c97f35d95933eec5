import { useTranslation } from "react-i18next";
import type { Step } from "./steps-of.ts";
import { StepShape } from "./step-shape.tsx";
import { useStepWords } from "./use-step-words.ts";

/**
 * All steps in their order; what was taken back is struck through and kept. With `onGo` each is a button that
 * opens it, in a box that scrolls; without, the list is only read, with the texts that were written at a step.
 */
export function StepList({
  steps,
  at,
  onGo,
  textsOf,
}: {
  steps: readonly Step[];
  at?: number;
  onGo?: (to: number) => void;
  textsOf?: (step: Step) => readonly string[];
}) {
  const { t } = useTranslation();
  return (
    <section aria-label={t("review.allSteps")}>
      <h2 className="mb-1 text-field font-semibold desk:text-desk">{t("review.allSteps")}</h2>
      <ol
        className={`border-y-1 border-hair ${onGo ? "max-h-[60vh] overflow-y-auto" : "divide-y-1 divide-hair"}`}
        aria-label={t("review.allSteps")}
      >
        {steps.map((step) => (
          <li key={step.id}>
            {onGo ? (
              <button
                type="button"
                onClick={() => onGo(step.number)}
                aria-current={step.number === at ? "step" : undefined}
                className={`focus-inside flex min-h-12 w-full items-center gap-2 py-1 text-left text-field desk:min-h-8 desk:text-small ${step.number === at ? "border-l-6 border-ink bg-surface pl-2" : "pl-3.5"}`}
              >
                <StepLine step={step} />
              </button>
            ) : (
              <div className="py-2 text-field">
                <p className="flex items-start gap-2">
                  <StepLine step={step} />
                </p>
                {textsOf?.(step).map((text) => (
                  <blockquote key={text} className="mt-1 ml-6 border-l-4 border-ink pl-3">
                    {text}
                  </blockquote>
                ))}
              </div>
            )}
          </li>
        ))}
      </ol>
    </section>
  );
}

function StepLine({ step }: { step: Step }) {
  const words = useStepWords();
  const { title, value } = words(step);
  return (
    <>
      <svg viewBox="0 0 16 16" width={16} height={16} className="mt-1 shrink-0" aria-hidden="true">
        <StepShape mark={step.mark} x={8} y={8} />
      </svg>
      <span className={`min-w-0 break-words ${step.undone ? "line-through" : ""}`}>
        <span className="numeric text-quiet">{step.time.slice(0, 5)}</span> {title}
        {value ? `: ${value}` : ""}
      </span>
    </>
  );
}
