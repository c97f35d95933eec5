import { command, UNKNOWN_CAUSE } from "@emberladder/diagnosis";
import { useState } from "react";
import { useTranslation } from "react-i18next";
import { Link } from "react-router-dom";
import { LinkButton, PrimaryButton } from "#components/ui/button.tsx";
import { TextAreaField } from "#components/ui/text-area-field.tsx";
import { paths } from "#lib/paths.ts";
import { makeNote } from "#lib/store/append-event.ts";
import { useDiagnosis } from "../diagnosis-context.tsx";
import { FieldLayout } from "../parts/field-layout.tsx";
import { RefusalNote } from "../parts/refusal-note.tsx";
import { useClimbLine, useUnitLine } from "../parts/use-unit-line.ts";

/** Nothing was proven: the record says so, and what the next visit has to find out. */
export function NotFoundForm({ onBack }: { onBack?: () => void }) {
  const { t } = useTranslation();
  const { diagnosisId, state, recordAndGoOn } = useDiagnosis();
  const unitLine = useUnitLine();
  const climb = useClimbLine();
  const [question, setQuestion] = useState("");
  const clearedByReset = state.observations.some(
    (one) => one.check === "ck-lockout-reset" && one.finding === "runs",
  );
  const record = () => {
    const note = makeNote(question.trim());
    void recordAndGoOn(
      [
        command("cause.concluded", {
          cause: clearedByReset ? "ignition-lockout-latched" : UNKNOWN_CAUSE,
          evidence: state.observations.map((one) => one.eventId).slice(-40),
          proven: false,
          openQuestionRef: note.hash,
        }),
      ],
      [note],
    );
  };
  return (
    <FieldLayout
      diagnosisId={diagnosisId}
      state={state}
      title={unitLine}
      subtitle={climb}
      pinned={
        <PrimaryButton disabled={question.trim() === ""} onClick={record}>
          {t("conclude.recordNotFound")}
        </PrimaryButton>
      }
    >
      <h1 className="text-question">{t("conclude.notFoundTitle")}</h1>
      <RefusalNote />
      <p className="text-field text-quiet">{t("conclude.notFoundWhy")}</p>
      <TextAreaField label={t("conclude.openQuestion")} text={question} onChange={setQuestion} />
      <Link
        to={paths.diagnosis.causes(diagnosisId)}
        className="flex min-h-12 items-center text-field font-semibold"
      >
        {t("check.otherChecks")}
      </Link>
      {onBack && <LinkButton onClick={onBack}>{t("conclude.back")}</LinkButton>}
    </FieldLayout>
  );
}
