import type { Database } from "@emberladder/db";
import { companies } from "@emberladder/db";

/** Asks the database for anything at all. @throws when it is away or has no schema yet. */
export async function touchDatabase(db: Database): Promise<void> {
  await db.select({ id: companies.id }).from(companies).limit(1);
}
