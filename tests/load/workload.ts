import { chainHashOf, canonicalText, command, GENESIS_HASH } from "@emberladder/diagnosis";
import type { Envelope } from "@emberladder/diagnosis";
import { arrivalOf, inventNote, recordOf, referenceCalls, sealRecord } from "@emberladder/db/seed";
import type { RecordStep } from "@emberladder/db/seed";
import { v5 as uuidv5, v7 as uuidv7 } from "uuid";

/** What somebody's events are made for: their company, call, unit and phone. */
export interface Sender {
  companyId: string;
  personId: string;
  deviceId: string;
  callId: string;
  unitId: string;
  tree: { id: string; version: number; hash: string } | null;
  /** Number of the phone's next event. */
  nextSeq: number;
}

/** Events of one whole visit, as many as a phone sends after a call without signal. */
export const EVENTS_OF_A_VISIT = 50;

/**
 * One whole visit of fifty events, from the opening to the report: an invented reference call, with the unit
 * switched off and on before the closing until there are fifty.
 */
export function makeVisit(sender: Sender): Envelope[] {
  const [call] = referenceCalls;
  if (!call) throw new Error("There is a reference call.");
  const diagnosisId = uuidv7();
  const eventId = (index: number) => uuidv5(String(index), diagnosisId);
  const steps = recordOf(call, {
    callId: sender.callId,
    unitId: sender.unitId,
    tree: sender.tree,
    eventId,
    noteRef: (text) => inventNote(diagnosisId, text).hash,
  });
  const close = steps.findIndex((step) => step.command.type === "diagnosis.closed");
  const minute = steps[close]?.minute ?? 0;
  const more = Array.from({ length: EVENTS_OF_A_VISIT - steps.length }, (_none, index): RecordStep => ({
    minute,
    command: command("unit-state.set", { power: index % 2 === 0 ? "off" : "on" }),
  }));
  const events = sealRecord([...steps.slice(0, close), ...more, ...steps.slice(close)], {
    diagnosisId,
    device: { id: sender.deviceId, firstSeq: sender.nextSeq },
    start: arrivalOf(call),
    eventId,
  });
  sender.nextSeq += events.length;
  return events;
}

/** The rows that the same events come to in the table of events, as a bare server would be given them. */
export function makeRows(events: readonly Envelope[], sender: Sender): unknown[][] {
  let previousChainHash = GENESIS_HASH;
  return events.map((event, index) => {
    const receivedAt = Date.UTC(2026, 0, 12);
    const chainHash = chainHashOf({
      previousChainHash,
      hash: event.hash,
      serverSeq: index + 1,
      actorId: sender.personId,
      receivedAt,
    });
    previousChainHash = chainHash;
    return [
      event.id,
      sender.companyId,
      event.diagnosisId,
      event.deviceId,
      event.deviceSeq,
      index + 1,
      event.type,
      event.schemaVersion,
      canonicalText(event),
      event.hash,
      event.prevHash,
      chainHash,
      sender.personId,
      new Date(receivedAt).toISOString().slice(0, 23).replace("T", " "),
    ];
  });
}
