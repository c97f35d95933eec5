import { readdirSync, readFileSync } from "node:fs";
import type { ReferenceCall } from "@emberladder/db/seed";

const folder = new URL("../fixtures/reference-calls/", import.meta.url);

/** The reference calls of the family that is built: hot-surface ignition, induced draft, integrated board. */
export function readFamilyCalls(): ReferenceCall[] {
  return readdirSync(folder)
    .filter((name) => /^\d+.*\.json$/.test(name))
    .map((name) => JSON.parse(readFileSync(new URL(name, folder), "utf8")) as ReferenceCall)
    .filter(({ unit }) => unit.ignition === "HSI" && unit.draft === "IDP" && unit.control === "IFC");
}
