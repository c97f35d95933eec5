import { BODY_SCHEMA_VERSION, GENESIS_HASH, noteHash, seal } from "@emberladder/diagnosis";
import type { EventBody, NoteText, UnhashedEnvelope } from "@emberladder/diagnosis";
import { v7 as uuidv7 } from "uuid";
import { localStore } from "./database.ts";
import type { LocalEvent, LocalStore } from "./database.ts";
import { readDevice, writeDevice } from "./device.ts";

export const APP_BUILD: string = import.meta.env["VITE_BUILD"] ?? "dev";

/** Makes a note from a free text: the salt is random, the reference is its salted hash. */
export function makeNote(text: string): NoteText {
  const salt = [...crypto.getRandomValues(new Uint8Array(16))]
    .map((byte) => byte.toString(16).padStart(2, "0"))
    .join("");
  return { salt, text, hash: noteHash(salt, text) };
}

/**
 * Appends events to a diagnosis on this phone: the events, their outbox rows, their notes and the device's
 * counter in one durable transaction. Resolves when they are on disk.
 * @throws when the phone's storage refuses; nothing of the batch is kept then.
 */
export async function appendEvents(input: {
  diagnosisId: string;
  authorId: string;
  events: readonly EventBody[];
  notes?: readonly NoteText[];
  store?: LocalStore;
}): Promise<LocalEvent[]> {
  const { diagnosisId, authorId, events, notes = [], store = localStore } = input;
  return store.transaction("rw", [store.events, store.outbox, store.notes, store.meta], async () => {
    const device = await readDevice(authorId, store);
    if (!device) throw new Error("This browser has no device id yet; sign in first.");
    const own = await store.events.where("[diagnosisId+deviceId]").equals([diagnosisId, device.id]).toArray();
    const last = own.reduce<LocalEvent | undefined>(
      (a, b) => (a && a.deviceSeq > b.deviceSeq ? a : b),
      undefined,
    );
    const serverOffsetMs = ((await store.meta.get("serverOffsetMs"))?.value as number | undefined) ?? null;
    let prevHash = last?.hash ?? GENESIS_HASH;
    const sealed = events.map((event, index) => {
      const envelope: UnhashedEnvelope = {
        id: uuidv7(),
        diagnosisId,
        deviceId: device.id,
        deviceSeq: device.lastSeq + index + 1,
        type: event.type,
        schemaVersion: BODY_SCHEMA_VERSION,
        body: event.body,
        occurredAt: Date.now(),
        tzOffsetMin: -new Date().getTimezoneOffset(),
        monotonicMs: Math.round(performance.now()),
        serverOffsetMs,
        appBuild: APP_BUILD,
        prevHash,
      };
      const done = seal(envelope);
      prevHash = done.hash;
      return done;
    });
    await store.events.bulkAdd(sealed);
    await store.outbox.bulkAdd(
      sealed.map(({ id, deviceSeq, occurredAt }) => ({
        id,
        diagnosisId,
        deviceSeq,
        authorId,
        addedAt: occurredAt,
      })),
    );
    await store.notes.bulkPut(notes.map((note) => ({ ...note, diagnosisId })));
    await writeDevice(authorId, { ...device, lastSeq: device.lastSeq + sealed.length }, store);
    return sealed;
  });
}
