import { describe, expect, it } from "vitest";
import {
  FAULTS,
  acceptsAs,
  causesOf,
  evaluateVariant,
  faultsFor,
  formatVariant,
  getFault,
  lastStagesOf,
  parseVariant,
} from "@emberladder/furnace";
import type { VariantContext } from "@emberladder/furnace";
import { buildProfile } from "./build-profile.ts";

const hotSurface = buildProfile();
const stages = (fault: Parameters<typeof lastStagesOf>[0], context: Partial<VariantContext> = {}) => [
  ...lastStagesOf(fault, { codes: hotSurface.codes, options: {}, ...context }),
];
const withCodes = (codes: Partial<typeof hotSurface.codes>) => ({ codes: { ...hotSurface.codes, ...codes } });

describe("where a unit with a fault stops", () => {
  it("is after the light-off for a dirty flame sensor, after the purge for a broken igniter", () => {
    expect(stages("flame-sensor-dirty")).toEqual(["lightoff"]);
    expect(stages("igniter-broken")).toEqual(["prepurge"]);
  });

  it("depends on how a tripped rollout was met, and holds both where that is unknown", () => {
    expect(stages("rollout-cracked-exchanger", { found: "as-found" })).toEqual(["call"]);
    expect(stages("rollout-cracked-exchanger", { found: "on-run" })).toEqual(["blower-on"]);
    expect(stages("rollout-cracked-exchanger")).toEqual(["call", "blower-on"]);
  });

  it("depends on how far the fault has gone", () => {
    expect(stages("low-line-voltage", { severity: "full" })).toEqual(["power"]);
    expect(stages("low-line-voltage", { severity: "partial" })).toEqual(["inducer", "gas"]);
    expect(stages("low-line-voltage")).toEqual(["power", "inducer", "gas"]);
  });

  it("skips a clause that is false and stops at one that is true", () => {
    expect(stages("vent-blocked")).toEqual(["inducer"]);
    expect(stages("vent-blocked", withCodes({ draft: "IDC" }))).toEqual(["main-burner", "blower-on"]);
    expect(stages("vent-blocked", { ...withCodes({ draft: "ND" }), found: "as-found" })).toEqual(["call"]);
  });

  it("reads an unstated start check by the default of the control", () => {
    expect(stages("pressure-switch-stuck-closed")).toEqual(["safeties"]);
    expect(stages("pressure-switch-stuck-closed", withCodes({ control: "MOD-S" }))).toEqual(["main-burner"]);
    const checked = { ...withCodes({ control: "MOD-S" }), options: { "start-check": true } };
    expect(stages("pressure-switch-stuck-closed", checked)).toEqual(["safeties"]);
  });

  it("steps back to a rung that the unit has", () => {
    const natural = withCodes({ ignition: "IPS", draft: "ND", control: "MOD-S" });
    expect(stages("module-failed", natural)).toEqual(["safeties"]);
  });

  it("is never empty, for any fault on any unit it may be on", () => {
    for (const fault of FAULTS) expect(lastStagesOf(fault, hotSurface).size, fault.id).toBeGreaterThan(0);
  });
});

describe("to which units a fault applies", () => {
  it("keeps a fault while an option is not stated, and removes it only when it is false", () => {
    const ids = (options: VariantContext["options"]) =>
      faultsFor({ codes: hotSurface.codes, options }).map(({ id }) => id);
    expect(ids({})).toContain("lv-fuse-blown");
    expect(ids({ "lv-fuse": true })).toContain("lv-fuse-blown");
    expect(ids({ "lv-fuse": false })).not.toContain("lv-fuse-blown");
    expect(ids({})).not.toContain("thermocouple-failed");
  });

  it("evaluates in three values", () => {
    const tri = (text: string, options: VariantContext["options"] = {}) =>
      evaluateVariant(parseVariant(text), { codes: hotSurface.codes, options });
    expect(tri("opt:overflow & (draft:CON | loc:ATT,RTU | opt:ac-coil)")).toBe("unknown");
    expect(tri("opt:overflow & draft:CON")).toBe(false);
    expect(tri("opt:overflow | draft:IDP")).toBe(true);
    expect(tri("!opt:electromech-stat")).toBe("unknown");
    expect(tri("!opt:electromech-stat", { "electromech-stat": false })).toBe(true);
  });

  it("writes and reads every fault's expression to the same effect", () => {
    for (const fault of FAULTS) {
      const again = parseVariant(formatVariant(fault.applies));
      expect(evaluateVariant(again, hotSurface), fault.id).toBe(evaluateVariant(fault.applies, hotSurface));
    }
  });
});

describe("one fault by two names, and what follows from what", () => {
  it("takes the exchanger's two names for one another, and the vent's only where draft is natural", () => {
    expect(acceptsAs("rollout-cracked-exchanger", "cracked-heat-exchanger")).toBe(true);
    expect(acceptsAs("cracked-heat-exchanger", "rollout-cracked-exchanger")).toBe(true);
    expect(acceptsAs("vent-blocked", "spill-tripped", hotSurface)).toBe(false);
    expect(acceptsAs("vent-blocked", "spill-tripped", { ...hotSurface, ...withCodes({ draft: "ND" }) })).toBe(
      true,
    );
    expect(acceptsAs("flame-sensor-dirty", "board-flame-circuit")).toBe(false);
  });

  it("asks for the cause behind a blown fuse, a lockout and every tripped rollout but a failed one", () => {
    expect(causesOf("lv-fuse-blown")).toContain("tstat-wire-short");
    expect(causesOf("ignition-lockout-latched")).toEqual(
      expect.arrayContaining(["igniter-broken", "flame-sensor-dirty", "flue-recirculation"]),
    );
    expect(causesOf("ignition-lockout-latched")).not.toContain("limit-open-filter");
    expect(causesOf("rollout-blocked-flue")).toContain("vent-blocked");
    expect(causesOf("rollout-failed-open")).toEqual([]);
    expect(causesOf("rollout-dirty-burners", hotSurface)).not.toContain("inducer-wheel-loose");
    expect(causesOf("flame-sensor-dirty")).toEqual([]);
  });

  it("touches what the usual repair touches", () => {
    expect(getFault("flame-sensor-dirty").touches).toEqual(["flame"]);
    expect(getFault("limit-open-filter").touches).toEqual(["airflow"]);
    expect(getFault("tstat-dead-batteries").touches).toEqual(["setting"]);
    expect(getFault("gas-valve-stuck-closed").touches).toEqual(["gas-train"]);
    expect(getFault("board-dead").touches).toEqual(["control"]);
    expect(getFault("rollout-blocked-flue").touches).toContain("safety");
  });
});
