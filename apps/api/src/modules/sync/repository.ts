import { calls, devices, diagnoses, eventFlags, events, noteTexts, units } from "@emberladder/db";
import type { Queryable } from "@emberladder/db";
import type { UnitProfile } from "@emberladder/furnace";
import { envelopeSchema } from "@emberladder/diagnosis";
import type { StoredEvent, UnhashedEnvelope } from "@emberladder/diagnosis";
import { and, asc, eq, gt, inArray, isNull, ne, or, sql } from "drizzle-orm";
import type { SQL } from "drizzle-orm";

const storedTextSchema = envelopeSchema.omit({ hash: true });

/** A statement that is put into words and not yet run. */
export type { SQL } from "drizzle-orm";
export type DiagnosisRow = typeof diagnoses.$inferSelect;
export type EventRow = typeof events.$inferSelect;
export type NoteRow = typeof noteTexts.$inferSelect;

/** The head of a diagnosis, locked until the transaction ends: it gives out places without a gap. */
export async function lockDiagnosis(db: Queryable, diagnosisId: string): Promise<DiagnosisRow | undefined> {
  const [row] = await db.select().from(diagnoses).where(eq(diagnoses.id, diagnosisId)).for("update");
  return row;
}

/** Whether a call and a unit are the company's. */
export async function areOfCompany(
  db: Queryable,
  companyId: string,
  { callId, unitId }: { callId: string; unitId: string },
): Promise<boolean> {
  const [[call], [unit]] = await Promise.all([
    db
      .select({ id: calls.id })
      .from(calls)
      .where(and(eq(calls.companyId, companyId), eq(calls.id, callId))),
    db
      .select({ id: units.id })
      .from(units)
      .where(and(eq(units.companyId, companyId), eq(units.id, unitId))),
  ]);
  return call !== undefined && unit !== undefined;
}

export function toInsertDiagnosis(db: Queryable, row: typeof diagnoses.$inferInsert): SQL {
  return db.insert(diagnoses).values(row).getSQL();
}

/**
 * The statement that moves the head of a diagnosis on, if it is still where the caller believes; it changes no
 * row when somebody else moved it. The row stays locked until the transaction ends.
 */
export function toMoveHead(
  db: Queryable,
  from: { serverSeq: number; chainHash: string },
  diagnosisId: string,
  { newFlags, ...change }: Partial<Omit<DiagnosisRow, "flags">> & { newFlags: number },
): SQL {
  return (
    db
      .update(diagnoses)
      // Counted on in the database: what this process remembers of the count may be old.
      .set(newFlags === 0 ? change : { ...change, flags: sql`${diagnoses.flags} + ${newFlags}` })
      .where(
        and(
          eq(diagnoses.id, diagnosisId),
          eq(diagnoses.serverSeq, from.serverSeq),
          eq(diagnoses.chainHash, from.chainHash),
        ),
      )
      .getSQL()
  );
}

/** What an event's row has by itself, and what all rows of one batch have in common. */
export interface NewEvents {
  companyId: string;
  diagnosisId: string;
  actorId: string;
  receivedAt: Date;
  rows: NewEventRow[];
}
export type NewEventRow = Omit<
  typeof events.$inferInsert,
  "companyId" | "diagnosisId" | "actorId" | "receivedAt"
>;

/**
 * The statement that adds events. The rows travel as one value, JSON, which the server takes apart: with fifty
 * events that is several times as quick to put together as seven hundred values.
 */
export function toInsertEvents({ companyId, diagnosisId, actorId, receivedAt, rows }: NewEvents): SQL {
  const values = rows.map((row) => [
    row.id,
    row.deviceId,
    row.deviceSeq,
    row.serverSeq,
    row.type,
    row.schemaVersion,
    row.canonicalText,
    row.hash,
    row.prevHash,
    row.chainHash,
  ]);
  return sql`insert into events
    (id, company_id, diagnosis_id, device_id, device_seq, server_seq, type, schema_version,
     canonical_text, hash, prev_hash, chain_hash, actor_id, received_at)
    select id, ${companyId}, ${diagnosisId}, device_id, device_seq, server_seq, type, schema_version,
           canonical_text, hash, prev_hash, chain_hash, ${actorId}, ${sql.param(receivedAt, events.receivedAt)}
    from json_table(${JSON.stringify(values)}, '$[*]' columns (
      id char(36) path '$[0]',
      device_id char(36) path '$[1]',
      device_seq bigint path '$[2]',
      server_seq int path '$[3]',
      type varchar(64) path '$[4]',
      schema_version int path '$[5]',
      canonical_text mediumtext character set utf8mb4 collate utf8mb4_bin path '$[6]',
      hash char(64) path '$[7]',
      prev_hash char(64) path '$[8]',
      chain_hash char(64) path '$[9]'
    )) as sent`;
}

export type NewFlagRow = typeof eventFlags.$inferInsert;

export function toInsertFlags(db: Queryable, rows: NewFlagRow[]): SQL {
  return db.insert(eventFlags).values(rows).getSQL();
}

export async function insertFlags(db: Queryable, rows: NewFlagRow[]): Promise<void> {
  if (rows.length > 0) await db.execute(toInsertFlags(db, rows));
}

/** Runs a statement and tells how many rows it found. */
export async function runStatement(db: Queryable, statement: SQL): Promise<number> {
  const [result] = await db.execute(statement);
  return (result as unknown as { affectedRows: number }).affectedRows;
}

export async function listFlagRules(db: Queryable, diagnosisId: string): Promise<string[]> {
  const rows = await db
    .select({ rule: eventFlags.rule })
    .from(eventFlags)
    .where(eq(eventFlags.diagnosisId, diagnosisId));
  return rows.map(({ rule }) => rule);
}

