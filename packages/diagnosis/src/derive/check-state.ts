import { getCheck } from "@emberladder/furnace";
import type { CheckId, CheckPower, ReadingStage } from "@emberladder/furnace";
import type { UnitState } from "../events/fields.ts";

/** The change of the unit's state that a check asks for; empty where the unit is ready. */
export type UnitChange = Partial<UnitState>;

/** The state in which a check is taken, in one of its ways: what the power, the call and the gas have to be. */
export function stateForCheck(check: CheckId, way?: string): UnitChange {
  const { power, setUp } = getCheck(check);
  const wanted = way === "power-off" || way === "ohms" || way === "fuse-out-ohms" ? "OFF" : power[0];
  return {
    ...ofPower(wanted),
    ...(setUp.includes("gas-shut") && wanted !== "OFF" ? { gas: "shut" as const } : {}),
  };
}

function ofPower(power: CheckPower | undefined): UnitChange {
  switch (power) {
    case "OFF":
      return { power: "off" };
    case "ON-call":
      return { power: "on", calling: true };
    case "ON-idle":
      return { power: "on", calling: false };
    case "ON":
      return { power: "on" };
    default:
      return {};
  }
}

/** What has to change on the unit before a check can be taken. */
export function changeForCheck(unit: UnitState, check: CheckId, way?: string): UnitChange {
  const wanted = Object.entries(stateForCheck(check, way)) as [keyof UnitState, UnitState[keyof UnitState]][];
  return Object.fromEntries(wanted.filter(([key, value]) => unit[key] !== value));
}

/** How the power stood when something was read, in the words of the catalogue. */
export function powerOf(unit: UnitState): CheckPower {
  if (unit.power === "off") return "OFF";
  return unit.calling ? "ON-call" : "ON-idle";
}

/** Where in the sequence a check is taken: where the tree says, else its usual place. */
export function stageForCheck(check: CheckId, stated?: ReadingStage): ReadingStage {
  return stated ?? getCheck(check).stages[0] ?? "any";
}
