import { describe, expect, it } from "vitest";
import { transition } from "xstate";
import { createSequence, directIgnitionMachine, readSequence } from "@emberladder/furnace";
import { buildProfile } from "../furnace/build-profile.ts";
import { allStates, allTransitions, walkMachine } from "./walk-machine.ts";

const KINDS = [
  { staging: "1S", fuel: "NG" },
  { staging: "1S", fuel: "LP" },
  { staging: "2S", fuel: "NG" },
  { staging: "2S", fuel: "LP" },
] as const;

/** States of the machine that a kind of unit does not have. */
const LACKING_STATES = {
  "1S": ["burning.rate.raising", "burning.rate.high"],
  "2S": [],
  NG: [],
  LP: ["softLockout"],
};

/** Transitions that a kind of unit does not have: the rates of two stages, and each fuel's way to lock out. */
const LACKING_TRANSITIONS = {
  "1S": /^burning\.rate\./,
  "2S": /^$/,
  NG: /^(trial --TIMER\.trial|burning --FLAME\.lost)--> branch 2$/,
  LP: /^((trial --TIMER\.trial|burning --FLAME\.lost)--> branch 3$|softLockout )/,
};

const withoutPrefix = (id: string) => id.replace(/^sequence\./, "");

const walks = KINDS.map((codes) => ({ codes, walk: walkMachine(buildProfile({ codes })) }));
const states = allStates(directIgnitionMachine.root);
const transitions = allTransitions(directIgnitionMachine.root);

describe("the ignition sequence, walked breadth first with every event in every situation", () => {
  it("comes into every state and takes every transition, over one and two stages, natural gas and propane", () => {
    const seenStates = new Set(walks.flatMap(({ walk }) => [...walk.states]));
    const seen = new Set(walks.flatMap(({ walk }) => [...walk.transitions]));
    for (const { codes, walk } of walks) {
      process.stdout.write(
        `sequence ${codes.staging} ${codes.fuel}: ${walk.states.size} states, ${walk.transitions.size} transitions, ` +
          `${walk.situations.length} situations, ${walk.steps} steps\n`,
      );
    }
    process.stdout.write(`sequence: ${states.length} states, ${transitions.length} transitions in all\n`);
    expect(states.filter((state) => !seenStates.has(state))).toEqual([]);
    expect(transitions.filter((name) => !seen.has(name))).toEqual([]);
  });

  it.each(walks)(
    "leaves out only what another stage count or fuel does: $codes.staging $codes.fuel",
    ({ codes: { staging, fuel }, walk }) => {
      const missedStates = states.filter((state) => !walk.states.has(state)).map(withoutPrefix);
      const missed = transitions.filter((name) => !walk.transitions.has(name));
      expect(missedStates).toEqual([...LACKING_STATES[staging], ...LACKING_STATES[fuel]]);
      expect(
        missed.filter(
          (name) => !LACKING_TRANSITIONS[staging].test(name) && !LACKING_TRANSITIONS[fuel].test(name),
        ),
      ).toEqual([]);
    },
  );

  // Common practice, and the purpose of the string: gas needs every safety closed and proven draft.
  it("never opens the gas without proven draft, with the limit known open, or with no call", () => {
    let withGas = 0;
    for (const { walk } of walks) {
      for (const { snapshot, state } of walk.situations) {
        if (readSequence(snapshot).outputs.gas === "off") continue;
        withGas++;
        expect(snapshot.context, state).toMatchObject({ limitOpen: false, draftClosed: true, calling: true });
        expect(readSequence(snapshot).outputs.inducer, state).not.toBe("off");
      }
    }
    expect(withGas).toBeGreaterThan(100);
  });

  it("never starts the ignition with a flame already there", () => {
    const warming = walks
      .flatMap(({ walk }) => walk.situations)
      .filter(({ snapshot }) => snapshot.matches("warmUp"));
    expect(warming.length).toBeGreaterThan(10);
    expect(warming.filter(({ snapshot }) => snapshot.context.flame)).toEqual([]);
  });

  it("can get from every situation back to a dead unit by losing power, with all outputs off", () => {
    for (const { walk } of walks) {
      const { machine } = createSequence(buildProfile());
      for (const { snapshot, state } of walk.situations) {
        const [after] = transition(machine, snapshot, { type: "LINE.off" });
        expect(readSequence(after), state).toMatchObject({
          state: "dead",
          completed: "none",
          outputs: { inducer: "off", igniter: false, gas: "off" },
          blower: "off",
        });
        expect(after.context, state).toMatchObject({ tries: 0, recycles: 0 });
      }
    }
  });

  it("shuts the gas at once in every situation when the call is taken away", () => {
    for (const { walk } of walks) {
      const { machine } = createSequence(buildProfile());
      for (const { snapshot, state } of walk.situations) {
        const [after] = transition(machine, snapshot, { type: "CALL.off" });
        expect(readSequence(after).outputs, state).toMatchObject({ gas: "off", igniter: false });
        expect(after.context.calling, state).toBe(false);
      }
    }
  });

  it("shuts the gas at once in every situation when the limit or the pressure switch opens, or the flame goes", () => {
    const { machine } = createSequence(buildProfile());
    for (const { walk } of walks) {
      for (const { snapshot, state } of walk.situations) {
        for (const type of ["LIMIT.open", "DRAFT.open"] as const) {
          const [after] = transition(machine, snapshot, { type });
          expect(readSequence(after).outputs.gas, `${type} in ${state}`).toBe("off");
        }
        if (!snapshot.matches("burning")) continue;
        const [after] = transition(machine, snapshot, { type: "FLAME.lost" });
        expect(readSequence(after).outputs.gas, `FLAME.lost in ${state}`).toBe("off");
      }
    }
  });
});
