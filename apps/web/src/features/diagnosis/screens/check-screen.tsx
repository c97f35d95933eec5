import { treePosition } from "@emberladder/diagnosis";
import { isCheckId } from "@emberladder/furnace";
import { isAsking } from "@emberladder/trees";
import type { TreeNode } from "@emberladder/trees";
import { Navigate, NavigationType, useNavigationType, useSearchParams } from "react-router-dom";
import { paths } from "#lib/paths.ts";
import { CheckPage } from "../check/check-page.tsx";
import { DoStep } from "../check/do-step.tsx";
import { HandOver } from "../check/hand-over.tsx";
import { useDiagnosis } from "../diagnosis-context.tsx";

/**
 * The next step of the walk: a check of the tree, a check chosen by hand (`?check=`), something to do, or a
 * hand-over. A conclusion has a screen of its own. A check that is gone back to, or opened to be changed, shows
 * what was recorded; a check that is to be taken again is empty.
 */
export function CheckScreen() {
  const { diagnosisId, state, tree } = useDiagnosis();
  const [search] = useSearchParams();
  const chosen = search.get("check");
  const isSeenAgain = useNavigationType() === NavigationType.Pop || search.has("change");
  const position = tree ? treePosition(tree, state) : null;
  const node: TreeNode | null = position?.node ?? null;

  if (chosen && isCheckId(chosen)) {
    const onNode = node && isAsking(node) && node.check === chosen ? node : undefined;
    // A reading from before the repair says nothing of the unit after it.
    const given =
      isSeenAgain && !onNode
        ? state.observations.findLast(
            (one) => one.check === chosen && Boolean(one.afterRepair) === state.repairs.length > 0,
          )
        : undefined;
    return <CheckPage key={`${chosen} ${onNode?.id ?? ""}`} check={chosen} node={onNode} given={given} />;
  }
  if (state.current && isCheckId(state.current.check)) {
    const onNode = node && isAsking(node) && node.check === state.current.check ? node : undefined;
    return <CheckPage key={state.current.check} check={state.current.check} node={onNode} />;
  }
  if (!node) return <Navigate to={paths.diagnosis.causes(diagnosisId)} replace />;
  if (node.kind === "do") return <DoStep key={node.id} node={node} />;
  if (node.kind === "hand-over") return <HandOver key={node.id} node={node} />;
  if (node.kind === "conclude")
    return <Navigate to={paths.diagnosis.conclude(diagnosisId, node.fault)} replace />;
  if (isAsking(node) && isCheckId(node.check))
    return <CheckPage key={node.id} check={node.check} node={node} />;
  return <Navigate to={paths.diagnosis.causes(diagnosisId)} replace />;
}
