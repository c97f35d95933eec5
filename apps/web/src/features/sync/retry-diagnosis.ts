import { localStore } from "#lib/store/database.ts";
import { requestSend } from "#lib/store/sender.ts";

/** Takes back the refusals of a diagnosis, so that its steps are offered to the server again. */
export async function retryDiagnosis(diagnosisId: string): Promise<void> {
  await localStore.outbox
    .where("diagnosisId")
    .equals(diagnosisId)
    .modify((row) => {
      delete row.problem;
    });
  requestSend();
}
