import type { TreeDocument } from "@emberladder/trees";
import { flagsOf } from "#modules/sync/flags.ts";
import { evolveState, initialState, projectState, readEventBody } from "#modules/sync/judge.ts";
import type { Breach, DiagnosisState, ReadBody } from "#modules/sync/judge.ts";
import { readStoredEvent } from "#modules/sync/repository.ts";
import type { DiagnosisRow, EventRow } from "#modules/sync/repository.ts";

/** A flag of an event, with the time at which the event was received. */
export interface ReplayedFlag extends Breach {
  eventId: string;
  at: Date;
}

/** What a record says, event by event, of everything that is kept beside it. */
export interface ReplayedRecord {
  /** The columns of the diagnosis, but for its head and for whether it waits for a supervisor. */
  columns: Pick<
    DiagnosisRow,
    | "callId"
    | "unitId"
    | "technicianId"
    | "status"
    | "outcome"
    | "lastStage"
    | "openedAt"
    | "lastEventAt"
    | "closedAt"
    | "wantsReport"
  >;
  flags: ReplayedFlag[];
  /** How the diagnosis last moved its call, and when. */
  call: { status: "under-way" | "done"; doneAt: Date | null; at: Date };
}

/**
 * Replays a stored record as it was received: batch by batch, each event judged on the state before it.
 * Undefined for a record without an opening, which only an alteration by hand can leave.
 *
 * What depends on who somebody was at that time (a trainee) is not in the record, and so not in the result.
 */
export function replayRecord(
  rows: readonly EventRow[],
  tree: TreeDocument | null,
): ReplayedRecord | undefined {
  const [first, last] = [rows.at(0), rows.at(-1)];
  let state = initialState;
  const devices = new Set<string>();
  const flags: ReplayedFlag[] = [];
  let call: ReplayedRecord["call"] | undefined;
  for (const batch of batchesOf(rows)) {
    const wasClosed = state.closed !== null;
    for (const row of batch) {
      const event = readStoredEvent(row);
      const parsed = readEventBody(event);
      const read: ReadBody = parsed.kind === "malformed" ? { kind: "unknown" } : parsed;
      for (const flag of flagsOf(event, read, { state, devices, tree }, "technician"))
        flags.push({ ...flag, eventId: row.id, at: row.receivedAt });
      state = evolveState(state, event, event);
      devices.add(row.deviceId);
    }
    const at = batch[0]?.receivedAt;
    if (at && (!call || wasClosed !== (state.closed !== null))) call = moveOf(state, at);
  }
  if (!first || !last || !state.opened || !call) return undefined;
  const projected = projectState(state);
  return {
    columns: {
      callId: state.opened.callId,
      unitId: state.opened.unitId,
      technicianId: first.actorId,
      status: projected.isClosed ? "closed" : "open",
      outcome: projected.outcome,
      lastStage: projected.lastStage,
      openedAt: new Date(state.opened.at),
      lastEventAt: last.receivedAt,
      closedAt: projected.closedAt,
      wantsReport: projected.wantsReport,
    },
    flags,
    call,
  };
}

function moveOf(state: DiagnosisState, at: Date): ReplayedRecord["call"] {
  const { isClosed, closedAt } = projectState(state);
  return { status: isClosed ? "done" : "under-way", doneAt: closedAt, at };
}

/** Events that were received at the same time are one batch: what follows from them was settled once. */
function batchesOf(rows: readonly EventRow[]): EventRow[][] {
  const batches: EventRow[][] = [];
  for (const row of rows) {
    const batch = batches.at(-1);
    if (batch?.[0]?.receivedAt.getTime() === row.receivedAt.getTime()) batch.push(row);
    else batches.push([row]);
  }
  return batches;
}
