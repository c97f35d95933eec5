import { describe, expect, it } from "vitest";
import {
  CHECK_IDS,
  DOOR_ASKS,
  FIRST_LOOK,
  JUMPER_RULES,
  STOP_RULES,
  STOP_RULE_IDS,
  STOP_TRIGGERS,
  actPasses,
  findingsOf,
  firstLookFor,
  getFinding,
  getStopRule,
  isFaultId,
  stopRuleByCode,
  stopRulesFor,
} from "@emberladder/furnace";
import type { StopFact } from "@emberladder/furnace";
import { buildProfile } from "./build-profile.ts";

const unit = buildProfile();
const propane = buildProfile({ codes: { fuel: "LP" } });
const door = (
  question: "people" | "smell" | "way-in" | "at-unit",
  answers: Record<string, unknown>,
): StopFact => ({ on: "door", question, answers });

describe("what brings a stop rule up", () => {
  it("asks for people before any meter: unwell is CO whatever the meter says", () => {
    expect(stopRulesFor(door("people", { unwell: true, alarm: false, coPpm: 0 }), unit)).toEqual(["co"]);
    expect(stopRulesFor(door("people", { unwell: false, alarm: true }), unit)).toEqual(["co-alarm"]);
  });

  it.each([
    [29, []],
    [30, ["co-30"]],
    [69, ["co-30"]],
    [70, ["co"]],
  ])("at %d ppm in the room (70 ppm: UL 2034, from memory)", (coPpm, rules) => {
    expect(stopRulesFor(door("people", { unwell: false, alarm: false, coPpm }), unit)).toEqual(rules);
    expect(stopRulesFor({ on: "check", check: "ck-co-ambient", value: coPpm, unit: "ppm" }, unit)).toEqual(
      rules,
    );
  });

  it.each([
    [0.9, []],
    [1, ["lel-1"]],
    [9.9, ["lel-1"]],
    [10, ["gas-odor"]],
  ])("at %d %% LEL", (value, rules) => {
    expect(stopRulesFor({ on: "check", check: "ck-gas-detector", value, unit: "pct" }, unit)).toEqual(rules);
  });

  it("raises none at a clear door", () => {
    expect(stopRulesFor(door("people", { unwell: false, alarm: false, coPpm: 0 }), unit)).toEqual([]);
    expect(stopRulesFor(door("smell", { smell: false, lelPct: 0 }), unit)).toEqual([]);
    expect(stopRulesFor(door("way-in", { safe: true }), unit)).toEqual([]);
    expect(stopRulesFor(door("at-unit", { found: [], cabinetV: 0.1 }), unit)).toEqual([]);
  });

  it("stops at an unguarded edge under six feet, not behind a parapet", () => {
    expect(stopRulesFor(door("way-in", { safe: true, edgeFt: 4 }), unit)).toEqual(["access"]);
    expect(stopRulesFor(door("way-in", { safe: true, edgeFt: 4, parapetIn: 42 }), unit)).toEqual([]);
    expect(stopRulesFor(door("way-in", { safe: true, edgeFt: 12 }), unit)).toEqual([]);
  });

  it("takes dead burners for an empty tank on propane only", () => {
    const dead: StopFact = { on: "check", check: "ck-other-appliances", finding: "dead", outcome: "fail" };
    expect(stopRulesFor(dead, propane)).toEqual(["lp-empty"]);
    expect(stopRulesFor(dead, unit)).toEqual([]);
  });

  it("raises the rule of every finding that names one", () => {
    for (const check of CHECK_IDS) {
      for (const finding of findingsOf(check)) {
        for (const rule of finding.stopRules ?? []) {
          expect(
            stopRulesFor({ on: "check", check, finding: finding.id }, unit),
            `${check} ${finding.id}`,
          ).toContain(rule);
        }
      }
    }
  });

  it("names only findings that exist", () => {
    const unknown = STOP_RULE_IDS.flatMap((id) => STOP_TRIGGERS[id]).filter(
      (trigger) => trigger.on === "finding" && !getFinding(trigger.check, trigger.finding),
    );
    expect(unknown).toEqual([]);
  });
});

describe("what a stop rule asks for", () => {
  it("leaves a way to finish: what is asked of everyone needs no cure and no second reading", () => {
    for (const id of STOP_RULE_IDS) {
      const always = STOP_RULES[id].acts.filter((act) => act.due === "all");
      for (const act of always) expect(act.pass, `${id} ${act.id}`).toBeUndefined();
      for (const act of always) expect(act.kind, `${id} ${act.id}`).not.toBe("timer");
    }
  });

  it("names each act of a rule once, with its check or its time", () => {
    for (const id of STOP_RULE_IDS) {
      const { acts } = getStopRule(id);
      expect(new Set(acts.map((act) => act.id)).size, id).toBe(acts.length);
      const lacking = acts.filter((act) =>
        act.kind === "reading" ? !act.check : act.kind === "timer" ? !act.seconds : false,
      );
      expect(lacking, id).toEqual([]);
    }
  });

  it("lets raw gas rest for five minutes and read zero twice before the next try", () => {
    const acts = getStopRule("raw-gas").acts;
    expect(acts.find((act) => act.id === "wait-5-min")?.seconds).toBe(300);
    const lel = acts.find((act) => act.id === "lel-burner-box");
    expect(lel && [actPasses(lel, 0), actPasses(lel, 0.5)]).toEqual([true, false]);
  });

  it("lets a tripped rollout run once only, under watch", () => {
    expect(getStopRule("rollout").afterwards).toBe("one-supervised-run");
  });

  it("is found by the code that the trade reads aloud", () => {
    expect(stopRuleByCode("WATER/WET")).toBe("water-wet");
    expect(stopRuleByCode("CO-30")).toBe("co-30");
    expect(stopRuleByCode("NONE")).toBeUndefined();
  });
});

describe("the door, the first look and jumpers", () => {
  it("asks for the people first", () => {
    expect(DOOR_ASKS[0]?.field).toBe("unwell");
    expect(DOOR_ASKS[1]?.field).toBe("alarm");
  });

  it("has only hits whose finding and cause exist, each with its own id", () => {
    for (const item of FIRST_LOOK) {
      expect(new Set(item.hits.map((hit) => hit.id)).size, item.id).toBe(item.hits.length);
      const wrong = item.hits.filter(
        (hit) =>
          (hit.finding !== undefined && !getFinding(hit.check, hit.finding)) ||
          (hit.fault !== undefined && !isFaultId(hit.fault)),
      );
      expect(wrong, item.id).toEqual([]);
    }
  });

  it("settles dead batteries at the thermostat, and looks for no battery where there is none", () => {
    const hits = (options: typeof unit.options) =>
      firstLookFor({ codes: unit.codes, options }).find(({ id }) => id === "thermostat")?.hits ?? [];
    expect(hits({ "stat-battery": true }).find(({ id }) => id === "blank")?.fault).toBe(
      "tstat-dead-batteries",
    );
    expect(hits({ "stat-battery": false }).map(({ id }) => id)).not.toContain("blank");
  });

  it("allows no jumper on a limit, a rollout or a gas valve, ever", () => {
    for (const device of [
      "limit",
      "rollout",
      "spill-switch",
      "aux-limit",
      "gas-valve",
      "flame-sensor",
    ] as const) {
      expect(JUMPER_RULES[device].allowed, device).toBe(false);
    }
    expect(JUMPER_RULES["pressure-switch"]).toMatchObject({ allowed: true, limitS: 60 });
    expect(JUMPER_RULES["pressure-switch"].conditions).toContain("gas-shut");
  });
});
