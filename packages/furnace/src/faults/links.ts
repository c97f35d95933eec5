import type { LastStage } from "../codes.ts";
import { draft, evaluateVariant } from "../variant.ts";
import type { VariantContext, VariantExpr } from "../variant.ts";
import { FAULT_IDS } from "./fault-ids.ts";
import type { FaultId, SymptomId } from "./fault-ids.ts";
import { FAULTS } from "./faults.ts";
import { SYMPTOMS } from "./symptoms.ts";

/** Two or more names of one fault: naming either is right, the wider cause is the better answer. */
export interface SameFault {
  readonly members: readonly FaultId[];
  readonly when?: VariantExpr;
  /** Which circumstance makes them one, for the words. */
  readonly circumstance: string;
}

/** Faults that may be named for one another. Judgement. */
export const SAME_FAULTS: readonly SameFault[] = [
  { members: ["rollout-cracked-exchanger", "cracked-heat-exchanger"], circumstance: "always" },
  { members: ["rollout-dirty-burners", "burners-dirty"], circumstance: "rollout-tripped-burners-dirty" },
  { members: ["rollout-low-inlet", "low-inlet-pressure"], circumstance: "rollout-tripped-inlet-low" },
  {
    members: ["rollout-blocked-flue", "vent-blocked", "spill-tripped"],
    when: draft("ND"),
    circumstance: "one-blocked-vent",
  },
  { members: ["vent-blocked", "vent-nest", "vent-ice-snow"], circumstance: "blockage-is-nest-or-ice" },
  { members: ["phase-loss", "disconnect-off"], circumstance: "one-leg-fuse-blown" },
  {
    members: ["limit-open-overfire", "manifold-high", "orifice-wrong", "altitude-not-derated"],
    circumstance: "input-above-plate",
  },
  { members: ["low-inlet-pressure", "gas-line-undersized"], circumstance: "falls-while-others-run" },
  { members: ["low-inlet-pressure", "lp-regulator-frozen"], circumstance: "regulator-is-the-cause" },
  { members: ["gas-off-appliance-valve", "gas-off-after-summer"], circumstance: "own-cock-shut-for-season" },
  { members: ["overflow-switch-open", "condensate-pump-failed"], circumstance: "contact-is-the-pumps" },
  { members: ["bas-heat-lockout", "cooling-mode-stuck"], circumstance: "control-holds-cooling" },
];

/** Whether naming fault `b` is as right as naming `a` on a unit: the same id, or two names of one fault. */
export function acceptsAs(a: FaultId, b: FaultId, unit?: VariantContext): boolean {
  if (a === b) return true;
  return SAME_FAULTS.some(
    (same) =>
      same.members.includes(a) &&
      same.members.includes(b) &&
      (!same.when || !unit || evaluateVariant(same.when, unit) !== false),
  );
}

const ROLLOUTS = FAULT_IDS.filter((id) => id.startsWith("rollout-") && id !== "rollout-failed-open");

type Cause = FaultId | SymptomId;
interface CauseEntry {
  readonly cause: Cause;
  readonly when?: VariantExpr;
}

const rolloutCauses: readonly CauseEntry[] = [
  { cause: "vent-blocked" },
  { cause: "inducer-wheel-loose", when: draft("IDC") },
  { cause: "pressure-switch-stuck-closed" },
  { cause: "centrifugal-stuck-closed" },
  { cause: "combustion-air-lacking" },
  { cause: "cracked-heat-exchanger" },
  { cause: "burners-dirty" },
  { cause: "low-inlet-pressure" },
  { cause: "delayed-ignition" },
  { cause: "limit-open-overfire" },
  { cause: "fuel-conversion-missing" },
];

const spillCauses: readonly CauseEntry[] = [
  { cause: "vent-blocked" },
  { cause: "vent-nest" },
  { cause: "vent-ice-snow" },
  { cause: "vent-disconnected" },
  { cause: "combustion-air-lacking" },
];

const causes = (...ids: Cause[]): CauseEntry[] => ids.map((cause) => ({ cause }));

/** Stages a control gives up at: a fault that stops there ends in lockout. */
const LOCKOUT_STAGES: readonly LastStage[] = ["prepurge", "ignition-source", "gas", "lightoff"];

/** Any fault that stops the light-off, and the one that takes the flame away in the steady burn. */
function lockoutCauses(): CauseEntry[] {
  const stopping = FAULTS.filter((fault) =>
    fault.lastStage.some((clause) => clause.stages.some((stage) => LOCKOUT_STAGES.includes(stage))),
  );
  return causes(...stopping.map((fault) => fault.id), "flue-recirculation");
}

/**
 * Faults that are often the effect of another: a finished diagnosis names the cause or says it was sought.
 * Judgement. Causes that are not faults of the unit (exhaust fans, a power cut, a shorted coil) are in the words.
 */
const CONSEQUENCES: Partial<Record<Cause, readonly CauseEntry[]>> = {
  "lv-fuse-blown": causes("tstat-wire-short", "melted-wire", "rodent-wire"),
  "transformer-failed": causes("transformer-overloaded", "tstat-wire-short"),
  "ignition-lockout-latched": lockoutCauses(),
  "aux-limit-tripped": causes(...SYMPTOMS["limit-open-blower-failed"].pointsTo, "limit-open-filter"),
  "spill-tripped": spillCauses,
  "tc-circuit-cutout-open": [
    ...spillCauses,
    ...rolloutCauses.filter(({ cause }) => !spillCauses.some((s) => s.cause === cause)),
  ],
  "transformer-reset-tripped": causes("tstat-wire-short", "melted-wire", "transformer-overloaded"),
  ...Object.fromEntries(ROLLOUTS.map((id) => [id, rolloutCauses])),
  "melted-wire": causes(...ROLLOUTS, "delayed-ignition"),
  "secondary-hx-plugged": causes("burners-dirty", "orifice-wrong", "fuel-conversion-missing"),
  "overflow-switch-open": causes("trap-plugged", "drain-frozen", "condensate-pump-failed"),
  "board-water": causes("trap-plugged", "drain-frozen", "rtu-flue-water"),
  "blower-motor-failed": causes("blower-capacitor"),
  "pilot-blown-out": causes("gas-line-air"),
  "limit-open-blower-failed": causes(...SYMPTOMS["limit-open-blower-failed"].pointsTo),
  "delayed-ignition": causes(...SYMPTOMS["delayed-ignition"].pointsTo),
  "spark-continues-flame-unsensed": causes(...SYMPTOMS["spark-continues-flame-unsensed"].pointsTo),
};

/** Faults met as found by a manual-reset device: they cannot be concluded as repaired without a root cause. */
export const MANUAL_RESET_FAULTS: readonly FaultId[] = [
  ...ROLLOUTS,
  "spill-tripped",
  "aux-limit-tripped",
  "tc-circuit-cutout-open",
];

/**
 * The faults and symptoms that may have caused an effect, on one unit where it is given. Empty where the effect
 * is nobody's consequence.
 */
export function causesOf(effect: Cause, unit?: VariantContext): Cause[] {
  return (CONSEQUENCES[effect] ?? [])
    .filter(({ when }) => !when || !unit || evaluateVariant(when, unit) !== false)
    .map(({ cause }) => cause);
}
