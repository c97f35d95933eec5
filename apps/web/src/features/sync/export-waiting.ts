import { localStore } from "#lib/store/database.ts";

/**
 * Everything that waits on this phone as one JSON text: outbox rows, their events as they were hashed, their
 * notes. A copy to keep before a phone is mended or given away; nothing is taken out of the outbox.
 */
export async function exportWaiting(): Promise<string> {
  const outbox = await localStore.outbox.toArray();
  const ids = [...new Set(outbox.map((row) => row.diagnosisId))];
  const [events, notes] = await Promise.all([
    localStore.events.bulkGet(outbox.map((row) => row.id)),
    localStore.notes.where("diagnosisId").anyOf(ids).toArray(),
  ]);
  return JSON.stringify(
    { format: "emberladder-waiting-1", outbox, events: events.filter(Boolean), notes },
    null,
    2,
  );
}
