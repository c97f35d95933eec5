import { describe, expect, it } from "vitest";
import { DEFAULT_TIMINGS, STAGES, respondAsHealthyUnit, runSequenceClock } from "@emberladder/furnace";
import type { SequenceMoment, UnitBehaviour } from "@emberladder/furnace";
import { buildProfile } from "../furnace/build-profile.ts";

/**
 * One heat cycle as the trade tells it, typed from common practice for a direct hot-surface unit with an induced
 * draft and an integrated board: stage completed, inducer, igniter, gas, circulating blower.
 */
const TRADE_TABLE = [
  ["none", "off", false, "off", "off"],
  ["power", "off", false, "off", "off"],
  ["call", "off", false, "off", "off"],
  ["safeties", "off", false, "off", "off"],
  ["draft-rest", "low", false, "off", "off"],
  ["inducer", "low", false, "off", "off"],
  ["draft-proved", "low", false, "off", "off"],
  ["prepurge", "low", true, "off", "off"],
  ["gas", "low", true, "low", "off"],
  ["lightoff", "low", true, "low", "off"],
  ["flame-proved", "low", false, "low", "off"],
  ["main-burner", "low", false, "low", "off"],
  ["blower-on", "low", false, "low", "on"],
  ["steady", "low", false, "low", "on"],
  ["satisfied", "low", false, "off", "running-on"],
  ["power", "off", false, "off", "running-on"],
  ["power", "off", false, "off", "off"],
] as const;

const call = {
  untilS: 1200,
  script: [
    { atS: 0, event: { type: "LINE.on" } },
    { atS: 10, event: { type: "CALL.on" } },
    { atS: 900, event: { type: "CALL.off" } },
  ],
} as const;

const withoutHighDraft: UnitBehaviour = (now, before) =>
  respondAsHealthyUnit(now, before).filter(({ kind }) => kind !== "high-draft");

const row = ({ completed, outputs, blower }: SequenceMoment) => [
  completed,
  outputs.inducer,
  outputs.igniter,
  outputs.gas,
  blower,
];
const secondsOf = (moments: readonly SequenceMoment[], completed: SequenceMoment["completed"]) =>
  moments.find((moment) => moment.completed === completed)?.atS ?? Number.NaN;

describe("one healthy call of twenty minutes", () => {
  it.each(["NG", "LP"] as const)(
    "climbs in the order of the trade and energises what the trade says, %s",
    (fuel) => {
      const moments = runSequenceClock(buildProfile({ codes: { fuel } }), call);
      expect(moments.map(row)).toEqual(TRADE_TABLE.map((line) => [...line]));
    },
  );

  it("passes the glow on the way from purge to gas: no stage of the ladder is left out", () => {
    const climbed = new Set<string>(runSequenceClock(buildProfile(), call).map((moment) => moment.completed));
    // Glow and gas come in one step of the control, so the higher of the two is what it has completed.
    expect(STAGES.filter((stage) => !climbed.has(stage))).toEqual(["ignition-source"]);
  });

  it("takes the seconds of the unit's label, else the usual ones", () => {
    const usual = runSequenceClock(buildProfile(), call);
    const purge = secondsOf(usual, "prepurge") - secondsOf(usual, "draft-proved");
    expect(purge).toBe(DEFAULT_TIMINGS.prepurgeS.usual);
    const labelled = runSequenceClock(
      buildProfile({ timings: { prepurgeS: 34, blowerOffDelayS: 90 } }),
      call,
    );
    expect(secondsOf(labelled, "prepurge") - secondsOf(labelled, "draft-proved")).toBe(34);
    expect((labelled.at(-1)?.atS ?? 0) - secondsOf(labelled, "satisfied")).toBe(90);
  });

  it("purges after the call and runs the blower on, the inducer off first", () => {
    const tail = runSequenceClock(buildProfile(), call).slice(-3);
    expect(tail.map(({ atS, state, blower }) => [atS, state, blower])).toEqual([
      [900, "postPurge", "running-on"],
      [910, "idle", "running-on"],
      [1020, "idle", "off"],
    ]);
  });

  it("starts again on the next call, once the pressure switch has opened", () => {
    const moments = runSequenceClock(buildProfile(), {
      ...call,
      script: [...call.script, { atS: 905, event: { type: "CALL.on" } }],
    });
    const after = moments.filter((moment) => moment.atS > 900).map((moment) => moment.state);
    expect(after.slice(0, 4)).toEqual(["called", "checkingOpen", "starting", "inducer"]);
  });
});

describe("two stages", () => {
  const twoStage = buildProfile({ codes: { staging: "2S" } });

  it("lights on low, and goes high by time: inducer first, gas once the high switch has closed", () => {
    const moments = runSequenceClock(twoStage, call);
    const rates = moments.filter(({ outputs }) => outputs.gas !== "off").map(({ outputs }) => outputs);
    expect(rates[0]).toEqual({ inducer: "low", igniter: true, gas: "low" });
    const raised = rates.findIndex((outputs) => outputs.inducer === "high");
    expect(rates[raised]).toMatchObject({ inducer: "high", gas: "low" });
    expect(rates[raised + 1]).toMatchObject({ inducer: "high", gas: "high" });
  });

  it("goes high right after the crossover where the thermostat asks for it, and back when it is content", () => {
    const moments = runSequenceClock(twoStage, {
      untilS: 600,
      script: [
        { atS: 0, event: { type: "CALL.high" } },
        ...call.script.slice(0, 2),
        { atS: 300, event: { type: "CALL.low" } },
      ],
    });
    const high = moments.find(({ outputs }) => outputs.gas === "high");
    expect(high?.atS).toBeLessThan(secondsOf(moments, "blower-on"));
    expect(moments.find(({ atS }) => atS === 300)?.outputs).toMatchObject({ inducer: "low", gas: "low" });
  });

  it("stays on low gas where the high switch does not close", () => {
    const moments = runSequenceClock(twoStage, { ...call, respond: withoutHighDraft });
    expect(moments.some(({ outputs }) => outputs.inducer === "high")).toBe(true);
    expect(moments.every(({ outputs }) => outputs.gas !== "high")).toBe(true);
    expect(moments.some(({ completed }) => completed === "steady")).toBe(true);
  });
});
