import { ign } from "../variant.ts";
import { STOP_RULE_CODES, STOP_RULE_IDS } from "./stop-rule-ids.ts";
import type { StopRuleId } from "./stop-rule-ids.ts";
import type { ActPass, StopAct, StopRule, StopRuleEntry } from "./stop-rule-types.ts";

type Due = StopAct["due"];

const tick = (id: string, due: Due = "all"): StopAct => ({ id, kind: "tick", due });
const look = (id: string, check: StopAct["check"], due: Due = "all"): StopAct => ({
  id,
  kind: "tick",
  due,
  check,
});
const text = (id: string, due: Due = "all"): StopAct => ({ id, kind: "text", due });
const timer = (id: string, seconds: number, due: Due = "all"): StopAct => ({
  id,
  kind: "timer",
  due,
  seconds,
});
const reading = (
  id: string,
  check: NonNullable<StopAct["check"]>,
  pass: ActPass | undefined,
  due: Due = "all",
): StopAct => ({
  id,
  kind: "reading",
  due,
  check,
  pass,
});

/** Minutes of rest before a burner box that had raw gas in it is tried again. Common practice. */
const CLEAR_OUT_S = 300;
/** Least length of the one supervised run after a rollout or a spill. Common practice. */
const SUPERVISED_RUN_S = 600;

const NO_LEL: ActPass = { atMost: 0 };

