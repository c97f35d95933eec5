import { noteTexts, people } from "@emberladder/db";
import type { Queryable } from "@emberladder/db";
import { and, eq, inArray, isNotNull } from "drizzle-orm";

export async function findNote(db: Queryable, companyId: string, diagnosisId: string, hash: string) {
  const [row] = await db
    .select()
    .from(noteTexts)
    .where(
      and(
        eq(noteTexts.companyId, companyId),
        eq(noteTexts.diagnosisId, diagnosisId),
        eq(noteTexts.hash, hash),
      ),
    );
  return row;
}

/** Erases a text; false when it was erased before. */
export async function eraseNoteText(
  db: Queryable,
  noteId: string,
  erasure: { erasedAt: Date; erasedBy: string; eraseReason: string },
): Promise<boolean> {
  const [result] = await db
    .update(noteTexts)
    .set({ text: null, ...erasure })
    .where(and(eq(noteTexts.id, noteId), isNotNull(noteTexts.text)));
  return result.affectedRows === 1;
}

/** Names of some people by id. */
export async function listNames(db: Queryable, personIds: readonly string[]): Promise<Map<string, string>> {
  if (personIds.length === 0) return new Map();
  const rows = await db
    .select({ id: people.id, name: people.name })
    .from(people)
    .where(inArray(people.id, [...new Set(personIds)]));
  return new Map(rows.map(({ id, name }) => [id, name]));
}
