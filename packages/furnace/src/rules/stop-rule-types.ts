import type { CheckId } from "../checks/check-ids.ts";
import type { ClosingCheckId } from "../closing/closing-ids.ts";
import type { VariantExpr } from "../variant.ts";
import type { StopRuleId } from "./stop-rule-ids.ts";

/** What a number has to be for an act of a rule to be done. */
export interface ActPass {
  readonly atMost?: number;
  readonly below?: number;
  readonly atLeast?: number;
  readonly above?: number;
}

/**
 * One act of a stop rule: ticked, timed (`seconds`), read (`check` and `pass`) or written. Acts for `all` are
 * recorded whatever happens next; those for `going-on` only where work on the unit goes on, so that a rule never
 * leaves a technician without a way to finish; those for `closing` before the call closes.
 */
export interface StopAct {
  readonly id: string;
  readonly kind: "tick" | "timer" | "reading" | "text";
  readonly due: "all" | "going-on" | "closing";
  /** Timers: how long. */
  readonly seconds?: number;
  /** Readings: of which check. Ticks: the check that a look stands for. */
  readonly check?: CheckId;
  readonly pass?: ActPass;
  /** Units that need it; everywhere when left out. */
  readonly when?: VariantExpr;
}

/** What a rule lets happen once its acts are recorded. */
export type Afterwards = "may-go-on" | "one-supervised-run" | "only-shut-off-or-refer";

/** What a rule stops. */
export type StoppedWork = "everything" | "call-for-heat" | "firing" | "restoring" | "touching" | "entering";

export interface StopRuleEntry {
  readonly stops: StoppedWork;
  /** In the order in which they are done. */
  readonly acts: readonly StopAct[];
  readonly afterwards: Afterwards;
  /** Closing checks it adds. */
  readonly closing?: readonly ClosingCheckId[];
  /** Where the rule comes from, with how sure that is. */
  readonly provenance: string;
}

export interface StopRule extends StopRuleEntry {
  readonly id: StopRuleId;
  /** As the trade reads it aloud: CO-30, GAS-ODOR. */
  readonly code: string;
}
