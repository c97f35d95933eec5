import { describe, expect, it } from "vitest";
import { respondAsHealthyUnit, runSequenceClock, timerSeconds } from "@emberladder/furnace";
import type { ScriptedEvent, SequenceMoment, UnitBehaviour, UnitProfile } from "@emberladder/furnace";
import { buildProfile } from "../furnace/build-profile.ts";

/** Behaviour of the control when something goes wrong. Each expectation is common practice unless it says more. */

const START: ScriptedEvent[] = [
  { atS: 0, event: { type: "LINE.on" } },
  { atS: 0, event: { type: "CALL.on" } },
];
const gas = buildProfile();
const propane = buildProfile({ codes: { fuel: "LP" } });

const without =
  (...kinds: string[]): UnitBehaviour =>
  (now, before) =>
    respondAsHealthyUnit(now, before).filter(({ kind }) => !kinds.includes(kind));
const neverLights = without("flame", "flame-proof");
const neverProved = without("flame-proof");
const neverDraws = without("draft");

function run(profile: UnitProfile, more: ScriptedEvent[] = [], untilS = 900, respond?: UnitBehaviour) {
  return runSequenceClock(profile, { script: [...START, ...more], untilS, respond });
}
const comingInto = (moments: readonly SequenceMoment[], state: string) =>
  moments.filter(
    (moment, index) => moment.state.startsWith(state) && !moments[index - 1]?.state.startsWith(state),
  );
const firstAt = (moments: readonly SequenceMoment[], state: string) =>
  comingInto(moments, state)[0]?.atS ?? Number.NaN;
const stateAt = (moments: readonly SequenceMoment[], atS: number) =>
  moments.findLast((moment) => moment.atS <= atS)?.state;

describe("no flame", () => {
  it("tries three times with a purge between, then locks out for an hour and starts again on natural gas", () => {
    const moments = run(gas, [], 4200, neverLights);
    const lockedAt = firstAt(moments, "softLockout");
    expect(comingInto(moments, "trial").filter(({ atS }) => atS < lockedAt)).toHaveLength(3);
    expect(comingInto(moments, "interpurge").filter(({ atS }) => atS < lockedAt)).toHaveLength(2);
    expect(moments.findLast(({ atS }) => atS === lockedAt)?.outputs).toEqual({
      inducer: "off",
      igniter: false,
      gas: "off",
    });
    const again = moments.find(({ atS, state }) => atS > lockedAt && state === "called");
    expect(again?.atS).toBe(lockedAt + 3600);
    expect(comingInto(moments, "trial").length).toBe(6);
  });

  it("tries as often as the label says", () => {
    const moments = run(buildProfile({ timings: { tries: 1 } }), [], 900, neverLights);
    expect(comingInto(moments, "trial")).toHaveLength(1);
  });

  it("locks out for good on propane, until the call is taken away or power is cut", () => {
    expect(run(propane, [], 8000, neverLights).at(-1)?.state).toBe("hardLockout");
    for (const reset of [
      [{ type: "CALL.off" }, { type: "CALL.on" }],
      [{ type: "LINE.off" }, { type: "LINE.on" }],
    ] as const) {
      const moments = run(
        propane,
        reset.map((event, index) => ({ atS: 1000 + index, event })),
        1100,
        neverLights,
      );
      expect(stateAt(moments, 999)).toBe("hardLockout");
      expect(comingInto(moments, "trial").filter(({ atS }) => atS > 1000)).not.toHaveLength(0);
    }
  });

  it("lights, is not accepted, and drops at the end of the trial each time", () => {
    const moments = run(gas, [], 900, neverProved);
    expect(moments.filter(({ state }) => state === "trial.lightoff")).toHaveLength(3);
    expect(comingInto(moments, "burning")).toHaveLength(0);
    expect(comingInto(moments, "softLockout")).toHaveLength(1);
  });

  it("frees a locked-out control at once when the thermostat is turned off and on", () => {
    const reset: ScriptedEvent[] = [
      { atS: 700, event: { type: "CALL.off" } },
      { atS: 701, event: { type: "CALL.on" } },
    ];
    const moments = run(gas, reset, 720, neverLights);
    expect(stateAt(moments, 699)).toBe("softLockout");
    expect(moments.at(-1)?.state).not.toBe("softLockout");
  });
});

describe("a flame lost in the run", () => {
  it("shuts the gas, purges and lights again, and locks out after three times in one call", () => {
    const losses = [120, 220, 320, 420].map((atS): ScriptedEvent => ({ atS, event: { type: "FLAME.lost" } }));
    const moments = run(gas, losses);
    expect(comingInto(moments, "burning")).toHaveLength(4);
    expect(firstAt(moments, "softLockout")).toBe(420);
    for (const { outputs } of comingInto(moments, "interpurge")) {
      expect(outputs).toEqual({ inducer: "low", igniter: false, gas: "off" });
    }
  });

  it("counts afresh in the next call", () => {
    const losses = [120, 220, 320].map((atS): ScriptedEvent => ({ atS, event: { type: "FLAME.lost" } }));
    const next: ScriptedEvent[] = [
      { atS: 400, event: { type: "CALL.off" } },
      { atS: 450, event: { type: "CALL.on" } },
      { atS: 600, event: { type: "FLAME.lost" } },
    ];
    expect(comingInto(run(gas, [...losses, ...next]), "softLockout")).toHaveLength(0);
  });
});

