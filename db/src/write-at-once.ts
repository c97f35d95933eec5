import { sql } from "drizzle-orm";
import type { SQL } from "drizzle-orm";
import type { Database } from "./client.ts";
import { repeatWhereItHelps } from "./transaction.ts";

/** The error number by which a block says that its first statement changed nothing. Ours: MariaDB's end at 5000. */
const NOTHING_CHANGED = 30_001;

/** Whether `writeAtOnce` wrote nothing because its first statement did not find its row. */
export function isNothingChanged(error: unknown): boolean {
  const cause: unknown = error instanceof Error ? error.cause : undefined;
  // The driver has no name for a number that is not MariaDB's own.
  return (cause as { errno?: unknown } | undefined)?.errno === NOTHING_CHANGED;
}

/**
 * Runs statements that change rows in one transaction and in one round trip to the server: all of them or
 * none. The first has to change a row, else nothing is written. Values are bound as in every other query.
 *
 * The block is one statement of MariaDB's (`BEGIN NOT ATOMIC`), and undoes itself where anything in it fails.
 *
 * @throws an error for which `isNothingChanged` holds where the first statement changed nothing
 */
export async function writeAtOnce(database: Database, statements: readonly [SQL, ...SQL[]]): Promise<void> {
  const [first, ...rest] = statements;
  const others = rest.map((statement) => sql`${statement};`);
  const block = sql`begin not atomic
    declare exit handler for sqlexception begin rollback; resignal; end;
    start transaction;
    ${first};
    if row_count() < 1 then
      signal sqlstate '45000' set mysql_errno = 30001;
    end if;
    ${sql.join(others, sql` `)}
    commit;
  end`;
  await repeatWhereItHelps(async () => database.execute(block));
}