/** The stop rules. No rule leaves a technician with no way to finish: at worst the unit is shut off. */
export const STOP_RULES: Readonly<Record<StopRuleId, StopRuleEntry>> = {
  co: {
    stops: "everything",
    acts: [tick("everyone-out"), tick("called-emergency"), text("cleared-by", "going-on")],
    afterwards: "only-shut-off-or-refer",
    provenance: "70 ppm: lowest alarm point of UL 2034 and IFGC/IRC Appendix D, from memory",
  },
  "co-alarm": {
    stops: "entering",
    acts: [
      tick("everyone-out"),
      tick("meter-on"),
      reading("read-room", "ck-co-ambient", undefined),
      text("alarm-explained", "closing"),
    ],
    afterwards: "may-go-on",
    provenance: "UL 2034 from memory; common practice",
  },
  "co-30": {
    stops: "everything",
    acts: [
      tick("appliances-off"),
      tick("people-out"),
      tick("aired"),
      reading("read-again", "ck-co-ambient", { below: 30 }, "going-on"),
      text("source-found", "going-on"),
      reading("read-before-run", "ck-co-ambient", { below: 10 }, "going-on"),
    ],
    afterwards: "one-supervised-run",
    provenance: "30 and 70 ppm: IFGC/IRC Appendix D, part seen; below 10 ppm before a run: judgement",
  },
  "gas-odor": {
    stops: "everything",
    acts: [
      tick("outside"),
      tick("everyone-out"),
      tick("called-gas-supplier"),
      text("cleared-by", "going-on"),
    ],
    afterwards: "may-go-on",
    provenance: "20 % LEL: IFGC/IRC Appendix D; 10 % LEL: common practice",
  },
  "lel-1": {
    stops: "call-for-heat",
    acts: [
      tick("no-call"),
      text("found-and-cured", "going-on"),
      reading("reads-zero", "ck-gas-detector", NO_LEL, "going-on"),
    ],
    afterwards: "may-go-on",
    provenance: "common practice",
  },
  "raw-gas": {
    stops: "call-for-heat",
    acts: [
      tick("call-ended"),
      tick("gas-shut"),
      timer("wait-5-min", CLEAR_OUT_S, "going-on"),
      reading("lel-burner-box", "ck-gas-detector", NO_LEL, "going-on"),
      reading("lel-vent", "ck-gas-detector", NO_LEL, "going-on"),
      { ...tick("ignition-seen-gas-shut", "going-on"), when: ign.not("SP") },
    ],
    afterwards: "may-go-on",
    provenance: "common practice; five minutes as on lighting instructions",
  },
  access: {
    stops: "everything",
    acts: [text("what-is-unsafe"), text("made-safe", "going-on")],
    afterwards: "may-go-on",
    provenance: "common practice; 29 CFR 1910.28 and 1910.29, from memory",
  },
  "found-off": {
    stops: "restoring",
    acts: [tick("tags-and-history-read"), text("who-and-why"), tick("not-locked-or-authorised", "going-on")],
    afterwards: "may-go-on",
    provenance: "common practice",
  },
  "lp-empty": {
    stops: "call-for-heat",
    acts: [
      tick("gas-shut"),
      tick("tagged"),
      tick("supplier-told"),
      reading("tank-filled", "ck-lp-tank", { above: 5 }, "going-on"),
    ],
    afterwards: "may-go-on",
    closing: ["close-restore"],
    provenance: "common practice; NFPA 58, from memory",
  },
  "lp-low": {
    stops: "call-for-heat",
    acts: [reading("floor-reads-zero", "ck-gas-detector", NO_LEL, "going-on")],
    afterwards: "may-go-on",
    provenance: "common practice: propane is heavier than air",
  },
  rollout: {
    stops: "firing",
    acts: [
      tick("gas-shut"),
      look("vent-looked-at", "ck-vent-inspect"),
      look("exchanger-looked-at", "ck-heat-exchanger"),
      look("burners-looked-at", "ck-burner-visual"),
      look("wiring-looked-at", "ck-visual-wiring"),
      tick("air-supply-looked-at"),
      text("cause-or-all-clean"),
      tick("reset-once", "going-on"),
      timer("supervised-run", SUPERVISED_RUN_S, "going-on"),
      { ...reading("run-co", "ck-flue-analysis", { atMost: 400 }, "going-on") },
      tick("no-flame-outside", "going-on"),
    ],
    afterwards: "one-supervised-run",
    provenance: "common practice",
  },
  spill: {
    stops: "firing",
    acts: [
      tick("appliance-off"),
      reading("room-co", "ck-co-ambient", undefined),
      look("vent-looked-at", "ck-vent-inspect"),
      tick("air-supply-looked-at"),
      text("cause-or-all-clean"),
      tick("reset-once", "going-on"),
      timer("supervised-run", SUPERVISED_RUN_S, "going-on"),
      reading("spill-stops", "ck-spillage", { atMost: 300 }, "going-on"),
    ],
    afterwards: "one-supervised-run",
    provenance: "common practice; five minutes: IFGC/IRC Appendix D, from memory",
  },
  "flue-400": {
    stops: "firing",
    acts: [
      tick("shut-down"),
      tick("tagged"),
      text("cause-cured", "going-on"),
      reading("flue-co-again", "ck-flue-analysis", { atMost: 400 }, "going-on"),
    ],
    afterwards: "may-go-on",
    closing: ["close-co"],
    provenance: "400 ppm air-free: certification limit of ANSI Z21.47, from memory",
  },
  exchanger: {
    stops: "firing",
    acts: [
      tick("gas-shut"),
      tick("power-off"),
      tick("tagged"),
      tick("owner-told-in-writing"),
      text("exchanger-or-unit-replaced", "going-on"),
    ],
    afterwards: "only-shut-off-or-refer",
    provenance: "common practice; appliance standards, from memory",
  },
  "leak-by": {
    stops: "firing",
    acts: [tick("gas-shut"), tick("tagged"), text("valve-replaced", "going-on")],
    afterwards: "may-go-on",
    provenance: "common practice",
  },
  soot: {
    stops: "firing",
    acts: [tick("no-firing"), text("cause-found", "going-on")],
    afterwards: "may-go-on",
    provenance: "common practice",
  },
  "live-cabinet": {
    stops: "touching",
    acts: [
      tick("hands-off"),
      tick("breaker-off"),
      tick("proved-dead"),
      text("fault-found", "going-on"),
      reading("cabinet-again", "ck-cabinet-earth", { atMost: 30 }, "going-on"),
    ],
    afterwards: "may-go-on",
    provenance: "common practice",
  },
  flood: {
    stops: "everything",
    acts: [tick("not-operated"), tick("tagged"), text("gas-controls-replaced", "going-on")],
    afterwards: "only-shut-off-or-refer",
    provenance: "common rule of makers and standards, from memory",
  },
  "water-wet": {
    stops: "touching",
    acts: [tick("de-energised"), text("dried-and-cause", "going-on")],
    afterwards: "may-go-on",
    provenance: "common practice",
  },
  asbestos: {
    stops: "touching",
    acts: [tick("stopped-not-disturbed"), tick("owner-told"), text("work-does-not-touch-it", "going-on")],
    afterwards: "may-go-on",
    provenance: "common practice",
  },
};

/** The stop rule with an id. */
export function getStopRule(id: StopRuleId): StopRule {
  return { id, code: STOP_RULE_CODES[id], ...STOP_RULES[id] };
}

/** The stop rule that the trade reads by a code such as CO-30, or undefined where there is none. */
export function stopRuleByCode(code: string): StopRuleId | undefined {
  return STOP_RULE_IDS.find((id) => STOP_RULE_CODES[id] === code);
}

/** Whether a number does an act of a rule; a rule without a limit only asks that it is read. */
export function actPasses(act: StopAct, value: number): boolean {
  const { atMost = Infinity, below = Infinity, atLeast = -Infinity, above = -Infinity } = act.pass ?? {};
  if (Number.isNaN(value)) return false;
  const underTop = value <= atMost && (below === Infinity || value < below);
  return underTop && value >= atLeast && (above === -Infinity || value > above);
}
