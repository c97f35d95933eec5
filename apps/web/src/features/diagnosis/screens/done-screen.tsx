import { command, ladderOf } from "@emberladder/diagnosis";
import { useTranslation } from "react-i18next";
import { Link, Navigate } from "react-router-dom";
import { LadderMini } from "#components/ladder/ladder-mini.tsx";
import { PrimaryButton, PlainButton } from "#components/ui/button.tsx";
import { paths } from "#lib/paths.ts";
import { useDiagnosis } from "../diagnosis-context.tsx";
import { FieldLayout } from "../parts/field-layout.tsx";
import { RefusalNote } from "../parts/refusal-note.tsx";
import { useUnitLine } from "../parts/use-unit-line.ts";

/** Closed: what was proven, and the report to the customer in one tap. */
export function DoneScreen() {
  const { t } = useTranslation();
  const { diagnosisId, state, call, record } = useDiagnosis();
  const unitLine = useUnitLine();
  if (!state.closed) return <Navigate to={paths.diagnosis.next(diagnosisId)} replace />;
  const request = (to: "customer" | "nobody") => void record([command("report.requested", { to })]);
  return (
    <FieldLayout
      diagnosisId={diagnosisId}
      state={state}
      title={t("done.header")}
      subtitle={unitLine}
      strip={false}
    >
      <div className="flex items-center gap-4">
        <LadderMini rungs={ladderOf(state)} shutOff={state.closed.outcome === "shut-off"} />
        <h1 className="text-question">{t(`outcomes.${state.closed.outcome}`)}</h1>
      </div>
      <RefusalNote />
      {state.conclusion && (
        <p className="text-field">{t([`trade:faults.${state.conclusion.cause}.plain`, "done.notProven"])}</p>
      )}
      {state.report ? (
        <p role="status" className="border-l-6 border-ink bg-surface p-3 text-field font-semibold">
          {t(state.report.to === "customer" ? "done.reportGoes" : "done.noReport", {
            name: call?.customerFirstName ?? "",
          })}
        </p>
      ) : (
        <>
          <p className="text-field text-quiet">{t("done.reportWhat")}</p>
          <PrimaryButton onClick={() => request("customer")}>
            {t("done.sendReport", { name: call?.customerFirstName ?? "" })}
          </PrimaryButton>
          <PlainButton onClick={() => request("nobody")}>{t("done.sendNobody")}</PlainButton>
        </>
      )}
      <Link to={paths.calls} className="flex min-h-12 items-center text-field font-semibold">
        {t("notFound.toCalls")}
      </Link>
    </FieldLayout>
  );
}
