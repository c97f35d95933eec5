import { closeSync, fsyncSync, openSync, readFileSync, renameSync, writeSync } from "node:fs";

/**
 * Writes a small JSON file that only its owner may read (mode 0600), whole or not at all: a crash in the middle
 * leaves the earlier file.
 *
 * @param {string} path
 * @param {unknown} value anything JSON can hold
 * @returns {void}
 */
export function writePrivateJson(path, value) {
  const unfinished = `${path}.${process.pid}.unfinished`;
  const file = openSync(unfinished, "w", 0o600);
  try {
    writeSync(file, `${JSON.stringify(value, null, 2)}\n`);
    fsyncSync(file);
  } finally {
    closeSync(file);
  }
  renameSync(unfinished, path);
}

/**
 * Reads a JSON file.
 *
 * @param {string} path
 * @returns {unknown} undefined when the file is missing or is not JSON
 */
export function readJson(path) {
  try {
    return JSON.parse(readFileSync(path, "utf8"));
  } catch {
    return undefined;
  }
}
