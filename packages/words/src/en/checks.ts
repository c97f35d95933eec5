import type { CheckId } from "@emberladder/furnace";
import { supply } from "./checks/supply.ts";
import { call } from "./checks/call.ts";
import { draft } from "./checks/draft.ts";
import { ignition } from "./checks/ignition.ts";
import { gas } from "./checks/gas.ts";
import { air } from "./checks/air.ts";
import type { CheckWords } from "./checks/check-words.ts";

/** Words of the checks. */
export const checks: Readonly<Record<CheckId, CheckWords>> = {
  ...supply,
  ...call,
  ...draft,
  ...ignition,
  ...gas,
  ...air,
};
