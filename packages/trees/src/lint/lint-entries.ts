import { FIRST_LOOK_IDS, LAST_STAGES, faultsFor, lastStagesOf, stagesOf } from "@emberladder/furnace";
import type { VariantCodes } from "@emberladder/furnace";
import type { TreeDocument } from "../document.ts";
import type { TreeProblem } from "./tree-problem.ts";

const LOOK_KEYS = FIRST_LOOK_IDS.map((item) => `look:${item}`);

/** Entries that are missing for where units of the tree can stop, that nothing leads to, or that are no stage. */
export function lintEntries(tree: TreeDocument, kinds: readonly VariantCodes[]): TreeProblem[] {
  const stops = stopsOf(kinds);
  const rungs = new Set<string>(["none", "any", ...kinds.flatMap((codes) => stagesOf(codes, {}))]);
  const known = new Set<string>([...LAST_STAGES, ...LOOK_KEYS]);
  const keys = Object.keys(tree.entries);
  return [
    ...keys
      .filter((key) => !known.has(key))
      .map((entry): TreeProblem => ({ rule: "entry-unknown", severity: "error", params: { entry } })),
    ...keys
      .filter((key) => known.has(key) && !key.startsWith("look:") && !rungs.has(key))
      .map((entry): TreeProblem => ({ rule: "entry-never-used", severity: "warning", params: { entry } })),
    ...[...stops]
      .filter(([entry]) => !(entry in tree.entries))
      .map(([entry, fault]): TreeProblem => ({
        rule: "entry-missing",
        severity: "error",
        params: { entry, fault },
      })),
  ];
}

/** Every last stage that some fault can leave on some unit of the tree, with one such fault. */
function stopsOf(kinds: readonly VariantCodes[]): Map<string, string> {
  const stops = new Map<string, string>([["any", ""]]);
  for (const codes of kinds) {
    for (const fault of faultsFor({ codes, options: {} })) {
      for (const stage of lastStagesOf(fault, { codes, options: {} })) {
        if (!stops.has(stage)) stops.set(stage, fault.id);
      }
    }
  }
  return stops;
}
