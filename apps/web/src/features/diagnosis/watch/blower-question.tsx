import { useTranslation } from "react-i18next";
import { AnswerButton } from "#components/ui/answer-button.tsx";
import { LinkButton } from "#components/ui/button.tsx";
import { useDiagnosis } from "../diagnosis-context.tsx";
import { FieldLayout } from "../parts/field-layout.tsx";
import { RefusalNote } from "../parts/refusal-note.tsx";
import { useUnitLine } from "../parts/use-unit-line.ts";

/**
 * Asked once where the unit stays at the inducer: on many boards an open limit or rollout runs inducer and
 * blower together, so a running inducer does not prove the safeties.
 */
export function BlowerQuestion({
  onAnswer,
  onBack,
}: {
  onAnswer: (blower: boolean) => void;
  onBack: () => void;
}) {
  const { t } = useTranslation();
  const { diagnosisId, state } = useDiagnosis();
  const unitLine = useUnitLine();
  return (
    <FieldLayout
      diagnosisId={diagnosisId}
      state={state}
      title={t("watch.header")}
      subtitle={unitLine}
      notch="safeties"
    >
      <h1 className="text-question">{t("watch.blowerQuestion")}</h1>
      <RefusalNote />
      <AnswerButton onChoose={() => onAnswer(false)}>{t("watch.blowerNo")}</AnswerButton>
      <AnswerButton onChoose={() => onAnswer(true)}>{t("watch.blowerYes")}</AnswerButton>
      <p className="text-field text-quiet">{t("watch.blowerWhy")}</p>
      <LinkButton onClick={onBack}>{t("watch.backToWatch")}</LinkButton>
    </FieldLayout>
  );
}