export type KnownEvent = Pick<
  EventRow,
  "id" | "hash" | "diagnosisId" | "serverSeq" | "deviceId" | "deviceSeq"
>;

/** Events that have one of some ids, or one of some devices' numbers. */
export async function findKnownEvents(
  db: Queryable,
  wanted: readonly { id: string; deviceId: string; deviceSeq: number }[],
): Promise<KnownEvent[]> {
  const columns = {
    id: events.id,
    hash: events.hash,
    diagnosisId: events.diagnosisId,
    serverSeq: events.serverSeq,
    deviceId: events.deviceId,
    deviceSeq: events.deviceSeq,
  };
  return db
    .select(columns)
    .from(events)
    .where(
      or(
        inArray(
          events.id,
          wanted.map(({ id }) => id),
        ),
        ...wanted.map(({ deviceId, deviceSeq }) =>
          and(eq(events.deviceId, deviceId), eq(events.deviceSeq, deviceSeq)),
        ),
      ),
    );
}

/** The events of one diagnosis in their order. */
export async function listEventsOf(db: Queryable, diagnosisId: string): Promise<EventRow[]> {
  return db.select().from(events).where(eq(events.diagnosisId, diagnosisId)).orderBy(asc(events.serverSeq));
}

/** Events after some heads, at most `limit`. */
export async function listEventsAfter(
  db: Queryable,
  companyId: string,
  heads: readonly { diagnosisId: string; serverSeq: number }[],
  limit: number,
): Promise<EventRow[]> {
  if (heads.length === 0) return [];
  return db
    .select()
    .from(events)
    .where(
      and(
        eq(events.companyId, companyId),
        or(
          ...heads.map(({ diagnosisId, serverSeq }) =>
            and(eq(events.diagnosisId, diagnosisId), gt(events.serverSeq, serverSeq)),
          ),
        ),
      ),
    )
    .orderBy(asc(events.diagnosisId), asc(events.serverSeq))
    .limit(limit);
}

/** An event as it was received: from the text that was hashed, never from anything re-written. */
export function readStoredEvent(row: EventRow): StoredEvent {
  return {
    ...readEnvelope(row),
    hash: row.hash,
    serverSeq: row.serverSeq,
    companyId: row.companyId,
    actorId: row.actorId,
    receivedAt: row.receivedAt.getTime(),
    chainHash: row.chainHash,
  };
}

/**
 * The envelope in a stored text. A text that somebody altered so far that it is no envelope any more is shown
 * by what its columns still tell, so that the rest of the record stays readable; its hash then fits nothing.
 */
function readEnvelope(row: EventRow): UnhashedEnvelope {
  try {
    const parsed = storedTextSchema.safeParse(JSON.parse(row.canonicalText));
    if (parsed.success) return parsed.data;
  } catch {
    // Not JSON any more.
  }
  return {
    id: row.id,
    diagnosisId: row.diagnosisId,
    deviceId: row.deviceId,
    deviceSeq: row.deviceSeq,
    type: row.type,
    schemaVersion: row.schemaVersion,
    body: {},
    occurredAt: row.receivedAt.getTime(),
    tzOffsetMin: 0,
    monotonicMs: 0,
    serverOffsetMs: null,
    appBuild: "",
    prevHash: row.prevHash,
  };
}

/** Which of some devices are the person's and not revoked. */
export async function listGoodDevices(
  db: Queryable,
  personId: string,
  deviceIds: string[],
): Promise<Set<string>> {
  if (deviceIds.length === 0) return new Set();
  const rows = await db
    .select({ id: devices.id })
    .from(devices)
    .where(and(inArray(devices.id, deviceIds), eq(devices.personId, personId), isNull(devices.revokedAt)));
  return new Set(rows.map(({ id }) => id));
}

/** Which of some diagnoses are the company's. */
export async function listOwnDiagnoses(
  db: Queryable,
  companyId: string,
  ids: string[],
): Promise<Set<string>> {
  if (ids.length === 0) return new Set();
  const rows = await db
    .select({ id: diagnoses.id })
    .from(diagnoses)
    .where(and(eq(diagnoses.companyId, companyId), inArray(diagnoses.id, ids)));
  return new Set(rows.map(({ id }) => id));
}

/** Keeps texts; one that is there already, also an erased one, stays as it is. */
export async function insertNotes(db: Queryable, rows: (typeof noteTexts.$inferInsert)[]): Promise<void> {
  if (rows.length === 0) return;
  await db
    .insert(noteTexts)
    .values(rows)
    .onDuplicateKeyUpdate({ set: { hash: sql`${noteTexts.hash}` } });
}

export async function listNotesOf(
  db: Queryable,
  companyId: string,
  diagnosisIds: string[],
): Promise<NoteRow[]> {
  if (diagnosisIds.length === 0) return [];
  return db
    .select()
    .from(noteTexts)
    .where(and(eq(noteTexts.companyId, companyId), inArray(noteTexts.diagnosisId, diagnosisIds)));
}

/** The statement that moves a call with its diagnosis: under way while one is open, done once it is closed. */
export function toMoveCall(
  db: Queryable,
  callId: string,
  status: "under-way" | "done",
  doneAt: Date | null,
): SQL {
  return db
    .update(calls)
    .set({ status, doneAt })
    .where(and(eq(calls.id, callId), ne(calls.status, "cancelled")))
    .getSQL();
}

/** The statement that puts a profile in force which was corrected on site. */
export function toReplaceProfile(
  db: Queryable,
  companyId: string,
  unitId: string,
  profile: UnitProfile,
): SQL {
  return db
    .update(units)
    .set({ profile, version: sql`${units.version} + 1` })
    .where(and(eq(units.companyId, companyId), eq(units.id, unitId)))
    .getSQL();
}
