/**
 * `npm run budget`: what a phone fetches, from the manifest of the built client (gzip, JavaScript). Ends with code 1
 * where a sum is over its bound.
 */
import { existsSync, readFileSync } from "node:fs";
import { fileURLToPath } from "node:url";
import { gzipSync } from "node:zlib";

/** @typedef {{ file: string, imports?: string[] }} Chunk */
/** @typedef {{ name: string, boundKb: number, kb: number }} Sum */

const dist = new URL("../../apps/web/dist/", import.meta.url);
const shell = [
  "index.html",
  "src/features/sign-in/sign-in-screen.tsx",
  "src/features/calls/calls-screen.tsx",
];
/** What opening a visit asks for until its first question stands; see apps/web/src/app/keep-field-screens.ts. */
const field = [
  ...shell,
  "src/features/sign-in/sign-in-schema.ts",
  "src/features/calls/call-screen.tsx",
  "src/lib/start-diagnosis.ts",
  "src/lib/store/documents.ts",
  "src/lib/store/sender.ts",
  "src/lib/store/device.ts",
  "src/features/diagnosis/diagnosis-route.tsx",
  "src/features/diagnosis/screens/next-screen.tsx",
  "src/features/diagnosis/screens/screen-switch.tsx",
  "src/messages/en/field-flow.ts",
  "../../packages/words/src/index.ts",
];

/**
 * Sums up the built client.
 *
 * @returns {Sum[] | undefined} in kB of 1000 bytes; undefined before the first build
 */
export function measureBudget() {
  const path = new URL(".vite/manifest.json", dist);
  if (!existsSync(path)) return undefined;
  const manifest = /** @type {Record<string, Chunk>} */ (JSON.parse(readFileSync(path, "utf8")));
  /** @param {string[]} entries */
  const sum = (entries) => {
    const seen = new Set();
    const waiting = [...entries];
    let bytes = 0;
    for (let key = waiting.pop(); key !== undefined; key = waiting.pop()) {
      const chunk = manifest[key];
      if (chunk === undefined) throw new Error(`The client's build has no ${key}. Build it again.`);
      if (seen.has(chunk.file)) continue;
      seen.add(chunk.file);
      bytes += gzipSync(readFileSync(new URL(chunk.file, dist))).length;
      waiting.push(...(chunk.imports ?? []));
    }
    return bytes / 1000;
  };
  return [
    { name: "sign-in and calls", boundKb: 170, kb: sum(shell) },
    { name: "everything before the first field question", boundKb: 300, kb: sum(field) },
  ];
}

if (process.argv[1] === fileURLToPath(import.meta.url)) {
  const sums = measureBudget();
  if (sums === undefined) {
    process.stderr.write("The client is not built yet. Run npm start once.\n");
    process.exitCode = 1;
  }
  for (const { name, boundKb, kb } of sums ?? []) {
    const isOver = kb > boundKb;
    process.stdout.write(`${name}: ${kb.toFixed(1)} kB of ${boundKb} kB${isOver ? ", over" : ""}\n`);
    if (isOver) process.exitCode = 1;
  }
}
