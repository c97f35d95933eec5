import { MAX_PULL_EVENTS, REJECTIONS } from "@emberladder/contract";
import type { InputOf, RejectionCode, sendBatch, Verdicts } from "@emberladder/contract";
import { noteHash } from "@emberladder/diagnosis";
import type { Actor } from "#http/actor.ts";
import type { RequestContext } from "#http/route.ts";
import { presentNotes } from "#modules/diagnoses/present-notes.ts";
import { appendGroup } from "./append-group.ts";
import { groupItems, isGood, readItem } from "./read-batch.ts";
import type { GoodItem, Item } from "./read-batch.ts";
import {
  insertNotes,
  listEventsAfter,
  listGoodDevices,
  listNotesOf,
  listOwnDiagnoses,
  readStoredEvent,
} from "./repository.ts";

type Context = RequestContext<Actor>;
type Batch = InputOf<typeof sendBatch>["body"];

/**
 * Takes a batch: each diagnosis by itself and in order, so that one refused event holds back only those that
 * build on it. What is named accepted or duplicate is in the record for good.
 */
export async function takeBatch(context: Context, batch: Batch): Promise<Verdicts> {
  const items = batch.events.map(readItem);
  const goodDevices = await readGoodDevices(context, items);
  const verdicts: Verdicts = {
    accepted: [],
    duplicate: [],
    rejected: [],
    flags: [],
    keptNotes: [],
    rejectedNotes: [],
    heads: {},
    serverTime: context.now.getTime(),
  };
  for (const group of groupItems(items)) await takeGroup(context, group, goodDevices, verdicts);
  await takeNotes(context, batch.notes, verdicts);
  verdicts.rejected.sort((a, b) => a.index - b.index);
  return verdicts;
}

async function readGoodDevices({ database, actor }: Context, items: readonly Item[]): Promise<Set<string>> {
  const named = new Set(items.filter(isGood).map(({ envelope }) => envelope.deviceId));
  // The session's own device was looked at with the session: revoking a device ends its sessions.
  const others = [...named].filter((id) => id !== actor.deviceId);
  const good = await listGoodDevices(database, actor.personId, others);
  if (actor.deviceId !== null) good.add(actor.deviceId);
  return good;
}

async function takeGroup(
  context: Context,
  group: readonly Item[],
  goodDevices: ReadonlySet<string>,
  verdicts: Verdicts,
): Promise<void> {
  const reject = (item: Item, code: RejectionCode, detail?: string) =>
    verdicts.rejected.push({
      id: isGood(item) ? item.envelope.id : item.id,
      index: item.index,
      code,
      retryable: REJECTIONS[code].retryable,
      ...(detail === undefined ? {} : { detail }),
    });

  const prefix: GoodItem[] = [];
  let stop: { item: Item; code: RejectionCode; detail?: string } | undefined;
  for (const item of group) {
    if (!isGood(item)) stop = { item, code: item.code, ...(item.detail ? { detail: item.detail } : {}) };
    else if (!goodDevices.has(item.envelope.deviceId)) stop = { item, code: "unknown-device" };
    else prefix.push(item);
    if (stop) break;
  }
  if (prefix.length > 0) {
    const verdict = await appendGroup(context, prefix);
    verdicts.accepted.push(...verdict.accepted);
    verdicts.duplicate.push(...verdict.duplicate);
    verdicts.flags.push(...verdict.flags);
    const [first] = prefix;
    if (first && verdict.head !== undefined) verdicts.heads[first.envelope.diagnosisId] = verdict.head;
    if (verdict.refused) stop = verdict.refused;
  }
  if (!stop) return;
  reject(stop.item, stop.code, stop.detail);
  for (const item of group) if (item.index > stop.item.index) reject(item, "after-refused");
}

async function takeNotes(
  { database, actor, now, newId }: Context,
  notes: Batch["notes"],
  verdicts: Verdicts,
) {
  if (notes.length === 0) return;
  const own = await listOwnDiagnoses(database, actor.companyId, [
    ...new Set(notes.map((note) => note.diagnosisId)),
  ]);
  const good = notes.filter(
    (note) => own.has(note.diagnosisId) && noteHash(note.salt, note.text) === note.hash,
  );
  await insertNotes(
    database,
    good.map((note) => ({ id: newId(), companyId: actor.companyId, createdAt: now, ...note })),
  );
  verdicts.keptNotes.push(...good.map(({ hash }) => hash));
  verdicts.rejectedNotes.push(...notes.filter((note) => !good.includes(note)).map(({ hash }) => hash));
}

/** Events after the heads that a client has, with the texts of the diagnoses that have any. */
export async function pullAfterHeads(
  { database, actor, now }: Context,
  heads: Readonly<Record<string, number>>,
) {
  const ids = Object.keys(heads);
  const own = await listOwnDiagnoses(database, actor.companyId, ids);
  const wanted = [...own].map((diagnosisId) => ({ diagnosisId, serverSeq: heads[diagnosisId] ?? 0 }));
  const rows = await listEventsAfter(database, actor.companyId, wanted, MAX_PULL_EVENTS + 1);
  const taken = rows.slice(0, MAX_PULL_EVENTS);
  const changed = [...new Set(taken.map((row) => row.diagnosisId))];
  return {
    events: taken.map(readStoredEvent),
    notes: await presentNotes(database, await listNotesOf(database, actor.companyId, changed)),
    unknown: ids.filter((id) => !own.has(id)),
    more: rows.length > taken.length,
    serverTime: now.getTime(),
  };
}
