import type { RejectionCode } from "@emberladder/contract";
import { chainHashOf, GENESIS_HASH } from "@emberladder/diagnosis";
import type { Actor } from "#http/actor.ts";
import { flagsOf } from "./flags.ts";
import { hashText } from "./hash-text.ts";
import { evolveState } from "./judge.ts";
import type { Breach } from "./judge.ts";
import type { GoodItem } from "./read-batch.ts";
import type { RecordHead } from "./record-head.ts";
import type { KnownEvent, NewEventRow } from "./repository.ts";

/** What becomes of the events of one diagnosis, in their order. */
export interface Judged {
  accepted: { id: string; serverSeq: number }[];
  duplicate: { id: string; serverSeq: number }[];
  /** The first that is refused; those after it wait. */
  refused: { item: GoodItem; code: RejectionCode } | undefined;
  flags: (Breach & { eventId: string })[];
  rows: NewEventRow[];
  head: RecordHead;
}

/** Thrown when it takes a look at earlier events to tell a repetition from a break. */
export class NeedsCare extends Error {}

/**
 * Judges the events of one diagnosis against its head: which are new, which were received before, and which
 * one stops the rest.
 *
 * @param known earlier events with the same ids or device numbers; undefined where nobody has looked
 * @throws NeedsCare when nobody has looked and an event does not simply go on from the head
 */
export function judgeItems(
  items: readonly GoodItem[],
  head: RecordHead,
  known: readonly KnownEvent[] | undefined,
  { actor, now }: { actor: Actor; now: Date },
): Judged {
  const byId = new Map<string, Seen>((known ?? []).map((event) => [event.id, event]));
  const takenNumbers = new Set((known ?? []).map(numberOf));
  const lastOfDevice = new Map(head.lastOfDevice);
  const devices = new Set(lastOfDevice.keys());
  const judged: Judged = { accepted: [], duplicate: [], refused: undefined, flags: [], rows: [], head };
  let { serverSeq, chainHash, state } = head;

  for (const item of items) {
    const { envelope } = item;
    const same = byId.get(envelope.id);
    if (same && same.hash === envelope.hash && same.diagnosisId === envelope.diagnosisId) {
      judged.duplicate.push({ id: envelope.id, serverSeq: same.serverSeq });
      continue;
    }
    const last = lastOfDevice.get(envelope.deviceId);
    const isLinked =
      envelope.prevHash === (last?.hash ?? GENESIS_HASH) && envelope.deviceSeq > (last?.deviceSeq ?? 0);
    if (!isLinked && known === undefined) throw new NeedsCare();
    const isNumberTaken = takenNumbers.has(numberOf(envelope));
    const code = refusalOf({ isIdTaken: same !== undefined, isNumberTaken, isLinked });
    if (code) {
      judged.refused = { item, code };
      break;
    }
    serverSeq += 1;
    const link = {
      previousChainHash: chainHash,
      hash: envelope.hash,
      serverSeq,
      actorId: actor.personId,
      receivedAt: now.getTime(),
    };
    chainHash = chainHashOf(link, hashText);
    const before = { state, devices, tree: head.tree };
    for (const flag of flagsOf(envelope, item.read, before, actor.role))
      judged.flags.push({ ...flag, eventId: envelope.id });
    state = evolveState(state, envelope, { serverSeq, actorId: actor.personId });
    const { hash, diagnosisId, deviceId, deviceSeq } = envelope;
    lastOfDevice.set(deviceId, { hash, deviceSeq });
    devices.add(deviceId);
    byId.set(envelope.id, { hash, diagnosisId, serverSeq });
    takenNumbers.add(numberOf(envelope));
    judged.accepted.push({ id: envelope.id, serverSeq });
    judged.rows.push(rowOf(item, { serverSeq, chainHash }));
  }
  judged.head = { serverSeq, chainHash, state, lastOfDevice, tree: head.tree };
  return judged;
}

/** What is known of an event that may come again. */
type Seen = Pick<KnownEvent, "hash" | "diagnosisId" | "serverSeq">;

const numberOf = ({ deviceId, deviceSeq }: { deviceId: string; deviceSeq: number }) =>
  `${deviceId} ${deviceSeq}`;

function refusalOf(facts: {
  isIdTaken: boolean;
  isNumberTaken: boolean;
  isLinked: boolean;
}): RejectionCode | undefined {
  if (facts.isIdTaken) return "conflict";
  if (facts.isNumberTaken) return "seq-conflict";
  return facts.isLinked ? undefined : "broken-link";
}

function rowOf(
  { envelope, text }: GoodItem,
  { serverSeq, chainHash }: { serverSeq: number; chainHash: string },
): NewEventRow {
  return {
    id: envelope.id,
    deviceId: envelope.deviceId,
    deviceSeq: envelope.deviceSeq,
    serverSeq,
    type: envelope.type,
    schemaVersion: envelope.schemaVersion,
    canonicalText: text,
    hash: envelope.hash,
    prevHash: envelope.prevHash,
    chainHash,
  };
}
