import type { RejectionCode } from "@emberladder/contract";
import { inTransaction, isReferenceMissing, readDuplicateKey } from "@emberladder/db";
import type { Transaction } from "@emberladder/db";
import { GENESIS_HASH } from "@emberladder/diagnosis";
import type { Actor } from "#http/actor.ts";
import type { RequestContext } from "#http/route.ts";
import { followUp, projectRow } from "./follow-up.ts";
import { readOpening } from "./judge.ts";
import { judgeItems, NeedsCare } from "./judge-items.ts";
import type { Judged } from "./judge-items.ts";
import type { GoodItem } from "./read-batch.ts";
import { findKeptHead, keepHead, readHead } from "./record-head.ts";
import type { KeptHead, RecordHead } from "./record-head.ts";
import {
  areOfCompany,
  findKnownEvents,
  insertDiagnosis,
  insertEvents,
  insertFlags,
  lockDiagnosis,
  moveHead,
} from "./repository.ts";
import type { DiagnosisRow } from "./repository.ts";

type Context = RequestContext<Actor>;

/** What became of the events of one diagnosis, in their order. */
export type GroupVerdict = Pick<Judged, "accepted" | "duplicate" | "refused" | "flags"> & {
  /** Place of the last event of the diagnosis; undefined when it is not the company's. */
  head: number | undefined;
};

interface Outcome {
  verdict: GroupVerdict;
  keep?: KeptHead;
}

/**
 * Appends the events of one diagnosis in one transaction, as far as they are good.
 *
 * Most batches simply go on from a head that this process committed itself, or open a diagnosis: the quick ways
 * write at once, and the database refuses them where it is not so after all. Whatever is not so simple (another
 * process's head, a repetition, a break, a place of another company) goes the careful way: the row is locked,
 * the record read, and earlier events looked up, to tell which event is which.
 */
export async function appendGroup(context: Context, items: readonly GoodItem[]): Promise<GroupVerdict> {
  const [first] = items;
  if (!first) throw new Error("A group has at least one event.");
  const work = (way: (tx: Transaction) => Promise<Outcome>) => inTransaction(context.database, way);
  const careful = (tx: Transaction) => appendCarefully(tx, context, items, first);
  const quick = quickWay(context, items, first);
  let outcome: Outcome;
  try {
    outcome = await work(quick ?? careful);
  } catch (error) {
    const isUnderstood =
      error instanceof NeedsCare || readDuplicateKey(error) !== undefined || isReferenceMissing(error);
    if (!isUnderstood) throw error;
    outcome = await work(careful);
  }
  if (outcome.keep) keepHead(first.envelope.diagnosisId, outcome.keep);
  return outcome.verdict;
}

/** How to write without looking first; undefined where there is nothing to go on from. */
function quickWay(
  context: Context,
  items: readonly GoodItem[],
  first: GoodItem,
): ((tx: Transaction) => Promise<Outcome>) | undefined {
  const kept = findKeptHead(first.envelope.diagnosisId);
  if (kept && kept.row.companyId === context.actor.companyId) {
    const { row, head } = kept;
    return async (tx) =>
      write(tx, context, { row, head, isNew: false }, judgeItems(items, head, undefined, context));
  }
  const row = newRowOf(context, first);
  if (!row || kept) return undefined;
  return async (tx) => {
    const head = await readHead(tx, row, readOpening(first.read)?.tree ?? null);
    return write(tx, context, { row, head, isNew: true }, judgeItems(items, head, undefined, context));
  };
}

async function appendCarefully(
  tx: Transaction,
  context: Context,
  items: readonly GoodItem[],
  first: GoodItem,
): Promise<Outcome> {
  const { companyId } = context.actor;
  const existing = await lockDiagnosis(tx, first.envelope.diagnosisId);
  const row = existing ?? newRowOf(context, first);
  if (row === undefined) return refuseAll(first, "not-opened");
  if (row.companyId !== companyId) return refuseAll(first, "unknown-diagnosis");
  if (!existing && !(await areOfCompany(tx, companyId, row))) return refuseAll(first, "not-opened");
  const head = await readHead(tx, row, readOpening(first.read)?.tree ?? null);
  const known = await findKnownEvents(
    tx,
    items.map(({ envelope }) => envelope),
  );
  return write(tx, context, { row, head, isNew: !existing }, judgeItems(items, head, known, context));
}

function refuseAll(item: GoodItem, code: RejectionCode): Outcome {
  return { verdict: { accepted: [], duplicate: [], refused: { item, code }, flags: [], head: undefined } };
}

/** The row of a new diagnosis by its opening; undefined when the event opens none. */
function newRowOf(
  { actor, now, environment }: Context,
  { read, envelope }: GoodItem,
): DiagnosisRow | undefined {
  const opening = readOpening(read);
  if (!opening) return undefined;
  const { callId, unitId } = opening;
  return {
    id: envelope.diagnosisId,
    companyId: actor.companyId,
    serverSeq: 0,
    chainHash: GENESIS_HASH,
    callId,
    unitId,
    technicianId: actor.personId,
    status: "open",
    outcome: null,
    lastStage: null,
    openedAt: new Date(envelope.occurredAt),
    lastEventAt: now,
    closedAt: null,
    flags: 0,
    waitsForRelease: false,
    wantsReport: false,
    isDemo: environment.mode === "demo",
  };
}

/** Writes what was judged new: the head moved on, the events, their flags, and what follows from them. */
async function write(
  tx: Transaction,
  context: Context,
  { row, head, isNew }: { row: DiagnosisRow; head: RecordHead; isNew: boolean },
  judged: Judged,
): Promise<Outcome> {
  const { accepted, duplicate, refused, flags, rows } = judged;
  const verdict = { accepted, duplicate, refused, flags, head: judged.head.serverSeq };
  if (rows.length === 0) return { verdict };
  const change = await projectRow(tx, context, { row, before: head, judged });
  if (isNew) await insertDiagnosis(tx, { ...row, ...change, flags: flags.length });
  else if (!(await moveHead(tx, head, row.id, { ...change, newFlags: flags.length }))) throw new NeedsCare();
  await insertEvents(tx, rows);
  await insertFlags(
    tx,
    flags.map(({ eventId, rule, params }) => ({
      id: context.newId(),
      companyId: row.companyId,
      diagnosisId: row.id,
      eventId,
      rule,
      params: params ? JSON.stringify(params) : null,
      createdAt: context.now,
    })),
  );
  await followUp(tx, context, {
    row,
    before: head,
    after: judged.head,
    isNew,
    mustWait: change.waitsForRelease === true,
  });
  return { verdict, keep: { row: { ...row, ...change }, head: judged.head } };
}
