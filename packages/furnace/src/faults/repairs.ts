import type { TouchRow } from "../closing/touch-rows.ts";
import type { PartId } from "./part-ids.ts";
import type { RepairId } from "./repair-ids.ts";

/** Whom a repair needs besides the technician, or what leave. */
export type RepairNeeds = "utility" | "gas-supplier" | "electrician" | "owner" | "fire-authority" | "permit";

/** One repair: what it touches decides the light-off proof. Touches, parts and joints are judgement. */
export interface RepairEntry {
  readonly touches: readonly TouchRow[];
  readonly parts: readonly PartId[];
  readonly needs?: RepairNeeds;
  /** Sides of the gas valve's seat where it opens a gas joint; each asks for a leak check of that side. */
  readonly gasJoints?: readonly ("up" | "down")[];
}

export interface Repair extends RepairEntry {
  readonly id: RepairId;
}

const repairs = {
  "reset-breaker": { touches: ["setting"], parts: [] },
  "replace-breaker": { touches: ["setting"], parts: ["breaker"], needs: "electrician" },
  "reset-gfci": { touches: ["setting"], parts: [] },
  "replace-gfci": { touches: ["setting"], parts: ["gfci"], needs: "electrician" },
  "switch-on": { touches: ["setting"], parts: [] },
  "close-disconnect": { touches: ["setting"], parts: [] },
  "replace-disconnect-fuse": { touches: ["setting"], parts: ["disconnect-fuse"] },
  "restore-supply": { touches: ["setting"], parts: [], needs: "electrician" },
  "refit-panel": { touches: ["setting"], parts: [] },
  "replace-door-switch": { touches: ["setting"], parts: ["door-switch"] },
  "replace-transformer": { touches: ["setting"], parts: ["transformer"] },
  "reset-transformer": { touches: ["setting"], parts: [] },
  "move-transformer-tap": { touches: ["setting"], parts: [] },
  "reduce-transformer-load": { touches: ["setting"], parts: ["isolation-relay"] },
  "replace-control-fuse": { touches: ["setting"], parts: ["control-fuse"] },
  "repair-thermostat-cable": { touches: ["setting"], parts: [] },
  "replace-thermostat-cable": { touches: ["setting"], parts: ["thermostat-cable"] },
  "replace-thermostat-batteries": { touches: ["setting"], parts: ["thermostat-batteries"] },
  "set-thermostat": { touches: ["setting"], parts: [] },
  "replace-thermostat": { touches: ["setting"], parts: ["thermostat"] },
  "add-common-wire": { touches: ["setting"], parts: ["common-wire-adapter"] },
  "set-anticipator": { touches: ["setting"], parts: [] },
  "clear-pan-drain": { touches: ["setting"], parts: [] },
  "replace-overflow-switch": { touches: ["setting"], parts: ["overflow-switch"] },
  "change-building-schedule": { touches: ["setting"], parts: [], needs: "owner" },
  "repair-zone-panel": { touches: ["setting"], parts: [] },
  "replace-zone-panel": { touches: ["setting"], parts: ["zone-panel"] },
  "reset-smoke-detector": { touches: ["setting"], parts: [], needs: "fire-authority" },
  "clear-lockout": { touches: ["setting"], parts: [] },
  "replace-burnt-wire": { touches: ["setting", "safety"], parts: ["high-temperature-wire"] },
  "repair-chewed-wire": { touches: ["setting"], parts: ["harness"] },
  "correct-polarity": { touches: ["flame"], parts: [], needs: "electrician" },
  "repair-ground": { touches: ["flame"], parts: ["ground-wire"] },
  "replace-board": { touches: ["control"], parts: ["board"] },
  "replace-inducer-relay": { touches: ["draft"], parts: ["inducer-relay"] },
  "replace-blower-contactor": { touches: ["airflow"], parts: ["blower-contactor"] },
  "clean-board-plug": { touches: ["control"], parts: [] },
  "replace-plug-terminals": { touches: ["control"], parts: ["plug-terminals"] },
  "stop-water-replace-board": { touches: ["control"], parts: ["board"] },
  "repair-data-wires": { touches: ["setting"], parts: ["thermostat-cable"] },
  "fit-setup-plug": { touches: ["control"], parts: ["setup-plug"] },
  "replace-ignition-module": { touches: ["control"], parts: ["ignition-module"] },
  "replace-gas-control": {
    touches: ["control", "gas-train"],
    parts: ["gas-control"],
    gasJoints: ["up", "down"],
  },
  "replace-filter": { touches: ["airflow"], parts: ["filter"] },
  "open-registers": { touches: ["airflow"], parts: [] },
  "clean-coil": { touches: ["airflow"], parts: [] },
  "set-input": { touches: ["gas-train"], parts: [] },
  "replace-limit": { touches: ["safety"], parts: ["limit"] },
  "correct-reverse-heat": { touches: ["airflow", "safety"], parts: [] },
  "replace-aux-limit": { touches: ["safety"], parts: ["aux-limit"] },
  "clear-vent-after-rollout": { touches: ["draft", "safety"], parts: [] },
  "tag-heat-exchanger": { touches: [], parts: [] },
  "replace-heat-exchanger": {
    touches: ["gas-train", "safety"],
    parts: ["heat-exchanger"],
    gasJoints: ["up", "down"],
  },
  "clean-burners-after-rollout": { touches: ["flame", "safety"], parts: [] },
  "correct-supply-after-rollout": { touches: ["gas-train", "safety"], parts: [], needs: "gas-supplier" },
  "replace-rollout-switch": { touches: ["safety"], parts: ["rollout-switch"] },
  "clear-vent-after-spill": { touches: ["draft", "safety"], parts: [] },
  "move-exhaust-fan": { touches: ["draft", "safety"], parts: [] },
  "replace-vent-damper": { touches: ["draft"], parts: ["vent-damper"] },
  "replace-thermal-link": { touches: ["safety"], parts: ["thermal-link"] },
  "replace-inducer": { touches: ["draft"], parts: ["inducer"] },
  "replace-inducer-capacitor": { touches: ["draft"], parts: ["inducer-capacitor"] },
  "secure-inducer-wheel": { touches: ["draft"], parts: [] },
  "clear-vent": { touches: ["draft"], parts: [] },
  "clear-termination": { touches: ["draft"], parts: [] },
  "screen-termination": { touches: ["draft"], parts: ["termination-screen"] },
  "rejoin-vent": { touches: ["draft", "safety"], parts: ["vent-pipe"] },
  "open-combustion-air": { touches: ["draft"], parts: ["air-grille"] },
  "clear-ice": { touches: ["draft"], parts: [] },
  "raise-termination": { touches: ["draft"], parts: ["vent-pipe"], needs: "permit" },
  "clear-intake": { touches: ["draft"], parts: [] },
  "re-pipe-vent": { touches: ["draft"], parts: ["vent-pipe"], needs: "permit" },
  "shield-termination": { touches: ["draft"], parts: ["wind-hood"] },
  "replace-pressure-tube": { touches: ["draft"], parts: ["pressure-tube"] },
  "drain-pressure-tube": { touches: ["draft"], parts: [] },
  "clear-pressure-port": { touches: ["draft"], parts: [] },
  "replace-pressure-switch": { touches: ["draft"], parts: ["pressure-switch"] },
  "replace-pressure-sensor": { touches: ["draft"], parts: ["pressure-sensor"] },
  "replace-collector-gasket": { touches: ["draft"], parts: ["collector-gasket"] },
  "clean-trap": { touches: ["draft"], parts: [] },
  "thaw-drain": { touches: ["draft"], parts: ["drain-heat-trace"] },
  "prime-trap": { touches: ["draft"], parts: [] },
  "replace-condensate-pump": { touches: ["draft"], parts: ["condensate-pump"] },
  "clean-secondary-exchanger": { touches: ["draft", "safety"], parts: [] },
  "replace-secondary-exchanger": { touches: ["draft", "safety"], parts: ["secondary-exchanger"] },
  "replace-centrifugal-switch": { touches: ["draft"], parts: ["centrifugal-switch"] },
  "replace-igniter": { touches: ["flame"], parts: ["igniter"] },
  "repair-igniter-harness": { touches: ["flame"], parts: ["igniter-harness"] },
  "refit-igniter": { touches: ["flame"], parts: [] },
  "set-spark-gap": { touches: ["flame"], parts: [] },
  "replace-spark-electrode": { touches: ["flame"], parts: ["spark-electrode"] },
  "replace-spark-lead": { touches: ["flame"], parts: ["spark-lead"] },
  "clean-pilot-orifice": { touches: ["flame", "gas-joint"], parts: [], gasJoints: ["down"] },
  "replace-pilot-orifice": { touches: ["flame", "gas-joint"], parts: ["pilot-orifice"], gasJoints: ["down"] },
  "replace-pilot-tube": { touches: ["flame", "gas-joint"], parts: ["pilot-tube"], gasJoints: ["down"] },
  "adjust-pilot": { touches: ["flame"], parts: [] },
  "clean-pilot-hood": { touches: ["flame"], parts: [] },
  "relight-pilot": { touches: ["setting"], parts: [] },
  "replace-thermocouple": { touches: ["flame"], parts: ["thermocouple"] },
  "tighten-thermocouple": { touches: ["flame"], parts: [] },
  "replace-thermocouple-cutout": { touches: ["flame", "safety"], parts: ["thermocouple-cutout"] },
  "replace-gas-valve": { touches: ["gas-train"], parts: ["gas-valve"], gasJoints: ["up", "down"] },
  "open-appliance-valve": { touches: ["setting"], parts: [] },
  "open-branch-valve": { touches: ["restored"], parts: [] },
  "call-gas-utility": { touches: ["restored"], parts: [], needs: "utility" },
  "fill-tank": { touches: ["restored"], parts: [], needs: "gas-supplier" },
  "reset-excess-flow": { touches: ["restored"], parts: [], needs: "gas-supplier" },
  "replace-lp-regulator": {
    touches: ["gas-train", "restored"],
    parts: ["lp-regulator"],
    needs: "gas-supplier",
    gasJoints: ["up"],
  },
  "purge-gas-line": { touches: ["gas-joint"], parts: [], gasJoints: ["up"] },
  "correct-supply-pressure": { touches: ["gas-train", "restored"], parts: [], needs: "gas-supplier" },
  "re-pipe-gas-line": {
    touches: ["gas-train", "restored"],
    parts: ["gas-pipe"],
    needs: "permit",
    gasJoints: ["up"],
  },
  "set-gas-knob": { touches: ["setting"], parts: [] },
  "repair-valve-wire": { touches: ["setting"], parts: [] },
  "adjust-manifold": { touches: ["gas-train"], parts: [], gasJoints: ["down"] },
  "clean-orifices": { touches: ["gas-train"], parts: [], gasJoints: ["down"] },
  "replace-orifices": { touches: ["gas-train"], parts: ["orifices"], gasJoints: ["down"] },
  "derate-for-altitude": { touches: ["gas-train"], parts: ["orifices"], gasJoints: ["down"] },
  "fit-conversion-kit": { touches: ["gas-train"], parts: ["conversion-kit"], gasJoints: ["up", "down"] },
  "clean-burners": { touches: ["flame"], parts: [] },
  "replace-burners": { touches: ["flame"], parts: ["burners"] },
  "clean-crossover": { touches: ["flame"], parts: [] },
  "refit-burners": { touches: ["flame"], parts: [] },
  "clean-flame-sensor": { touches: ["flame"], parts: [] },
  "replace-flame-sensor": { touches: ["flame"], parts: ["flame-sensor"] },
  "repair-flame-sensor-wire": { touches: ["flame"], parts: ["flame-sensor-wire"] },
  "reposition-flame-sensor": { touches: ["flame"], parts: [] },
  "re-terminate-vent": { touches: ["draft"], parts: ["vent-pipe"], needs: "permit" },
  "replace-blower-motor": { touches: ["airflow"], parts: ["blower-motor"] },
  "replace-blower-capacitor": { touches: ["airflow"], parts: ["blower-capacitor"] },
  "replace-blower-module": { touches: ["airflow"], parts: ["blower-module"] },
  "replace-blower-belt": { touches: ["airflow"], parts: ["blower-belt"] },
  "clean-blower-wheel": { touches: ["airflow"], parts: [] },
  "swap-two-legs": { touches: ["airflow"], parts: [], needs: "electrician" },
  "replace-fan-control": { touches: ["airflow"], parts: ["fan-control"] },
  "repair-twin-link": { touches: ["airflow"], parts: ["twin-kit"] },
  "clear-partner-lockout": { touches: ["airflow"], parts: [] },
  "repair-economizer": { touches: ["airflow"], parts: ["economizer-actuator"] },
  "correct-outdoor-damper": { touches: ["airflow"], parts: [] },
  "dry-and-seal": { touches: ["draft", "flame"], parts: ["seal-kit"] },
  "set-heating-mode": { touches: ["setting"], parts: [], needs: "owner" },
  "repair-airflow-switch": { touches: ["airflow"], parts: ["airflow-switch"] },
} satisfies Record<RepairId, RepairEntry>;

/** Every repair by its id. */
export const REPAIRS: Readonly<Record<RepairId, RepairEntry>> = repairs;

/** The repair with an id. */
export function getRepair(id: RepairId): Repair {
  return { id, ...REPAIRS[id] };
}

/** The rows of the closing table that a set of repairs touches, each once. */
export function touchesOfRepairs(ids: readonly RepairId[]): TouchRow[] {
  return [...new Set(ids.flatMap((id) => REPAIRS[id].touches))];
}
