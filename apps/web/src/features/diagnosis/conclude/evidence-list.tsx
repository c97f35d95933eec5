import { useTranslation } from "react-i18next";
import { OutcomeMark } from "#components/ui/outcome-mark.tsx";
import { useDiagnosis } from "../diagnosis-context.tsx";
import { useAnswerWords } from "../parts/use-answer-words.ts";

/** What shows the cause: one line a reading or look, with the state of the unit and the time in quiet. */
export function EvidenceList({ evidence }: { evidence: readonly string[] }) {
  const { t } = useTranslation();
  const { state } = useDiagnosis();
  const { ofObservation, ofLook } = useAnswerWords();
  const lines = [
    ...state.looks
      .filter((look) => evidence.includes(look.eventId))
      .map((look) => ({ id: look.eventId, outcome: look.outcome, ...ofLook(look) })),
    ...state.observations
      .filter((one) => evidence.includes(one.eventId))
      .map((one) => ({ id: one.eventId, outcome: one.outcome, ...ofObservation(one) })),
  ];
  if (lines.length === 0) return <p className="text-field text-quiet">{t("conclude.noEvidence")}</p>;
  return (
    <ul
      className="flex flex-col divide-y-1 divide-hair border-y-1 border-hair"
      aria-label={t("conclude.evidence")}
    >
      {lines.map((line) => (
        <li key={line.id} className="flex gap-3 py-2 text-field">
          <span className="pt-0.5">{line.outcome && <OutcomeMark outcome={line.outcome} />}</span>
          <span>
            <span className="font-semibold">{line.what}</span> <span className="numeric">{line.figures}</span>{" "}
            {line.found}
            <span className="block text-quiet">{line.state}</span>
          </span>
        </li>
      ))}
    </ul>
  );
}
