import type { CheckId, FindingIdOf, UniversalFinding } from "@emberladder/furnace";
import { supply } from "./findings/supply.ts";
import { call } from "./findings/call.ts";
import { draft } from "./findings/draft.ts";
import { ignition } from "./findings/ignition.ts";
import { gas } from "./findings/gas.ts";
import { air } from "./findings/air.ts";

type FindingWords = { readonly [C in CheckId]: Readonly<Record<FindingIdOf<C>, string>> };

/** Words of the two findings that every check may have. */
const universal: Readonly<Record<UniversalFinding, string>> = {
  retest: "Taken again after the repair",
  "no-path": "No path: says nothing",
};

const own: FindingWords = {
  ...supply,
  ...call,
  ...draft,
  ...ignition,
  ...gas,
  ...air,
};

/** Labels of the findings of each check, the two universal ones with every check. */
export const findings = Object.fromEntries(
  Object.entries(own).map(([check, labels]) => [check, { ...universal, ...labels }]),
) as { readonly [C in CheckId]: Readonly<Record<FindingIdOf<C> | UniversalFinding, string>> };
