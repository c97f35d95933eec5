import { GENESIS_HASH } from "@emberladder/diagnosis";
import type { Queryable } from "@emberladder/db";
import type { TreeDocument } from "@emberladder/trees";
import { evolveState, initialState } from "./judge.ts";
import type { DiagnosisState } from "./judge.ts";
import { readPinnedTree } from "./pinned-tree.ts";
import type { TreePin } from "./pinned-tree.ts";
import { listEventsOf, readStoredEvent } from "./repository.ts";
import type { DiagnosisRow } from "./repository.ts";

/** What is known of a diagnosis at its head: its folded state, and each device's last event. */
export interface RecordHead {
  serverSeq: number;
  chainHash: string;
  state: DiagnosisState;
  lastOfDevice: ReadonlyMap<string, { hash: string; deviceSeq: number }>;
  /** The document of the tree that the diagnosis pinned; null where there is none. */
  tree: TreeDocument | null;
}

const emptyHead: RecordHead = {
  serverSeq: 0,
  chainHash: GENESIS_HASH,
  state: initialState,
  lastOfDevice: new Map(),
  tree: null,
};

/** A head with the row it belongs to, as this process committed them last. */
export interface KeptHead {
  row: DiagnosisRow;
  head: RecordHead;
}

/**
 * Heads kept in the process. One is only ever used where the database confirms, under its lock, that it is
 * still the head: another process may have gone on from it.
 */
const MOST_HEADS = 300;
const kept = new Map<string, KeptHead>();

/** The head as this process knows it; it may be old. */
export function findKeptHead(diagnosisId: string): KeptHead | undefined {
  return kept.get(diagnosisId);
}

/** Keeps a head that was committed, until its report is asked for: hardly anything follows then. */
export function keepHead(diagnosisId: string, entry: KeptHead): void {
  kept.delete(diagnosisId);
  if (entry.head.state.closed && entry.head.state.report) return;
  kept.set(diagnosisId, entry);
  const oldest = kept.size > MOST_HEADS ? kept.keys().next().value : undefined;
  if (oldest !== undefined) kept.delete(oldest);
}

/**
 * The record of a diagnosis at the head of its locked row: from memory where that is it, else folded again.
 * @param pin the tree that an opening pins, where the row is a new one
 */
export async function readHead(db: Queryable, row: DiagnosisRow, pin: TreePin): Promise<RecordHead> {
  if (row.serverSeq === 0) return { ...emptyHead, tree: await readPinnedTree(db, row.companyId, pin) };
  const known = kept.get(row.id)?.head;
  if (known && known.serverSeq === row.serverSeq && known.chainHash === row.chainHash) return known;
  let state = initialState;
  const lastOfDevice = new Map<string, { hash: string; deviceSeq: number }>();
  for (const event of await listEventsOf(db, row.id)) {
    state = evolveState(state, readStoredEvent(event), event);
    lastOfDevice.set(event.deviceId, { hash: event.hash, deviceSeq: event.deviceSeq });
  }
  const tree = await readPinnedTree(db, row.companyId, state.opened?.tree ?? null);
  return { serverSeq: row.serverSeq, chainHash: row.chainHash, state, lastOfDevice, tree };
}
