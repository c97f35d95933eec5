import { createHash } from "node:crypto";
import { existsSync, readdirSync, readFileSync, statSync } from "node:fs";
import { join } from "node:path";

const ignored = new Set(["node_modules", "dist", ".cache", ".data"]);

/**
 * Hashes the names and contents of files and whole folders, to tell whether a build is still of the present
 * sources.
 *
 * @param {string} root
 * @param {string[]} paths relative to `root`; missing ones count as empty
 * @returns {string} SHA-256, 64 hex digits
 */
export function hashContents(root, paths) {
  const hash = createHash("sha256");
  for (const path of paths.flatMap((entry) => listFiles(root, entry))) {
    hash
      .update(`${path}\0`)
      .update(readFileSync(join(root, path)))
      .update("\0");
  }
  return hash.digest("hex");
}

/**
 * @param {string} root
 * @param {string} path
 * @returns {string[]}
 */
function listFiles(root, path) {
  const full = join(root, path);
  if (!existsSync(full)) return [];
  if (!statSync(full).isDirectory()) return [path];
  return readdirSync(full)
    .filter((name) => !ignored.has(name))
    .toSorted()
    .flatMap((name) => listFiles(root, join(path, name)));
}
