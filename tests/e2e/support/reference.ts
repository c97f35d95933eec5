import { readFileSync } from "node:fs";
import type { ReferenceCall } from "@emberladder/db/seed";

/** A reference call of the fixtures, by its number and slug. All invented. */
export function reference(name: string): ReferenceCall {
  const file = new URL(`../../fixtures/reference-calls/${name}.json`, import.meta.url);
  return JSON.parse(readFileSync(file, "utf8")) as ReferenceCall;
}
