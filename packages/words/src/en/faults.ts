import type { FaultId } from "@emberladder/furnace";
import { power } from "./faults/power.ts";
import { limit } from "./faults/limit.ts";
import { draft } from "./faults/draft.ts";
import { ignition } from "./faults/ignition.ts";
import { gas } from "./faults/gas.ts";
import { flame } from "./faults/flame.ts";
import { air } from "./faults/air.ts";
import type { FaultWords } from "./faults/fault-words.ts";

/** Words of the faults. */
export const faults: Readonly<Record<FaultId, FaultWords>> = {
  ...power,
  ...limit,
  ...draft,
  ...ignition,
  ...gas,
  ...flame,
  ...air,
};
