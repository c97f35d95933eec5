import { calls, devices, diagnoses, treeVersions, units } from "@emberladder/db";
import type { Database } from "@emberladder/db";
import { arrivalOf, demoId, demoRecords, inventNote, recordOf, sealRecord } from "@emberladder/db/seed";
import type { DemoRecord } from "@emberladder/db/seed";
import type { NoteText } from "@emberladder/diagnosis";
import { and, eq, inArray } from "drizzle-orm";
import type { Actor } from "#http/actor.ts";
import type { Dependencies } from "#http/dependencies.ts";
import { takeBatch } from "#modules/sync/use-cases.ts";

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
  const homes = await database
    .select({ id: units.id })
    .from(units)
    .where(
      inArray(
        units.id,
        records.map(({ unitId }) => unitId),
      ),
    );
  if (homes.length < new Set(records.map(({ unitId }) => unitId)).size) return;
  // Asking for the report is the last step of each.
  const complete = await database
    .select({ id: diagnoses.id })
    .from(diagnoses)
    .where(and(inArray(diagnoses.id, records.map(diagnosisIdOf)), eq(diagnoses.wantsReport, true)));
  if (complete.length === records.length) return;
  const lastSeq = new Map<string, number>();
  for (const record of records) {
    const count = await seedRecord(dependencies, record, (lastSeq.get(phoneOf(record)) ?? 0) + 1);
    lastSeq.set(phoneOf(record), (lastSeq.get(phoneOf(record)) ?? 0) + count);
  }
}

/** Seeds one record and returns how many events it has. */
async function seedRecord(dependencies: Dependencies, record: DemoRecord, firstSeq: number): Promise<number> {
  const { database } = dependencies;
  const { reference, slug, companyId } = record;
  const diagnosisId = diagnosisIdOf(record);
  const start = arrivalOf(reference);
  await insertCall(database, record, start);
  await insertPhone(database, record, new Date(start));

  const notes = new Map<string, NoteText>();
  const eventId = (index: number) => demoId("event", `${slug}/${index}`);
  const steps = record.change(
    recordOf(reference, {
      callId: callIdOf(record),
      unitId: record.unitId,
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

async function insertCall(database: Database, record: DemoRecord, start: number): Promise<void> {
  const { reference, companyId, unitId, technician, callNumber } = record;
  const id = callIdOf(record);
  await database
    .insert(calls)
    .values({
      id,
      companyId,
      unitId,
      number: callNumber,
      assignedTo: technician.id,
      status: "open",
      complaint: reference.complaint,
      scheduledFor: new Date(start),
      createdAt: new Date(start),
    })
    .onDuplicateKeyUpdate({ set: { companyId } });
}

async function insertPhone(database: Database, record: DemoRecord, at: Date): Promise<void> {
  const { companyId, technician } = record;
  await database
    .insert(devices)
    .values({
      id: phoneOf(record),
      companyId,
      personId: technician.id,
      name: "Demo phone",
      registeredAt: at,
      lastSeenAt: at,
    })
    .onDuplicateKeyUpdate({ set: { companyId } });
}

async function findTreeInForce(database: Database, companyId: string) {
  const [row] = await database
    .select({ id: treeVersions.treeId, version: treeVersions.version, hash: treeVersions.hash })
    .from(treeVersions)
    .where(and(eq(treeVersions.companyId, companyId), eq(treeVersions.inForce, true)))
    .limit(1);
  return row ?? null;
}
