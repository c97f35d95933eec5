import { verifyStoredRecord } from "@emberladder/api/src/modules/diagnoses/verify-stored-record.ts";
import { diagnoses, events } from "@emberladder/db";
import type { Database } from "@emberladder/db";
import { asc, eq, inArray } from "drizzle-orm";
import { expect } from "vitest";
import type { Phone } from "./phone.ts";

/**
 * Expects that what a phone was told is stored is stored, once, in the phone's order and without a gap, and that
 * every record verifies up to its head.
 */
export async function expectWhole(database: Database, phone: Phone): Promise<void> {
  const rows = await database
    .select()
    .from(events)
    .where(eq(events.deviceId, phone.deviceId))
    .orderBy(asc(events.deviceSeq));
  const stored = rows.map(({ id }) => id);
  expect(new Set(stored).size).toBe(stored.length);
  expect([...phone.acknowledged].filter((id) => !stored.includes(id))).toEqual([]);
  // A prefix of what the phone made: nothing is missing in the middle, nothing is out of order.
  expect(stored).toEqual(phone.made.slice(0, stored.length).map(({ id }) => id));
  expect(rows.map(({ hash }) => hash)).toEqual(phone.made.slice(0, stored.length).map(({ hash }) => hash));
  const ids = [...new Set(rows.map(({ diagnosisId }) => diagnosisId))];
  const heads =
    ids.length === 0 ? [] : await database.select().from(diagnoses).where(inArray(diagnoses.id, ids));
  expect(heads).toHaveLength(ids.length);
  for (const head of heads) {
    const record = await database
      .select()
      .from(events)
      .where(eq(events.diagnosisId, head.id))
      .orderBy(asc(events.serverSeq));
    expect(verifyStoredRecord(record, head)).toEqual([]);
  }
}
