import { arrivalOf, demoId, demoRecords, inventNote, recordOf, sealRecord } from "@emberladder/db/seed";
import type { DemoRecord } from "@emberladder/db/seed";
import type { NoteText } from "@emberladder/diagnosis";
import type { Actor } from "#http/actor.ts";
import type { Dependencies } from "#http/dependencies.ts";
import { takeBatch } from "#modules/sync/use-cases.ts";
import { countComplete, countUnits, findTreeInForce, insertPastCall, insertPhone } from "./repository.ts";

/** Milliseconds between the end of an invented visit and the arrival of its record. */
const SENT_AFTER_MS = 60_000;

const diagnosisIdOf = ({ slug }: DemoRecord) => demoId("diagnosis", slug);
const callIdOf = ({ slug }: DemoRecord) => demoId("past-call", slug);
const phoneOf = ({ technician }: DemoRecord) => demoId("device", technician.email);

/**
 * Gives the demo a past: the reference calls of its units, recorded by the rules and received as a phone's
 * batch is, with flags, projections, report and mail. Nothing in them was measured, and they are marked as
 * demo. What is there already stays as it is; a seeding that was killed goes on where it was.
 */
export async function seedDemoRecords(dependencies: Dependencies): Promise<void> {
  const { database } = dependencies;
  const records = demoRecords();
  // A demo database that was not filled has no units to have a past.
  const unitIds = [...new Set(records.map(({ unitId }) => unitId))];
  if ((await countUnits(database, unitIds)) < unitIds.length) return;
  if ((await countComplete(database, records.map(diagnosisIdOf))) === records.length) return;
  const lastSeq = new Map<string, number>();
  for (const record of records) {
    const count = await seedRecord(dependencies, record, (lastSeq.get(phoneOf(record)) ?? 0) + 1);
    lastSeq.set(phoneOf(record), (lastSeq.get(phoneOf(record)) ?? 0) + count);
  }
}

/** Seeds one record and returns how many events it has. */
async function seedRecord(dependencies: Dependencies, record: DemoRecord, firstSeq: number): Promise<number> {
  const { database } = dependencies;
  const { reference, slug } = record;
  const diagnosisId = diagnosisIdOf(record);
  const start = arrivalOf(reference);
  const { companyId, unitId, technician, callNumber } = record;
  const at = new Date(start);
  await insertPastCall(database, {
    id: callIdOf(record),
    companyId,
    unitId,
    number: callNumber,
    assignedTo: technician.id,
    status: "open",
    complaint: reference.complaint,
    scheduledFor: at,
    createdAt: at,
  });
  await insertPhone(database, {
    id: phoneOf(record),
    companyId,
    personId: technician.id,
    name: "Demo phone",
    registeredAt: at,
    lastSeenAt: at,
  });

  const notes = new Map<string, NoteText>();
  const eventId = (index: number) => demoId("event", `${slug}/${index}`);
  const steps = record.change(
    recordOf(reference, {
      callId: callIdOf(record),
      unitId,
      tree: await findTreeInForce(database, companyId),
      eventId,
      noteRef: (text) => {
        const note = inventNote(diagnosisId, text);
        notes.set(note.hash, note);
        return note.hash;
      },
    }),
  );
  const events = sealRecord(steps, {
    diagnosisId,
    device: { id: phoneOf(record), firstSeq },
    start,
    eventId,
  });
  const sentAt = new Date(start + (steps.at(-1)?.minute ?? 0) * 60_000 + SENT_AFTER_MS);
  const verdicts = await takeBatch(
    {
      ...dependencies,
      actor: actorOf(record),
      requestId: demoId("request", slug),
      address: "127.0.0.1",
      now: sentAt,
      setCookie: () => undefined,
    },
    { events, notes: [...notes.values()].map((note) => ({ ...note, diagnosisId })) },
  );
  const [refused] = verdicts.rejected;
  if (refused) throw new Error(`The demo's record ${slug} is refused: ${refused.code}.`);
  return events.length;
}

function actorOf(record: DemoRecord): Actor {
  const { id, name, email } = record.technician;
  return {
    personId: id,
    companyId: record.companyId,
    role: "technician",
    name,
    email,
    sessionHash: "",
    deviceId: phoneOf(record),
    twoStepPassed: true,
    hasTwoStep: false,
  };
}
