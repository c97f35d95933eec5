import { GENESIS_HASH } from "@emberladder/diagnosis";
import type { Queryable } from "@emberladder/db";
import { evolveState, initialState } from "./judge.ts";
import type { DiagnosisState } from "./judge.ts";
import { listEventsOf, readStoredEvent } from "./repository.ts";

/** What is known of a diagnosis at its head: its folded state, and each device's last event. */
export interface RecordHead {
  serverSeq: number;
  chainHash: string;
  state: DiagnosisState;
  lastOfDevice: ReadonlyMap<string, { hash: string; deviceSeq: number }>;
}

/** A diagnosis before its first event. */
export const emptyHead: RecordHead = {
  serverSeq: 0,
  chainHash: GENESIS_HASH,
  state: initialState,
  lastOfDevice: new Map(),
};

/** Heads kept in the process. Only ever used when it is the very head that the database has locked. */
const MOST_HEADS = 300;
const kept = new Map<string, RecordHead>();

/**
 * The record of a diagnosis at a head. From memory where this process wrote that head itself, so that a
 * single event costs no re-reading; else folded again from the stored events.
 */
export async function readHead(
  db: Queryable,
  diagnosisId: string,
  at: { serverSeq: number; chainHash: string },
): Promise<RecordHead> {
  if (at.serverSeq === 0) return emptyHead;
  const known = kept.get(diagnosisId);
  if (known && known.serverSeq === at.serverSeq && known.chainHash === at.chainHash) return known;
  const rows = await listEventsOf(db, diagnosisId);
  let state = initialState;
  const lastOfDevice = new Map<string, { hash: string; deviceSeq: number }>();
  for (const row of rows) {
    state = evolveState(state, readStoredEvent(row), row);
    lastOfDevice.set(row.deviceId, row);
  }
  return { ...at, state, lastOfDevice };
}

/** Keeps a head that was committed. */
export function keepHead(diagnosisId: string, head: RecordHead): void {
  kept.delete(diagnosisId);
  kept.set(diagnosisId, head);
  const oldest = kept.size > MOST_HEADS ? kept.keys().next().value : undefined;
  if (oldest !== undefined) kept.delete(oldest);
}