describe("an open limit", () => {
  it("shuts the gas at once with inducer and blower on, and lights again when it closes", () => {
    const moments = run(gas, [
      { atS: 300, event: { type: "LIMIT.open" } },
      { atS: 400, event: { type: "LIMIT.closed" } },
    ]);
    expect(moments.find(({ atS }) => atS === 300)).toMatchObject({
      state: "limitOpen",
      completed: "call",
      outputs: { inducer: "low", igniter: false, gas: "off" },
      blower: "on",
    });
    expect(comingInto(moments, "burning")).toHaveLength(2);
  });

  it("locks out until reset after three minutes", () => {
    const moments = run(gas, [{ atS: 300, event: { type: "LIMIT.open" } }], 4000);
    expect(firstAt(moments, "hardLockout")).toBe(480);
    expect(moments.at(-1)).toMatchObject({ state: "hardLockout", blower: "off" });
  });

  it("found open at the start runs inducer and blower and never reaches the igniter", () => {
    const moments = run(gas, [{ atS: 0, event: { type: "LIMIT.open" } }]);
    expect(moments.some(({ state, blower }) => state === "limitOpen" && blower === "on")).toBe(true);
    expect(moments.some(({ outputs }) => outputs.igniter)).toBe(false);
  });

  it("closing after the call has gone leaves the unit idle", () => {
    const moments = run(gas, [
      { atS: 300, event: { type: "LIMIT.open" } },
      { atS: 310, event: { type: "CALL.off" } },
      { atS: 330, event: { type: "LIMIT.closed" } },
    ]);
    expect(moments.at(-1)).toMatchObject({ state: "idle", blower: "off" });
  });
});

describe("draft", () => {
  it("that does not prove stops the inducer after its wait, rests, and is tried again", () => {
    const moments = run(gas, [], 900, neverDraws);
    const { draftWait, draftPause } = timerSeconds(gas);
    expect(firstAt(moments, "draftPause") - firstAt(moments, "inducer")).toBe(draftWait);
    const [, second] = comingInto(moments, "inducer");
    expect((second?.atS ?? 0) - firstAt(moments, "draftPause")).toBeGreaterThanOrEqual(draftPause);
    expect(moments.some(({ outputs }) => outputs.igniter || outputs.gas !== "off")).toBe(false);
  });

  it("switch that is closed before the start keeps the inducer off", () => {
    const moments = run(gas, [{ atS: 0, event: { type: "DRAFT.closed" } }], 900);
    expect(moments.at(-1)).toMatchObject({
      state: "stuckClosed",
      completed: "safeties",
      outputs: { inducer: "off" },
    });
  });

  it("switch that opens in the run shuts the gas with the inducer still on, and purges anew when it closes", () => {
    const moments = run(gas, [
      { atS: 300, event: { type: "DRAFT.open" } },
      { atS: 310, event: { type: "DRAFT.closed" } },
    ]);
    expect(moments.find(({ atS }) => atS === 300)).toMatchObject({
      state: "inducer",
      completed: "inducer",
      outputs: { inducer: "low", gas: "off" },
      blower: "running-on",
    });
    expect(stateAt(moments, 310)).toBe("prepurge");
    expect(comingInto(moments, "burning")).toHaveLength(2);
  });
});

// Safe start: a flame signal before the gas is no start. ANSI Z21.20, from memory.
describe("a false flame", () => {
  it.each([
    ["between calls", [{ atS: 5, event: { type: "FLAME.lit" } } as const], "idle"],
    ["in the purge", [{ atS: 15, event: { type: "FLAME.lit" } } as const], "prepurge"],
    ["in the warm-up", [{ atS: 40, event: { type: "FLAME.lit" } } as const], "warmUp"],
  ])("%s holds the unit with the inducer on and the gas shut until it is gone", (_, seen, before) => {
    const start = before === "idle" ? START.slice(0, 1) : START;
    const atS = seen[0]?.atS ?? 0;
    const script: ScriptedEvent[] = [...start, ...seen, { atS: 300, event: { type: "FLAME.lost" } }];
    const moments = runSequenceClock(gas, { script, untilS: 900 });
    expect(stateAt(moments, atS - 1)).toBe(before);
    expect(moments.find((moment) => moment.atS === atS)).toMatchObject({
      state: "falseFlame",
      outputs: { inducer: "low", igniter: false, gas: "off" },
    });
    expect(stateAt(moments, 299)).toBe("falseFlame");
    expect(stateAt(moments, 300)).toBe(before === "idle" ? "idle" : "called");
  });

  it("that outlives the post-purge is taken for a leaking valve, not for the end of the call", () => {
    const lingers: UnitBehaviour = (now, before) =>
      respondAsHealthyUnit(now, before).filter(({ event }) => event.type !== "FLAME.lost");
    const moments = run(gas, [{ atS: 300, event: { type: "CALL.off" } }], 400, lingers);
    expect(moments.at(-1)?.state).toBe("falseFlame");
  });
});

describe("the call taken away", () => {
  it("before the gas ends at once, after the gas with a purge", () => {
    const early = run(gas, [{ atS: 20, event: { type: "CALL.off" } }], 30);
    expect(early.at(-1)?.state).toBe("idle");
    const late = run(gas, [{ atS: 300, event: { type: "CALL.off" } }], 305);
    expect(late.at(-1)).toMatchObject({ state: "postPurge", completed: "satisfied", blower: "running-on" });
  });
});

describe("power lost in the run", () => {
  it("stops everything, and comes back by the whole sequence where the call is still there", () => {
    const moments = run(gas, [
      { atS: 300, event: { type: "LINE.off" } },
      { atS: 330, event: { type: "LINE.on" } },
    ]);
    expect(moments.find(({ atS }) => atS === 300)).toMatchObject({ completed: "none", blower: "off" });
    expect(stateAt(moments, 330)).toBe("called");
    expect(comingInto(moments, "prepurge")).toHaveLength(2);
    expect(moments.at(-1)?.state).toMatch(/^burning/);
  });
});
