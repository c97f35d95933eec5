import { command, repairsFor } from "@emberladder/diagnosis";
import type { Command } from "@emberladder/diagnosis";
import { getRepair, REPAIR_IDS } from "@emberladder/furnace";
import type { PartId, RepairId } from "@emberladder/furnace";
import { useState } from "react";
import { useTranslation } from "react-i18next";
import { Link } from "react-router-dom";
import { AnswerButton } from "#components/ui/answer-button.tsx";
import { LinkButton, PlainButton } from "#components/ui/button.tsx";
import { HazardLine } from "#components/ui/hazard-line.tsx";
import { paths } from "#lib/paths.ts";
import { useDiagnosis } from "../diagnosis-context.tsx";
import { FieldLayout } from "../parts/field-layout.tsx";
import { RefusalNote } from "../parts/refusal-note.tsx";
import { UndoLine } from "../parts/undo-line.tsx";
import { useUnitLine } from "../parts/use-unit-line.ts";

/**
 * The repair of the concluded cause. One tap where no part is needed; with a part, its state is the second tap.
 * What the repair touches decides the light-off proof; nobody picks that from a list.
 */
export function RepairScreen() {
  const { t } = useTranslation();
  const { diagnosisId, state, recordAndGoOn } = useDiagnosis();
  const unitLine = useUnitLine();
  const [chosen, setChosen] = useState<RepairId | null>(null);
  const [all, setAll] = useState(false);
  const cause = state.conclusion?.cause ?? "";
  const usual = repairsFor(cause);
  const offered: readonly RepairId[] = all ? REPAIR_IDS : usual;

  const record = (repair: RepairId, part?: { id: PartId; state: "fitted" | "ordered" }) => {
    const { touches, gasJoints = [], parts } = getRepair(repair);
    const joints: Command[] = gasJoints.map((side) =>
      command("put-back.opened", {
        kind: "gas-joint-opened",
        what: side === "up" ? "valve-inlet-joint" : "valve-outlet-joint",
        side,
      }),
    );
    void recordAndGoOn([
      ...(part?.state === "ordered" ? [] : joints),
      command("repair.recorded", {
        done: [repair],
        parts: part
          ? [{ part: part.id, quantity: 1, state: part.state }]
          : parts.map((id) => ({ part: id, quantity: 1, state: "fitted" as const })),
        touched: [...touches],
      }),
    ]);
  };

  const needs = chosen ? getRepair(chosen).needs : undefined;
  const parts = chosen ? getRepair(chosen).parts : [];
  const [part] = parts;

  return (
    <FieldLayout diagnosisId={diagnosisId} state={state} title={t("repair.header")} subtitle={unitLine}>
      {state.unit.power === "on" && <HazardLine>{t("repair.powerFirst")}</HazardLine>}
      <h1 className="text-question">
        {chosen
          ? t(`trade:repairs.${chosen}`)
          : t("repair.title", { cause: t(`trade:faults.${cause}.name`) })}
      </h1>
      <RefusalNote />
      {chosen && part ? (
        <>
          {needs && <p className="text-field text-quiet">{t(`trade:repairNeeds.${needs}`)}</p>}
          <AnswerButton onChoose={() => record(chosen, { id: part, state: "fitted" })}>
            {t("repair.fitted", { part: t(`trade:parts.${part}`) })}
          </AnswerButton>
          <AnswerButton onChoose={() => record(chosen, { id: part, state: "ordered" })}>
            {t("repair.ordered", { part: t(`trade:parts.${part}`) })}
          </AnswerButton>
          <LinkButton onClick={() => setChosen(null)}>{t("repair.back")}</LinkButton>
        </>
      ) : (
        <>
          {offered.map((repair) => {
            const first = getRepair(repair).parts[0];
            return (
              <AnswerButton
                key={repair}
                chosen={state.repairs.some(({ done }) => done.includes(repair))}
                onChoose={() => (first ? setChosen(repair) : record(repair))}
                aside={first ? t("repair.part") : undefined}
              >
                {t(`trade:repairs.${repair}`)}
              </AnswerButton>
            );
          })}
          <Link
            to={paths.diagnosis.close(diagnosisId)}
            className="flex min-h-12 items-center text-field font-semibold"
          >
            {t("repair.notNow")}
          </Link>
          {!all && <PlainButton onClick={() => setAll(true)}>{t("repair.other")}</PlainButton>}
        </>
      )}
      <p className="text-field text-quiet">{t("repair.licence")}</p>
      <UndoLine />
    </FieldLayout>
  );
}
