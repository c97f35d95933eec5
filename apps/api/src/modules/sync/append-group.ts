import type { RejectionCode } from "@emberladder/contract";
import {
  inTransaction,
  isNothingChanged,
  isReferenceMissing,
  readDuplicateKey,
  writeAtOnce,
} from "@emberladder/db";
import type { Queryable, Transaction } from "@emberladder/db";
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
  lockDiagnosis,
  runStatement,
  toInsertDiagnosis,
  toInsertEvents,
  toInsertFlags,
  toMoveHead,
} from "./repository.ts";
import type { DiagnosisRow, SQL } from "./repository.ts";

type Context = RequestContext<Actor>;

/** What became of the events of one diagnosis, in their order. */
export type GroupVerdict = Pick<Judged, "accepted" | "duplicate" | "refused" | "flags"> & {
  /** Place of the last event of the diagnosis; undefined when it is not the company's. */
  head: number | undefined;
};

interface Outcome {
  verdict: GroupVerdict;
  keep?: KeptHead;
  /** What is to be written, the head first; none where nothing is new. */
  statements?: [SQL, ...SQL[]];
}

/**
 * Appends the events of one diagnosis in one transaction, as far as they are good.
 *
 * Most batches simply go on from a head that this process committed itself, or open a diagnosis: the quick ways
 * write all at once without looking first, and the database refuses them where it is not so after all. Whatever
 * is not so simple (another process's head, a repetition, a break, a place of another company) goes the careful
 * way: the row is locked, the record read, and earlier events looked up, to tell which event is which.
 */
export async function appendGroup(context: Context, items: readonly GoodItem[]): Promise<GroupVerdict> {
  const [first] = items;
  if (!first) throw new Error("A group has at least one event.");
  const { database } = context;
  const outcome =
    (await tryQuickly(context, items, first)) ??
    (await inTransaction(database, async (tx) => appendCarefully(tx, context, items, first)));
  if (outcome.keep) keepHead(first.envelope.diagnosisId, outcome.keep);
  return outcome.verdict;
}

/** The quick ways; undefined where there is nothing to go on from, or where the database knows better. */
async function tryQuickly(
  context: Context,
  items: readonly GoodItem[],
  first: GoodItem,
): Promise<Outcome | undefined> {
  const { database } = context;
  try {
    const outcome = await planQuickly(context, items, first);
    if (outcome?.statements) await writeAtOnce(database, outcome.statements);
    return outcome;
  } catch (error) {
    const isUnderstood =
      error instanceof NeedsCare ||
      isNothingChanged(error) ||
      readDuplicateKey(error) !== undefined ||
      isReferenceMissing(error);
    if (!isUnderstood) throw error;
    return undefined;
  }
}

async function planQuickly(
  context: Context,
  items: readonly GoodItem[],
  first: GoodItem,
): Promise<Outcome | undefined> {
  const { database, actor } = context;
  const kept = findKeptHead(first.envelope.diagnosisId);
  if (kept && kept.row.companyId === actor.companyId) {
    const { row, head } = kept;
    return plan(database, context, { row, head, isNew: false }, judgeItems(items, head, undefined, context));
  }
  const row = newRowOf(context, first);
  if (!row || kept) return undefined;
  const head = await readHead(database, row, readOpening(first.read)?.tree ?? null);
  return plan(database, context, { row, head, isNew: true }, judgeItems(items, head, undefined, context));
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
  const judged = judgeItems(items, head, known, context);
  const outcome = await plan(tx, context, { row, head, isNew: !existing }, judged);
  for (const statement of outcome.statements ?? []) await runStatement(tx, statement);
  return outcome;
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

/** What there is to write for what was judged new: the head moved on, the events, their flags, what follows. */
async function plan(
  db: Queryable,
  context: Context,
  { row, head, isNew }: { row: DiagnosisRow; head: RecordHead; isNew: boolean },
  judged: Judged,
): Promise<Outcome> {
  const { accepted, duplicate, refused, flags, rows } = judged;
  const verdict = { accepted, duplicate, refused, flags, head: judged.head.serverSeq };
  if (rows.length === 0) return { verdict };
  const change = await projectRow(db, context, { row, before: head, judged });
  const flagRows = flags.map(({ eventId, rule, params }) => ({
    id: context.newId(),
    companyId: row.companyId,
    diagnosisId: row.id,
    eventId,
    rule,
    params: params ? JSON.stringify(params) : null,
    createdAt: context.now,
  }));
  const facts = {
    row,
    before: head,
    after: judged.head,
    isNew,
    mustWait: change.waitsForRelease === true,
  };
  return {
    verdict,
    keep: { row: { ...row, ...change }, head: judged.head },
    statements: [
      isNew
        ? toInsertDiagnosis(db, { ...row, ...change, flags: flags.length })
        : toMoveHead(db, head, row.id, { ...change, newFlags: flags.length }),
      toInsertEvents({
        companyId: row.companyId,
        diagnosisId: row.id,
        actorId: context.actor.personId,
        receivedAt: context.now,
        rows,
      }),
      ...(flagRows.length > 0 ? [toInsertFlags(db, flagRows)] : []),
      ...followUp(db, context, facts),
    ],
  };
}
