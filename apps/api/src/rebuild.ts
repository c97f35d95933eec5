import { openDatabase } from "@emberladder/db";
import { rebuildProjections } from "#modules/rebuild/rebuild-projections.ts";
import { realSources } from "./http/dependencies.ts";
import { describeFault } from "./http/error-handler.ts";

/**
 * Rebuilds everything that follows from the events, and says what that changed: nothing, as a rule. Reads
 * DATABASE_URL. Ends with code 1 where a record cannot be replayed.
 */
async function main(): Promise<void> {
  const url = process.env["DATABASE_URL"];
  if (!url) throw new Error("Set DATABASE_URL to the database's address.");
  const { database, close } = openDatabase(url, { connections: 2 });
  try {
    const { unreadable, ...summary } = await rebuildProjections({ database, newId: realSources.newId });
    process.stdout.write(
      `${summary.diagnoses} diagnoses read: ${summary.diagnosesChanged} changed, ` +
        `${summary.flagsAdded} flags added, ${summary.flagsRemoved} removed, ${summary.callsMoved} calls moved.\n`,
    );
    if (unreadable.length === 0) return;
    process.stderr.write(
      `These records cannot be replayed and were left as they are: ${unreadable.join(", ")}\n`,
    );
    process.exitCode = 1;
  } finally {
    await close();
  }
}

try {
  await main();
} catch (error) {
  process.stderr.write(`The rebuild did not succeed: ${JSON.stringify(describeFault(error))}\n`);
  process.exitCode = 1;
}
