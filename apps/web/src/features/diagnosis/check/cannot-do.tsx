import { command } from "@emberladder/diagnosis";
import { DEPARTURE_REASONS } from "@emberladder/furnace";
import { useState } from "react";
import { useTranslation } from "react-i18next";
import { AnswerButton } from "#components/ui/answer-button.tsx";
import { LinkButton, PrimaryButton } from "#components/ui/button.tsx";
import { TextAreaField } from "#components/ui/text-area-field.tsx";
import { makeNote } from "#lib/store/append-event.ts";
import { useDiagnosis } from "../diagnosis-context.tsx";
import { FieldLayout } from "../parts/field-layout.tsx";
import { RefusalNote } from "../parts/refusal-note.tsx";
import { useClimbLine, useUnitLine } from "../parts/use-unit-line.ts";
import type { CheckTask } from "./check-task.ts";

/** Why a check is not taken: one tap from the list; only "other" is typed. The walk goes on without it. */
export function CannotDo({ task, onBack }: { task: CheckTask; onBack: () => void }) {
  const { t } = useTranslation();
  const { diagnosisId, state, recordAndGoOn } = useDiagnosis();
  const unitLine = useUnitLine();
  const climb = useClimbLine();
  const [other, setOther] = useState<string | null>(null);
  const decline = (reason: string, text?: string) => {
    const note = text ? makeNote(text) : undefined;
    const body = {
      check: task.check,
      reason,
      ...(task.node ? { treeNode: task.node.id } : {}),
      ...(note ? { noteRef: note.hash } : {}),
    };
    void recordAndGoOn([command("check.declined", body)], note ? [note] : []);
  };
  return (
    <FieldLayout
      diagnosisId={diagnosisId}
      state={state}
      title={unitLine}
      subtitle={climb}
      pinned={
        other !== null && (
          <PrimaryButton disabled={other.trim() === ""} onClick={() => decline("other", other.trim())}>
            {t("cannot.record")}
          </PrimaryButton>
        )
      }
    >
      <h1 className="text-question">{t("cannot.title")}</h1>
      <RefusalNote />
      {DEPARTURE_REASONS.filter((reason) => reason !== "other").map((reason) => (
        <AnswerButton key={reason} onChoose={() => decline(reason)}>
          {t(`trade:departures.${reason}`)}
        </AnswerButton>
      ))}
      {other === null ? (
        <AnswerButton onChoose={() => setOther("")}>{t("trade:departures.other")}</AnswerButton>
      ) : (
        <TextAreaField label={t("cannot.otherLabel")} text={other} onChange={setOther} />
      )}
      <LinkButton onClick={onBack}>{t("cannot.back")}</LinkButton>
    </FieldLayout>
  );
}
