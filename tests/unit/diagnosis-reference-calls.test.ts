import {
  breaches,
  command,
  evolve,
  fold,
  initialState,
  ladderOf,
  lastStageOf,
  noteHash,
} from "@emberladder/diagnosis";
import type { Breach, RecordedEvent } from "@emberladder/diagnosis";
import { arrivalOf, recordOf, referenceCalls } from "@emberladder/db/seed";
import type { RecordStep, ReferenceCall } from "@emberladder/db/seed";
import { describe, expect, it } from "vitest";
import { readFamilyCalls } from "../support/reference-calls.ts";
import { twinsOf } from "../support/twins.ts";

/*
 * The reference calls of the family, played through the rules as a phone would. The calls are invented; what they
 * are held against is the trade: bands, stop rules and closing checks, common practice.
 */
const family = readFamilyCalls();

const eventId = (index: number) => `00000000-0000-7000-8000-${String(index + 1).padStart(12, "0")}`;
const frame = {
  callId: eventId(900),
  unitId: eventId(901),
  tree: null,
  noteRef: (text: string) => noteHash("0".repeat(32), text),
  eventId,
};

function play(call: ReferenceCall, steps: readonly RecordStep[]) {
  const start = arrivalOf(call);
  const found: { type: string; breach: Breach }[] = [];
  let state = initialState;
  steps.forEach((step, index) => {
    const at = start + step.minute * 60_000;
    for (const breach of breaches(state, step.command, { now: at }))
      found.push({ type: step.command.type, breach });
    const event: RecordedEvent = {
      id: eventId(index),
      type: step.command.type,
      schemaVersion: 1,
      body: step.command.body,
      occurredAt: at,
      deviceId: "d",
      deviceSeq: index + 1,
    };
    state = evolve(state, event);
  });
  return { state, found, rules: found.map(({ breach }) => breach.rule) };
}

describe("reference calls of the family", () => {
  it("are the three that the family has, and the demo shows the same", () => {
    expect(family.map((call) => call.id)).toEqual(["R01", "R06", "R10"]);
    expect(referenceCalls).toEqual(family);
  });

  describe.each(family)("$id $slug", (call) => {
    const steps = recordOf(call, frame);

    it("is recorded without a single rule in the way and ends as it did", () => {
      const { state, found } = play(call, steps);
      expect(found).toEqual([]);
      expect(state.closed?.outcome).toBe(call.outcome);
      expect(lastStageOf(state)).toBe(call.watch?.at(-1)?.lastStage ?? "any");
    });

    it("draws every rung proven after a full call, or the gap where the unit was left off", () => {
      const { state } = play(call, steps);
      const states = new Set(ladderOf(state).map((rung) => rung.state));
      const expected = call.outcome === "fixed" ? ["proven"] : ["passed", "proven", "stopped", "waiting"];
      expect([...states].toSorted()).toEqual(expected);
    });

    it("folds to the same state event by event and all at once", () => {
      const { state } = play(call, steps);
      expect(fold(state.log)).toEqual(state);
    });

    it.each(twinsOf(call, eventId).filter(({ isServersOnly }) => !isServersOnly))(
      "is flagged when $when",
      ({ make, rule }) => {
        expect(play(call, make(steps)).rules).toContain(rule);
      },
    );
  });

  describe.each(family.filter((call) => call.outcome === "shut-off"))("$id $slug", (call) => {
    const steps = recordOf(call, frame);

    it("may leave things out where the unit is recorded shut off", () => {
      const last = steps.findLastIndex((step) => step.command.type === "put-back.restored");
      const close = steps.findIndex((step) => step.command.type === "diagnosis.closed");
      const jumper = command("put-back.opened", {
        kind: "jumper-fitted",
        what: "r-w-jumper",
        device: "thermostat",
        limitS: 60,
      });
      const twin = [
        ...steps.slice(0, close).filter((_, index) => index !== last),
        { minute: steps[close]?.minute ?? 0, command: jumper },
        ...steps.slice(close),
      ];
      const { state, rules } = play(call, twin);
      expect(state.putBacks.filter((item) => !item.restored).length).toBeGreaterThan(1);
      expect(rules).not.toContain("safety-bypassed");
      expect(rules).not.toContain("put-back-open");
    });
  });
});
