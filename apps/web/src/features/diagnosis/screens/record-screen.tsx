import { useMemo } from "react";
import { useTranslation } from "react-i18next";
import { Navigate } from "react-router-dom";
import { StepList } from "#components/record/step-list.tsx";
import { stepsOf } from "#components/record/steps-of.ts";
import type { Step } from "#components/record/steps-of.ts";
import { paths } from "#lib/paths.ts";
import { useSession } from "#lib/session.tsx";
import { useLocalRecord } from "#lib/store/use-local-record.ts";
import { useDiagnosis } from "../diagnosis-context.tsx";
import { FieldLayout } from "../parts/field-layout.tsx";
import { useUnitLine } from "../parts/use-unit-line.ts";

/**
 * What was done on a visit, step by step, as this phone has it: read-only, so that the next visit starts from
 * it. Who may review reads it in the review, where there is a signal for it.
 */
export function RecordScreen() {
  const { t } = useTranslation();
  const { can, offline } = useSession();
  const { diagnosisId, state } = useDiagnosis();
  const unitLine = useUnitLine();
  const record = useLocalRecord(diagnosisId);
  const steps = useMemo(() => (record ? stepsOf({ events: record.events, people: [] }) : []), [record]);
  if (can("diagnosis:review") && !offline) return <Navigate to={paths.reviewOf(diagnosisId)} replace />;
  const textsOf = ({ event }: Step) => {
    const body = JSON.stringify(event?.body ?? {});
    return (record?.notes ?? []).flatMap((note) => (body.includes(note.hash) ? [note.text] : []));
  };
  return (
    <FieldLayout diagnosisId={diagnosisId} state={state} title={t("review.recordHeader")} subtitle={unitLine}>
      <h1 className="text-question">
        {state.closed ? t(`outcomes.${state.closed.outcome}`) : t("review.recordOpen")}
      </h1>
      {state.conclusion && (
        <p className="text-field">
          {t([`trade:faults.${state.conclusion.cause}.name`, "answers.notProven"])}
        </p>
      )}
      {record && <StepList steps={steps} textsOf={textsOf} />}
    </FieldLayout>
  );
}
