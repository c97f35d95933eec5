import type { DiagnosisDetail } from "@emberladder/contract";
import { useTranslation } from "react-i18next";
import { useRuleWords } from "#lib/use-rule-words.ts";
import type { Step } from "#components/record/steps-of.ts";

/** What a supervisor should know: rules that the record is against, steps left out, the state of the chain. */
export function FlagList({
  record,
  steps,
  onGo,
}: {
  record: DiagnosisDetail;
  steps: readonly Step[];
  onGo: (to: number) => void;
}) {
  const { t } = useTranslation();
  const ruleWords = useRuleWords();
  const departures = steps.filter((step) => step.type === "tree.left" || step.type === "check.declined");
  return (
    <section aria-label={t("review.findings")}>
      <h2 className="mb-1 text-field font-semibold desk:text-desk">{t("review.findings")}</h2>
      {record.flagList.length === 0 && departures.length === 0 && (
        <p className="text-field text-quiet desk:text-desk">{t("review.noFindings")}</p>
      )}
      <ul className="flex flex-col gap-1">
        {record.flagList.map((flag, index) => {
          const step = steps.find((one) => one.id === flag.eventId);
          return (
            <li
              key={`${flag.eventId}:${flag.rule}:${index}`}
              className="border-l-6 border-ink bg-surface p-2 text-field desk:text-desk"
            >
              {ruleWords(flag)}
              {step && (
                <button
                  type="button"
                  onClick={() => onGo(step.number)}
                  className="ml-2 min-h-8 text-link underline"
                >
                  {t("review.toStep", { number: step.number })}
                </button>
              )}
            </li>
          );
        })}
        {departures.map((step) => (
          <li key={step.id} className="text-field desk:text-desk">
            <button
              type="button"
              onClick={() => onGo(step.number)}
              className="min-h-8 text-left text-link underline"
            >
              {t("review.departed", {
                time: step.time.slice(0, 5),
                reason:
                  step.event && "reason" in step.event.body
                    ? t(`trade:departures.${step.event.body.reason}`)
                    : "",
              })}
            </button>
          </li>
        ))}
      </ul>
      {record.waitsForRelease && (
        <p className="mt-2 text-field font-semibold desk:text-desk">{t("review.waits")}</p>
      )}
    </section>
  );
}
