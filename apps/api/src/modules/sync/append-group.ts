import type { RejectionCode } from "@emberladder/contract";
import { can } from "@emberladder/contract";
import { inTransaction, readDuplicateKey } from "@emberladder/db";
import type { Transaction } from "@emberladder/db";
import { chainHashOf, GENESIS_HASH } from "@emberladder/diagnosis";
import { profileProblems } from "@emberladder/furnace";
import type { Actor } from "#http/actor.ts";
import type { RequestContext } from "#http/route.ts";
import { enqueueJob } from "#modules/jobs/repository.ts";
import { flagsOf, INFORMATIVE_RULES } from "./flags.ts";
import { evolveState, projectState, readOpening } from "./judge.ts";
import type { Breach } from "./judge.ts";
import type { GoodItem } from "./read-batch.ts";
import { keepHead, readHead } from "./record-head.ts";
import type { RecordHead } from "./record-head.ts";
import {
  areOfCompany,
  findKnownEvents,
  insertDiagnosis,
  insertEvents,
  insertFlags,
  listFlagRules,
  lockDiagnosis,
  moveCall,
  replaceProfile,
  updateDiagnosis,
} from "./repository.ts";
import type { DiagnosisRow } from "./repository.ts";

type Context = RequestContext<Actor>;

/** What became of the events of one diagnosis, in their order. */
export interface GroupVerdict {
  accepted: { id: string; serverSeq: number }[];
  duplicate: { id: string; serverSeq: number }[];
  /** The first that was refused; those after it wait. */
  refused: { item: GoodItem; code: RejectionCode } | undefined;
  flags: (Breach & { eventId: string })[];
  /** Place of the last event of the diagnosis; undefined when it is not the company's. */
  head: number | undefined;
}

/** Thrown inside the quick way, which looks nothing up, to start over in the careful one. */
class NeedsCare extends Error {}

/**
 * Appends the events of one diagnosis in one transaction, as far as they are good. Most batches hold only new
 * events, so the quick way inserts without looking for earlier ones; the unique keys of the database and the
 * device link then show a repetition, and the careful way tells which event is which.
 */
export async function appendGroup(context: Context, items: readonly GoodItem[]): Promise<GroupVerdict> {
  try {
    return await append(context, items, { isCareful: false });
  } catch (error) {
    if (!(error instanceof NeedsCare) && readDuplicateKey(error) === undefined) throw error;
    return append(context, items, { isCareful: true });
  }
}

async function append(context: Context, items: readonly GoodItem[], { isCareful }: { isCareful: boolean }) {
  const [first] = items;
  if (!first) throw new Error("A group has at least one event.");
  const { diagnosisId } = first.envelope;
  let newHead: RecordHead | undefined;
  const verdict = await inTransaction(context.database, async (tx): Promise<GroupVerdict> => {
    newHead = undefined;
    const existing = await lockDiagnosis(tx, diagnosisId);
    const row = existing ?? (await readNewDiagnosis(tx, context, first));
    if (row === undefined) return refuseAll(first, "not-opened");
    if (row.companyId !== context.actor.companyId) return refuseAll(first, "unknown-diagnosis");
    const head = await readHead(tx, diagnosisId, row);
    const known = isCareful
      ? await findKnownEvents(
          tx,
          items.map(({ envelope }) => envelope),
        )
      : [];
    const judged = judgeItems(context, items, head, known, isCareful);
    if (judged.rows.length > 0) {
      if (!existing) {
        await insertDiagnosis(tx, row);
        await moveCall(tx, row.callId, "under-way", null);
      }
      await insertEvents(tx, judged.rows);
      await insertFlags(
        tx,
        judged.flags.map(({ eventId, rule, params }) => ({
          id: context.newId(),
          companyId: row.companyId,
          diagnosisId,
          eventId,
          rule,
          params: params ? JSON.stringify(params) : null,
          createdAt: context.now,
        })),
      );
      await project(tx, context, row, head, judged.head, judged.flags.length);
      newHead = judged.head;
    }
    const { accepted, duplicate, refused, flags } = judged;
    return { accepted, duplicate, refused, flags, head: judged.head.serverSeq };
  });
  if (newHead) keepHead(diagnosisId, newHead);
  return verdict;
}

function refuseAll(item: GoodItem, code: RejectionCode): GroupVerdict {
  return { accepted: [], duplicate: [], refused: { item, code }, flags: [], head: undefined };
}

/** The row of a new diagnosis by its opening; undefined when the event does not open one rightly. */
async function readNewDiagnosis(
  tx: Transaction,
  { actor, now, environment }: Context,
  item: GoodItem,
): Promise<DiagnosisRow | undefined> {
  const opening = readOpening(item.read);
  if (!opening) return undefined;
  const { callId, unitId } = opening;
  if (!(await areOfCompany(tx, actor.companyId, { callId, unitId }))) return undefined;
  return {
    id: item.envelope.diagnosisId,
    companyId: actor.companyId,
    serverSeq: 0,
    chainHash: GENESIS_HASH,
    callId,
    unitId,
    technicianId: actor.personId,
    status: "open",
    outcome: null,
    lastStage: null,
    openedAt: new Date(item.envelope.occurredAt),
    lastEventAt: now,
    closedAt: null,
    flags: 0,
    waitsForRelease: false,
    wantsReport: false,
    isDemo: environment.mode === "demo",
  };
}

