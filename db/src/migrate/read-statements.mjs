import { createHash } from "node:crypto";
import { existsSync, readdirSync, readFileSync } from "node:fs";
import { join } from "node:path";
import { PlainError } from "../server/plain-error.mjs";

/**
 * One statement of one migration file. `position` counts from 1 inside its file; `hash` is the SHA-256 of its
 * text, 64 hex digits.
 *
 * @typedef {{ file: string, position: number, sql: string, hash: string }} MigrationStatement
 */

// The line drizzle-kit puts between the statements it generates.
const separator = "--> statement-breakpoint";

/**
 * Reads the migrations of a folder in the order of their file names.
 *
 * @param {string} folder
 * @returns {MigrationStatement[]}
 * @throws {PlainError} when the folder is missing
 */
export function readStatements(folder) {
  if (!existsSync(folder)) throw new PlainError(`There is no folder of migrations at ${folder}.`);
  return readdirSync(folder)
    .filter((name) => name.endsWith(".sql"))
    .toSorted()
    .flatMap((file) =>
      readFileSync(join(folder, file), "utf8")
        .split(separator)
        .map((text) => text.trim())
        .filter((text) => text !== "")
        .map((sql, index) => ({
          file,
          position: index + 1,
          sql,
          hash: createHash("sha256").update(sql).digest("hex"),
        })),
    );
}
