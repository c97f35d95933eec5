import { STAGES } from "./codes.ts";
import type { LastStage, Options, Stage, VariantCodes } from "./codes.ts";
import { and, draft, evaluateVariant, ign, not, opt, or } from "./variant.ts";
import type { VariantExpr } from "./variant.ts";

/** Units that have a stage; a stage that is not listed is on every unit. Furnace trade practice. */
const STAGE_VARIANTS: Partial<Record<Stage, VariantExpr>> = {
  "draft-rest": draft.not("ND"),
  inducer: or(draft.not("ND"), and(draft("ND"), opt("vent-damper"))),
  "draft-proved": draft.not("ND"),
  prepurge: not(and(ign("SP"), draft("ND"))),
  "flame-proved": ign.not("SP"),
};

/** The rungs of one unit's ladder, from the foot up. A stage the unit lacks is left out. */
export function stagesOf(codes: VariantCodes, options: Options): Stage[] {
  return STAGES.filter((stage) => {
    const variants = STAGE_VARIANTS[stage];
    if (!variants) return true;
    if (stage === "prepurge" && codes.draft === "ND") return false;
    return evaluateVariant(variants, { codes, options }) === true;
  });
}

/**
 * The last stage completed, put on a rung that the unit has: where it lacks the stage, the nearest earlier
 * one counts. `none` and `any` stay as they are.
 */
export function onLadder(last: LastStage, codes: VariantCodes, options: Options): LastStage {
  if (last === "none" || last === "any") return last;
  const rungs = stagesOf(codes, options);
  for (let i = STAGES.indexOf(last); i >= 0; i--) {
    const stage = STAGES[i];
    if (stage && rungs.includes(stage)) return stage;
  }
  return "none";
}

/** The stage the unit stopped at: the rung above the last one completed, or null at the top or unknown. */
export function stoppedAt(last: LastStage, codes: VariantCodes, options: Options): Stage | null {
  if (last === "any") return null;
  const rungs = stagesOf(codes, options);
  if (last === "none") return rungs[0] ?? null;
  const placed = onLadder(last, codes, options);
  return rungs[rungs.indexOf(placed as Stage) + 1] ?? null;
}
