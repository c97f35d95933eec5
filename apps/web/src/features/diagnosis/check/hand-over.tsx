import type { TreeNode } from "@emberladder/trees";
import { useTranslation } from "react-i18next";
import { Link } from "react-router-dom";
import { HazardLine } from "#components/ui/hazard-line.tsx";
import { paths } from "#lib/paths.ts";
import { useDiagnosis } from "../diagnosis-context.tsx";
import { FieldLayout } from "../parts/field-layout.tsx";
import { useClimbLine, useUnitLine } from "../parts/use-unit-line.ts";

/** The tree knows no further step: who takes over, and the ways to go on or to finish. */
export function HandOver({ node }: { node: Extract<TreeNode, { kind: "hand-over" }> }) {
  const { t } = useTranslation();
  const { diagnosisId, state } = useDiagnosis();
  const unitLine = useUnitLine();
  const climb = useClimbLine();
  return (
    <FieldLayout diagnosisId={diagnosisId} state={state} title={unitLine} subtitle={climb}>
      {node.safety && <HazardLine>{node.safety}</HazardLine>}
      <h1 className="text-question">{t(`check.handOver.${node.whom}`)}</h1>
      <p className="text-field">{node.say}</p>
      <Link className="text-field font-semibold" to={paths.diagnosis.causes(diagnosisId)}>
        {t("check.otherChecks")}
      </Link>
      <Link className="text-field font-semibold" to={paths.diagnosis.answers(diagnosisId)}>
        {t("check.finishWithout")}
      </Link>
    </FieldLayout>
  );
}
