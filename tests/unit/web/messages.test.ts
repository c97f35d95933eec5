import { readFileSync, readdirSync } from "node:fs";
import { fileURLToPath } from "node:url";
import { describe, expect, it } from "vitest";
import { en } from "@emberladder/words";
import { desk } from "../../../apps/web/src/messages/en/desk.ts";
import { fieldFlow } from "../../../apps/web/src/messages/en/field-flow.ts";
import { shell } from "../../../apps/web/src/messages/en/shell.ts";
import { ui } from "../../../apps/web/src/messages/en/ui.ts";

/** Words of the client: none missing, none empty. UX-36, English. */
const folder = fileURLToPath(new URL("../../../apps/web/src/", import.meta.url));

// As the client merges them: later bundles of a name space join the earlier ones.
const spaces: Record<string, readonly unknown[]> = { ui: [ui, fieldFlow], desk: [shell, desk], trade: [en] };

function lookUp(key: string): unknown {
  const [space = "ui", path = ""] = key.includes(":") ? key.split(":") : ["ui", key];
  for (const bundle of spaces[space] ?? []) {
    let at: unknown = bundle;
    for (const step of path.split("."))
      at = at instanceof Object ? (at as Record<string, unknown>)[step] : undefined;
    if (at !== undefined) return at;
  }
  return undefined;
}

/** A key names words, words by number, or a branch that the screen reads as a whole. */
const hasWords = (key: string): boolean =>
  [key, `${key}_one`, `${key}_other`].some((candidate) => lookUp(candidate) !== undefined);

function* used(): Generator<{ file: string; key: string; isPrefix: boolean }> {
  const files = readdirSync(folder, { recursive: true, encoding: "utf8" });
  for (const file of files.filter((name) => /\.tsx?$/.test(name) && !name.startsWith("messages/"))) {
    const text = readFileSync(`${folder}${file}`, "utf8");
    for (const [, key = ""] of text.matchAll(/\bt\(\s*"([\w:.-]+)"/g)) yield { file, key, isPrefix: false };
    for (const [, key = ""] of text.matchAll(/"((?:desk|trade|ui):[A-Za-z0-9_.-]+)"/g))
      yield { file, key, isPrefix: false };
    for (const [, start = ""] of text.matchAll(/\bt\(\s*`([^`$]+)\$\{/g)) {
      yield { file, key: start.replace(/\.?[^.:]*$/, ""), isPrefix: true };
    }
  }
}

function* leaves(bundle: unknown, path = ""): Generator<[string, unknown]> {
  if (!(bundle instanceof Object)) yield [path, bundle];
  else for (const [key, inner] of Object.entries(bundle)) yield* leaves(inner, path ? `${path}.${key}` : key);
}

const keys = [...used()];

describe("the words of the client", () => {
  it("are there for every key that a screen names", () => {
    const missing = keys.filter(({ key, isPrefix }) => !isPrefix && !hasWords(key));
    expect(keys.length).toBeGreaterThan(500);
    expect(missing.map(({ file, key }) => `${file}: ${key}`)).toEqual([]);
  });

  it("have a branch for every key that a screen puts together", () => {
    const missing = keys.filter(
      ({ key, isPrefix }) =>
        isPrefix && key !== "" && !/^\w+:?$/.test(key) && !(lookUp(key) instanceof Object),
    );
    expect(missing.map(({ file, key }) => `${file}: ${key}`)).toEqual([]);
  });

  it("are never empty", () => {
    const empty = Object.values(spaces)
      .flat()
      .flatMap((bundle) => [...leaves(bundle)])
      .filter(([, words]) => typeof words !== "string" || words.trim() === "")
      .map(([path]) => path);
    expect(empty).toEqual([]);
  });
});
