import { Navigate } from "react-router-dom";
import { useDiagnosis } from "../diagnosis-context.tsx";
import { pathOfNext } from "../walk-machine.ts";

/** Opens a diagnosis where it stands: the screen of its next step. */
export function NextScreen() {
  const { diagnosisId, state, tree } = useDiagnosis();
  return <Navigate to={pathOfNext(diagnosisId, state, tree)} replace />;
}
