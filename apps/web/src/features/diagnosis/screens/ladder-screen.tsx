import { ladderOf, stoppedStageOf } from "@emberladder/diagnosis";
import { useTranslation } from "react-i18next";
import { LadderFull } from "#components/ladder/ladder-full.tsx";
import { useDiagnosis } from "../diagnosis-context.tsx";
import { FieldLayout } from "../parts/field-layout.tsx";
import { useClimbLine, useUnitLine } from "../parts/use-unit-line.ts";

/** The whole ladder of the unit, by circuit: line below the transformer, 24 V above, with what was read. */
export function LadderScreen() {
  const { t } = useTranslation();
  const { diagnosisId, state, profile } = useDiagnosis();
  const unitLine = useUnitLine();
  const climb = useClimbLine();
  return (
    <FieldLayout diagnosisId={diagnosisId} state={state} title={unitLine} subtitle={climb} strip={false}>
      <h1 className="text-question">{t("ladder.title")}</h1>
      <LadderFull rungs={ladderOf(state)} profile={profile} stopped={stoppedStageOf(state)} />
    </FieldLayout>
  );
}
