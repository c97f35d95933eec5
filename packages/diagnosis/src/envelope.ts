import { sha256 } from "@noble/hashes/sha2.js";
import { bytesToHex, utf8ToBytes } from "@noble/hashes/utils.js";
import canonicalize from "canonicalize";
import { z } from "zod";

/**
 * Envelope v1: what is wrapped around every event of a diagnosis, on the phone and on the server.
 *
 * Two chains make an alteration visible. The *device link* (`prevHash`, `hash`) joins the events of one
 * device in one diagnosis and is made on the phone, so that the server cannot change an event unseen. The
 * *server chain* (`chainHash`) joins all events of a diagnosis in the order in which they arrived, so that
 * none can be dropped, inserted or moved afterwards. The shape is frozen: a change needs a new version and
 * an upcast, see `docs/decisions`.
 */
export const ENVELOPE_VERSION = 1;

const uuid = z.uuid();
const hex64 = z.string().regex(/^[0-9a-f]{64}$/);

/** The first `prevHash` of a device in a diagnosis. */
export const GENESIS_HASH = "0".repeat(64);

export const envelopeSchema = z.strictObject({
  /** UUIDv7 made on the device; also the idempotency key. Never used for order. */
  id: uuid,
  diagnosisId: uuid,
  deviceId: uuid,
  /** Gap-free count of this device over all its diagnoses, from 1. A gap shows a lost event. */
  deviceSeq: z.number().int().min(1).max(Number.MAX_SAFE_INTEGER),
  type: z
    .string()
    .regex(/^[a-z][a-z-]*\.[a-z][a-z-]*$/)
    .max(64),
  schemaVersion: z.number().int().min(1).max(1000),
  body: z.record(z.string().max(64), z.unknown()),
  /** Device clock, UTC milliseconds. Recorded, never trusted for order. */
  occurredAt: z.number().int().min(0).max(4_102_444_800_000),
  tzOffsetMin: z.number().int().min(-840).max(840),
  /** `performance.now()` of the device, whole milliseconds: durations survive a clock that jumps. */
  monotonicMs: z.number().int().min(0).max(Number.MAX_SAFE_INTEGER),
  /** Server clock less device clock at the last contact; null before the first. */
  serverOffsetMs: z.number().int().nullable(),
  appBuild: z.string().max(64),
  prevHash: hex64,
  hash: hex64,
});

export type Envelope = z.infer<typeof envelopeSchema>;
export type UnhashedEnvelope = Omit<Envelope, "hash">;

/** What the server adds when it accepts an event; who and when come from the session, never from the body. */
export interface ServerStamp {
  /** Gap-free per diagnosis, from 1, taken from the locked diagnosis row. */
  serverSeq: number;
  companyId: string;
  actorId: string;
  receivedAt: number;
  chainHash: string;
}

export type StoredEvent = Envelope & ServerStamp;

/**
 * The canonical text of an envelope without its hash, by RFC 8785 (JSON Canonicalization Scheme). This text
 * is what is hashed and what is stored; a database's own re-serialisation is never hashed.
 * @throws when the body holds something JSON cannot carry.
 */
export function canonicalText(envelope: UnhashedEnvelope): string {
  // The envelope's own fields and no others, whatever a server or a phone keeps beside them.
  const hashed: UnhashedEnvelope = {
    id: envelope.id,
    diagnosisId: envelope.diagnosisId,
    deviceId: envelope.deviceId,
    deviceSeq: envelope.deviceSeq,
    type: envelope.type,
    schemaVersion: envelope.schemaVersion,
    body: envelope.body,
    occurredAt: envelope.occurredAt,
    tzOffsetMin: envelope.tzOffsetMin,
    monotonicMs: envelope.monotonicMs,
    serverOffsetMs: envelope.serverOffsetMs,
    appBuild: envelope.appBuild,
    prevHash: envelope.prevHash,
  };
  const text = canonicalize(hashed);
  if (text === undefined) throw new Error("An event body cannot be written as JSON.");
  return text;
}

/** SHA-256 of a text as 64 lower-case hex digits. */
export function sha256Hex(text: string): string {
  return bytesToHex(sha256(utf8ToBytes(text)));
}

/** The envelope with its hash filled in. */
export function seal(envelope: UnhashedEnvelope): Envelope {
  return { ...envelope, hash: sha256Hex(canonicalText(envelope)) };
}

/** Whether the hash of an envelope is the hash of its own text. */
export function hashMatches(envelope: Envelope): boolean {
  return sha256Hex(canonicalText(envelope)) === envelope.hash;
}

/**
 * The server's chain hash of one event: over the previous chain hash of the diagnosis, the event's hash, its
 * place, the actor and the time of receipt (UTC ms), joined by line feeds.
 * @param hashText SHA-256 of a text in hex, where the platform has a faster one than ours
 */
export function chainHashOf(
  link: { previousChainHash: string; hash: string; serverSeq: number; actorId: string; receivedAt: number },
  hashText: (text: string) => string = sha256Hex,
): string {
  return hashText(
    `${link.previousChainHash}\n${link.hash}\n${link.serverSeq}\n${link.actorId}\n${link.receivedAt}`,
  );
}

/** One break found by `verifyRecord`: which event, by its place, and what does not fit. */
export interface ChainBreak {
  serverSeq: number;
  reason: "hash" | "device-link" | "server-order" | "server-chain";
}

/**
 * Verifies the record of one diagnosis: every hash, every device link, the order and the server chain.
 * Returns the breaks in order of place; an empty list means that the record is as it was received.
 */
export function verifyRecord(events: readonly StoredEvent[]): ChainBreak[] {
  const breaks: ChainBreak[] = [];
  const lastOfDevice = new Map<string, string>();
  let previousChainHash = GENESIS_HASH;
  events.forEach((event, index) => {
    const report = (reason: ChainBreak["reason"]) => breaks.push({ serverSeq: event.serverSeq, reason });
    if (!hashMatches(event)) report("hash");
    if (event.prevHash !== (lastOfDevice.get(event.deviceId) ?? GENESIS_HASH)) report("device-link");
    if (event.serverSeq !== index + 1) report("server-order");
    if (event.chainHash !== chainHashOf({ ...event, previousChainHash })) report("server-chain");
    lastOfDevice.set(event.deviceId, event.hash);
    previousChainHash = event.chainHash;
  });
  return breaks;
}

/**
 * A free text of a diagnosis: kept beside the event and referenced by its salted hash, so that it can be
 * erased with a recorded reason while the chain still verifies.
 */
export const noteTextSchema = z.strictObject({
  hash: hex64,
  salt: z.string().regex(/^[0-9a-f]{32}$/),
  text: z.string().min(1).max(2000),
});
export type NoteText = z.infer<typeof noteTextSchema>;

/** The reference under which a salted text is kept. `salt` is 16 random bytes in hex, made by the caller. */
export function noteHash(salt: string, text: string): string {
  return sha256Hex(`${salt}\n${text}`);
}
