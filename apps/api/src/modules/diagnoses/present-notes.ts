import type { Queryable } from "@emberladder/db";
import type { NoteRow } from "#modules/sync/repository.ts";
import { listNames } from "./notes/repository.ts";

/** Free texts as clients see them; an erased one says who erased it, when and why. */
export async function presentNotes(db: Queryable, rows: readonly NoteRow[]) {
  const names = await listNames(
    db,
    rows.flatMap(({ erasedBy }) => erasedBy ?? []),
  );
  return rows.map(({ diagnosisId, hash, salt, text, erasedAt, erasedBy, eraseReason }) => ({
    diagnosisId,
    hash,
    salt,
    text,
    erased: erasedAt && {
      at: erasedAt.toISOString(),
      by: names.get(erasedBy ?? "") ?? "",
      reason: eraseReason ?? "",
    },
  }));
}
