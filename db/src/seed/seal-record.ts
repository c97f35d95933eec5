import { GENESIS_HASH, noteHash, seal, sha256Hex } from "@emberladder/diagnosis";
import type { Envelope, NoteText } from "@emberladder/diagnosis";
import type { ReferenceCall } from "./reference-call.ts";
import type { RecordStep } from "./reference-record.ts";

/** The phone that a record made from a reference call says it was kept on. */
export interface RecordDevice {
  id: string;
  /** Number of the record's first event among all that the phone ever made. */
  firstSeq: number;
}

/** Minutes between UTC and the winter time of the reference calls, all of them in January. */
const TZ_OFFSET_MIN = -420;

/** When somebody arrived at a reference call, UTC milliseconds. */
export function arrivalOf(call: ReferenceCall): number {
  return Date.parse(`${call.job.date}T${call.job.arrived}:00-07:00`);
}

/**
 * The steps of a record as a phone would have sealed them: numbered, linked and hashed.
 * @param eventId the id of the n-th event, the same that the steps were made with
 */
export function sealRecord(
  steps: readonly RecordStep[],
  {
    diagnosisId,
    device,
    start,
    eventId,
  }: { diagnosisId: string; device: RecordDevice; start: number; eventId: (index: number) => string },
): Envelope[] {
  let prevHash = GENESIS_HASH;
  return steps.map(({ minute, command }, index) => {
    const event = seal({
      id: eventId(index),
      diagnosisId,
      deviceId: device.id,
      deviceSeq: device.firstSeq + index,
      type: command.type,
      schemaVersion: 1,
      body: command.body,
      occurredAt: start + minute * 60_000,
      tzOffsetMin: TZ_OFFSET_MIN,
      monotonicMs: minute * 60_000 + index,
      serverOffsetMs: 0,
      appBuild: "invented example",
      prevHash,
    });
    prevHash = event.hash;
    return event;
  });
}

/** A free text of an invented record. Its salt follows from the record, so that making it again gives the same. */
export function inventNote(diagnosisId: string, text: string): NoteText {
  const salt = sha256Hex(`${diagnosisId}\n${text}`).slice(0, 32);
  return { salt, text, hash: noteHash(salt, text) };
}
