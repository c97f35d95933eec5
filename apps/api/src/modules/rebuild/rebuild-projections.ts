import { isDeepStrictEqual } from "node:util";
import { inTransaction } from "@emberladder/db";
import type { Database, Transaction } from "@emberladder/db";
import { readOpening, readEventBody } from "#modules/sync/judge.ts";
import { readPinnedTree } from "#modules/sync/pinned-tree.ts";
import {
  insertFlags,
  listEventsOf,
  lockDiagnosis,
  readStoredEvent,
  runStatement,
  toMoveCall,
} from "#modules/sync/repository.ts";
import type { DiagnosisRow, EventRow } from "#modules/sync/repository.ts";
import { replayRecord } from "./replay-record.ts";
import type { ReplayedRecord } from "./replay-record.ts";
import {
  deleteFlags,
  findMovableCall,
  listDiagnosisIds,
  listFlagRows,
  updateDiagnosis,
} from "./repository.ts";

/** What a rebuild found and changed. */
export interface RebuildSummary {
  diagnoses: number;
  diagnosesChanged: number;
  flagsAdded: number;
  flagsRemoved: number;
  callsMoved: number;
  /** Diagnoses whose record cannot be replayed: left as they are. */
  unreadable: string[];
}

/** Diagnoses looked at between two looks at the list of ids. */
const PAGE = 200;
/** Said of who recorded it, and so not to be found in the record; set at receipt and kept. */
const RULES_OF_RECEIPT = ["recorded-by-trainee"];

type Sources = { database: Database; newId: () => string };

/**
 * Works out again, from the events alone, everything that is kept beside them for lists and jobs: the columns
 * of the diagnoses, the flags, and how far calls are. Heads of chains and releases by a supervisor are not
 * projections and stay. Each diagnosis is rebuilt under its lock, so the product may run meanwhile.
 */
export async function rebuildProjections(sources: Sources): Promise<RebuildSummary> {
  const summary: RebuildSummary = {
    diagnoses: 0,
    diagnosesChanged: 0,
    flagsAdded: 0,
    flagsRemoved: 0,
    callsMoved: 0,
    unreadable: [],
  };
  const lastMoves = new Map<string, ReplayedRecord["call"]>();
  let last: string | undefined;
  for (;;) {
    const ids = await listDiagnosisIds(sources.database, last, PAGE);
    for (const id of ids) {
      const replayed = await inTransaction(sources.database, async (tx) => rebuildOne(tx, sources, id));
      summary.diagnoses += 1;
      if (!replayed) {
        summary.unreadable.push(id);
        continue;
      }
      summary.diagnosesChanged += replayed.isChanged ? 1 : 0;
      summary.flagsAdded += replayed.added;
      summary.flagsRemoved += replayed.removed;
      const known = lastMoves.get(replayed.callId);
      if (!known || known.at < replayed.move.at) lastMoves.set(replayed.callId, replayed.move);
    }
    last = ids.at(-1);
    if (ids.length < PAGE) break;
  }
  for (const [callId, move] of lastMoves)
    if (await settleCall(sources.database, callId, move)) summary.callsMoved += 1;
  return summary;
}

async function rebuildOne(tx: Transaction, sources: Sources, diagnosisId: string) {
  const row = await lockDiagnosis(tx, diagnosisId);
  if (!row) return undefined;
  const events = await listEventsOf(tx, diagnosisId);
  const tree = await readPinnedTree(tx, row.companyId, pinOf(events));
  const replayed = replayRecord(events, tree);
  if (!replayed) return undefined;
  const flags = await rebuildFlags(tx, sources, row, replayed.flags);
  const change = { ...replayed.columns, flags: flags.count };
  const present = Object.fromEntries(Object.keys(change).map((key) => [key, row[key as keyof DiagnosisRow]]));
  const isChanged = !isDeepStrictEqual(present, change);
  if (isChanged) await updateDiagnosis(tx, diagnosisId, change);
  return {
    isChanged,
    added: flags.added,
    removed: flags.removed,
    callId: replayed.columns.callId,
    move: replayed.call,
  };
}

function pinOf([first]: readonly EventRow[]) {
  if (!first) return null;
  return readOpening(readEventBody(readStoredEvent(first)))?.tree ?? null;
}

/** Brings the flags in line: those that stay keep their rows, so that rebuilding what is right changes nothing. */
async function rebuildFlags(
  tx: Transaction,
  { newId }: Sources,
  row: DiagnosisRow,
  wanted: ReplayedRecord["flags"],
) {
  const present = await listFlagRows(tx, row.id);
  const spare = present.filter(({ rule }) => !RULES_OF_RECEIPT.includes(rule));
  const missing = wanted.filter((flag) => {
    const params = flag.params ? JSON.stringify(flag.params) : null;
    const place = spare.findIndex(
      (known) => known.eventId === flag.eventId && known.rule === flag.rule && known.params === params,
    );
    if (place >= 0) spare.splice(place, 1);
    return place < 0;
  });
  await deleteFlags(
    tx,
    spare.map(({ id }) => id),
  );
  await insertFlags(
    tx,
    missing.map(({ eventId, rule, params, at }) => ({
      id: newId(),
      companyId: row.companyId,
      diagnosisId: row.id,
      eventId,
      rule,
      params: params ? JSON.stringify(params) : null,
      createdAt: at,
    })),
  );
  return {
    added: missing.length,
    removed: spare.length,
    count: present.length - spare.length + missing.length,
  };
}

async function settleCall(
  database: Database,
  callId: string,
  { status, doneAt }: ReplayedRecord["call"],
): Promise<boolean> {
  const call = await findMovableCall(database, callId);
  if (!call || (call.status === status && call.doneAt?.getTime() === doneAt?.getTime())) return false;
  await runStatement(database, toMoveCall(database, callId, status, doneAt));
  return true;
}
