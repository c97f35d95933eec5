import { likelyOutcome, openPutBacks, proofOf, touchedRows } from "@emberladder/diagnosis";
import type { ProofItem } from "@emberladder/diagnosis";
import type { ClosingRow } from "@emberladder/furnace";
import { useTranslation } from "react-i18next";
import { Link, useNavigate } from "react-router-dom";
import { PrimaryButton } from "#components/ui/button.tsx";
import { HazardLine } from "#components/ui/hazard-line.tsx";
import { paths } from "#lib/paths.ts";
import { useDiagnosis } from "../diagnosis-context.tsx";
import { FieldLayout } from "../parts/field-layout.tsx";
import { RefusalNote } from "../parts/refusal-note.tsx";
import { UndoLine } from "../parts/undo-line.tsx";
import { useOpenedAt } from "#lib/use-now.ts";
import { useUnitLine } from "../parts/use-unit-line.ts";
import { ProofRow } from "../proof/proof-row.tsx";

/**
 * The light-off proof, made only from what was touched: one heading a touched thing, then what is always
 * asked. A line says that no gauge goes on just to close.
 */
export function ProofScreen() {
  const { t } = useTranslation();
  const navigate = useNavigate();
  const { diagnosisId, state } = useDiagnosis();
  const unitLine = useUnitLine();
  const now = useOpenedAt();
  const outcome = likelyOutcome(state);
  const items = proofOf(state, outcome, now).filter(
    (item) => item.id !== "close-docs" && item.id !== "close-jumpers",
  );
  const left = items.filter((item) => !item.verdict.pass);
  const mustPutBack = openPutBacks(state).filter((item) => item.kind !== "cover-removed");
  const groups = groupByRow(items);
  return (
    <FieldLayout
      diagnosisId={diagnosisId}
      state={state}
      title={t("proof.header")}
      subtitle={unitLine}
      pinned={
        left.length === 0 && (
          <PrimaryButton onClick={() => void navigate(paths.diagnosis.answers(diagnosisId))}>
            {t("proof.goOn")}
          </PrimaryButton>
        )
      }
    >
      <HazardLine>{t("watch.hazard")}</HazardLine>
      <h1 className="text-question">
        {left.length > 0 ? t("proof.left", { count: left.length }) : t("proof.allDone")}
      </h1>
      <RefusalNote />
      {mustPutBack.length > 0 && (
        <Link
          to={paths.diagnosis.putBack(diagnosisId)}
          className="flex min-h-12 items-center text-field font-semibold"
        >
          {t("proof.putBackFirst", { count: mustPutBack.length })}
        </Link>
      )}
      {groups.map(([row, rowItems]) => (
        <section key={row} aria-label={t(`trade:touched.${row}`)} className="flex flex-col gap-2">
          <h2 className="border-b-2 border-ink pb-1 text-field font-semibold">{t(`trade:touched.${row}`)}</h2>
          {rowItems.map((item) => (
            <ProofRow key={item.id} item={item} />
          ))}
        </section>
      ))}
      <p className="text-field text-quiet">
        {touchedRows(state).length === 0 ? t("proof.noGaugeNothing") : t("proof.noGauge")}
      </p>
      <UndoLine />
    </FieldLayout>
  );
}

/** Each item under the first row that asked for it; what is always asked comes last. */
function groupByRow(items: readonly ProofItem[]): [ClosingRow, ProofItem[]][] {
  const groups = new Map<ClosingRow, ProofItem[]>();
  for (const item of items) {
    const row = item.askedBy.find((asked) => asked !== "always") ?? "always";
    groups.set(row, [...(groups.get(row) ?? []), item]);
  }
  return [...groups].toSorted(([a], [b]) => Number(a === "always") - Number(b === "always"));
}
