import { command, openPutBacks } from "@emberladder/diagnosis";
import type { Command } from "@emberladder/diagnosis";
import type { TreeNode } from "@emberladder/trees";
import { useTranslation } from "react-i18next";
import { PrimaryButton } from "#components/ui/button.tsx";
import { HazardLine } from "#components/ui/hazard-line.tsx";
import { useDiagnosis } from "../diagnosis-context.tsx";
import { FieldLayout } from "../parts/field-layout.tsx";
import { RefusalNote } from "../parts/refusal-note.tsx";
import { useClimbLine, useUnitLine } from "../parts/use-unit-line.ts";

/** Something the tree asks to be done. What it changes on the unit (power, gas) is recorded with it. */
export function DoStep({ node }: { node: Extract<TreeNode, { kind: "do" }> }) {
  const { t } = useTranslation();
  const { diagnosisId, state, recordAndGoOn } = useDiagnosis();
  const unitLine = useUnitLine();
  const climb = useClimbLine();
  const done: Command[] = [
    ...(node.sets ? [command("unit-state.set", node.sets)] : []),
    ...(node.opens ?? [])
      .filter(
        ({ kind, what }) => !openPutBacks(state).some((item) => item.kind === kind && item.what === what),
      )
      .map((opening) => command("put-back.opened", opening)),
    command("tree.step-done", { treeNode: node.id }),
  ];
  return (
    <FieldLayout
      diagnosisId={diagnosisId}
      state={state}
      title={unitLine}
      subtitle={climb}
      pinned={<PrimaryButton onClick={() => void recordAndGoOn(done)}>{t("check.done")}</PrimaryButton>}
    >
      {node.safety && <HazardLine>{node.safety}</HazardLine>}
      <h1 className="text-question">{node.act}</h1>
      <RefusalNote />
      {node.note && <p className="text-field text-quiet">{node.note}</p>}
    </FieldLayout>
  );
}