type Known = Awaited<ReturnType<typeof findKnownEvents>>[number];

function judgeItems(
  { actor, now }: Context,
  items: readonly GoodItem[],
  head: RecordHead,
  known: readonly Known[],
  isCareful: boolean,
) {
  const byId = new Map(known.map((event) => [event.id, event]));
  const byNumber = new Map(known.map((event) => [`${event.deviceId} ${event.deviceSeq}`, event]));
  const accepted: GroupVerdict["accepted"] = [];
  const duplicate: GroupVerdict["duplicate"] = [];
  const flags: GroupVerdict["flags"] = [];
  const rows: Parameters<typeof insertEvents>[1] = [];
  const lastOfDevice = new Map(head.lastOfDevice);
  let { serverSeq, chainHash, state } = head;
  let refused: GroupVerdict["refused"];
  const receivedAt = now.getTime();

  for (const item of items) {
    const { envelope } = item;
    const same = byId.get(envelope.id);
    const numbered = byNumber.get(`${envelope.deviceId} ${envelope.deviceSeq}`);
    const last = lastOfDevice.get(envelope.deviceId);
    if (same && same.hash === envelope.hash && same.diagnosisId === envelope.diagnosisId) {
      duplicate.push({ id: envelope.id, serverSeq: same.serverSeq });
      continue;
    }
    const isLinked =
      envelope.prevHash === (last?.hash ?? GENESIS_HASH) && envelope.deviceSeq > (last?.deviceSeq ?? 0);
    if (!isLinked && !isCareful) throw new NeedsCare();
    const code = same ? "conflict" : numbered ? "seq-conflict" : isLinked ? undefined : "broken-link";
    if (code) {
      refused = { item, code };
      break;
    }
    serverSeq += 1;
    chainHash = chainHashOf({
      previousChainHash: chainHash,
      hash: envelope.hash,
      serverSeq,
      actorId: actor.personId,
      receivedAt,
    });
    for (const flag of flagsOf(
      envelope,
      item.read,
      { state, devices: new Set(lastOfDevice.keys()) },
      actor.role,
    ))
      flags.push({ ...flag, eventId: envelope.id });
    state = evolveState(state, envelope, { serverSeq, actorId: actor.personId });
    lastOfDevice.set(envelope.deviceId, envelope);
    const taken = { ...envelope, serverSeq };
    byId.set(envelope.id, taken);
    byNumber.set(`${envelope.deviceId} ${envelope.deviceSeq}`, taken);
    accepted.push({ id: envelope.id, serverSeq });
    rows.push({
      id: envelope.id,
      companyId: actor.companyId,
      diagnosisId: envelope.diagnosisId,
      deviceId: envelope.deviceId,
      deviceSeq: envelope.deviceSeq,
      serverSeq,
      type: envelope.type,
      schemaVersion: envelope.schemaVersion,
      canonicalText: item.text,
      hash: envelope.hash,
      prevHash: envelope.prevHash,
      chainHash,
      actorId: actor.personId,
      receivedAt: now,
    });
  }
  return { accepted, duplicate, refused, flags, rows, head: { serverSeq, chainHash, state, lastOfDevice } };
}

/** Writes the new head and what follows from the events: lists, the call, the unit, and the report's job. */
async function project(
  tx: Transaction,
  context: Context,
  row: DiagnosisRow,
  before: RecordHead,
  after: RecordHead,
  newFlags: number,
): Promise<void> {
  const { actor, now, newId } = context;
  const is = projectState(after.state);
  const was = projectState(before.state);
  const startsReport = is.wantsReport && !was.wantsReport;
  const mustWait =
    startsReport && (await listFlagRules(tx, row.id)).some((rule) => !INFORMATIVE_RULES.includes(rule));
  await updateDiagnosis(tx, row.id, {
    serverSeq: after.serverSeq,
    chainHash: after.chainHash,
    lastEventAt: now,
    status: is.isClosed ? "closed" : "open",
    outcome: is.outcome,
    lastStage: is.lastStage,
    closedAt: is.closedAt,
    flags: row.flags + newFlags,
    wantsReport: is.wantsReport,
    ...(startsReport ? { waitsForRelease: mustWait } : {}),
  });
  if (is.isClosed !== was.isClosed)
    await moveCall(tx, row.callId, is.isClosed ? "done" : "under-way", is.closedAt);
  const { confirmed, profile } = after.state;
  const isCorrected =
    confirmed?.changedUnit === true && confirmed.eventId !== before.state.confirmed?.eventId;
  if (isCorrected && profile && can(actor.role, "unit:write") && profileProblems(profile).length === 0)
    await replaceProfile(tx, row.companyId, row.unitId, profile);
  if (startsReport && !mustWait)
    await enqueueJob(tx, {
      id: newId(),
      companyId: row.companyId,
      kind: "report.render",
      payload: { diagnosisId: row.id },
      now,
    });
}
