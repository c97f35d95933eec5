import { randomBytes } from "node:crypto";
import { rename, writeFile } from "node:fs/promises";
import { join } from "node:path";
import { openDatabase } from "../client.ts";
import { readDatabaseError } from "../transaction.ts";
import { seedDemo } from "./seed-demo.ts";

/**
 * Fills the demo's database, and writes how to sign in to `accounts.json` in the data folder, last of all.
 * Reads EMBERLADDER_MODE, DATABASE_URL, DATA_DIR and SESSION_SECRET; refuses in mode live.
 */
async function main(): Promise<void> {
  const {
    EMBERLADDER_MODE: mode,
    DATABASE_URL: url,
    DATA_DIR: dataDir,
    SESSION_SECRET: secret,
  } = process.env;
  if (mode === "live") throw new Error("Demo data does not go into a live installation.");
  if (!url || !dataDir || !secret) throw new Error("Set DATABASE_URL, DATA_DIR and SESSION_SECRET.");
  const { database, close } = openDatabase(url);
  try {
    const accounts = await seedDemo({
      database,
      sessionSecret: secret,
      now: new Date(),
      random: (bytes) => new Uint8Array(randomBytes(bytes)),
    });
    const path = join(dataDir, "accounts.json");
    await writeFile(`${path}.new`, JSON.stringify(accounts, null, 2), { mode: 0o600 });
    await rename(`${path}.new`, path);
  } finally {
    await close();
  }
}

try {
  await main();
} catch (error) {
  const found = readDatabaseError(error);
  process.stderr.write(
    `The demo data could not be written: ${found?.code ?? (error instanceof Error ? error.message : "unknown reason")}\n`,
  );
  process.exitCode = 1;
}
