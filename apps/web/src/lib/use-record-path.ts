import { useCallback } from "react";
import { paths } from "./paths.ts";
import { useSession } from "./session.tsx";

/** Where this person reads how a diagnosis was reached: in the review, or as a list of its steps. */
export function useRecordPath(): (diagnosisId: string) => string {
  const { can } = useSession();
  return useCallback(
    (diagnosisId) =>
      can("diagnosis:review") ? paths.reviewOf(diagnosisId) : paths.diagnosis.record(diagnosisId),
    [can],
  );
}
