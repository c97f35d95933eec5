import {
  getCheck,
  getFinding,
  isCheckId,
  jumperRuleOf,
  judgeReading,
  mayApply,
  readingLimits,
} from "@emberladder/furnace";
import type { BodyOf } from "../events/index.ts";
import { openPutBacks } from "../derive/put-backs.ts";
import type { DiagnosisState } from "../state/diagnosis-state.ts";
import { breachWhere } from "./breach.ts";
import type { Breach } from "./breach.ts";

/** Rules of starting a check: it has to be one, to fit the unit, and to bypass nothing that may not be. */
export function checkStartRules(state: DiagnosisState, body: BodyOf<"check.started">): Breach[] {
  return [...checkFits(state, body.check), ...body.opens.flatMap((opening) => jumperRules(state, opening))];
}

/** Rules of an answer: a check of this unit, a finding it can have, a value that a meter can show. */
export function checkAnswerRules(state: DiagnosisState, body: BodyOf<"check.answered">): Breach[] {
  const fits = checkFits(state, body.check);
  if (fits.length > 0 || !isCheckId(body.check)) return fits;
  const { check, finding, value, unit } = body;
  const says = body.outcome ?? finding ?? value ?? body.inV;
  return breachWhere(
    says === undefined && { rule: "answer-empty" },
    finding !== undefined && !getFinding(check, finding) && { rule: "finding-unknown", params: { finding } },
    value !== undefined && unit === undefined && { rule: "unit-missing" },
    ...(value !== undefined && unit !== undefined ? [valueRule(body, check, value, unit)] : []),
    ...[body.inV, body.outV].map((volts) =>
      volts === undefined ? undefined : valueRule(body, check, volts, "V"),
    ),
  );
}

function valueRule(
  body: BodyOf<"check.answered">,
  check: Parameters<typeof judgeReading>[0],
  value: number | "OL",
  unit: Parameters<typeof judgeReading>[1],
): Breach | undefined {
  const judged = judgeReading(check, unit, value);
  const { least, most, likely } = readingLimits(check, unit);
  if (judged === "impossible") return { rule: "value-impossible", params: { value, unit, least, most } };
  if (judged === "unlikely" && !body.confirmedUnlikely) {
    return { rule: "value-unlikely", params: { value, unit, least: likely[0], most: likely[1] } };
  }
  return undefined;
}

/** Rules of something opened by hand. */
export function jumperRules(
  state: DiagnosisState,
  opening: { kind: string; what: string; device?: string; limitS?: number },
): Breach[] {
  if (opening.kind !== "jumper-fitted") return [];
  const device = opening.device ?? opening.what;
  const rule = jumperRuleOf(device);
  if (!rule?.allowed) return [{ rule: "jumper-forbidden", params: { device } }];
  const { limitS, conditions = [] } = rule;
  return breachWhere(
    conditions.includes("gas-shut") &&
      state.unit.gas !== "shut" && { rule: "jumper-needs-gas-shut", params: { device } },
    limitS !== undefined &&
      (opening.limitS === undefined || opening.limitS > limitS) && {
        rule: "jumper-too-long",
        params: { device, limit: limitS },
      },
  );
}

/** Rules of putting something back: it has to be out, and what starts with the power off needs it off. */
export function putBackRules(state: DiagnosisState, body: BodyOf<"put-back.restored">): Breach[] {
  const item = openPutBacks(state).find((open) => open.eventId === body.of && open.entry === body.entry);
  if (!item) return [{ rule: "put-back-not-out" }];
  const jumperOn = openPutBacks(state).some(
    (open) => open.kind === "jumper-fitted" && open.device !== "thermostat",
  );
  return breachWhere(item.kind === "valve-closed" && jumperOn && { rule: "gas-stays-shut-under-jumper" });
}

function checkFits(state: DiagnosisState, check: string): Breach[] {
  if (!isCheckId(check)) return [{ rule: "check-unknown", params: { check } }];
  const { profile } = state;
  if (!profile || mayApply(getCheck(check).applies, profile.codes, profile.options)) return [];
  return [{ rule: "check-not-of-this-unit", params: { check } }];
}
