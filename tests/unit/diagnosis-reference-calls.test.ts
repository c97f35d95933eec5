import { readdirSync, readFileSync } from "node:fs";
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
import type { Breach, Command, RecordedEvent } from "@emberladder/diagnosis";
import { recordOf } from "@emberladder/db/seed";
import type { RecordStep, ReferenceCall } from "@emberladder/db/seed";
import { describe, expect, it } from "vitest";

/*
 * The reference calls of the family, played through the rules as a phone would. The calls are invented; what they
 * are held against is the trade: bands, stop rules and closing checks, common practice.
 */
const folder = new URL("../fixtures/reference-calls/", import.meta.url);
const calls = readdirSync(folder)
  .filter((name) => /^\d+.*\.json$/.test(name))
  .map((name) => JSON.parse(readFileSync(new URL(name, folder), "utf8")) as ReferenceCall);
const family = calls.filter(
  ({ unit }) => unit.ignition === "HSI" && unit.draft === "IDP" && unit.control === "IFC",
);

const eventId = (index: number) => `00000000-0000-7000-8000-${String(index + 1).padStart(12, "0")}`;
const frame = {
  callId: eventId(900),
  unitId: eventId(901),
  tree: null,
  noteRef: (text: string) => noteHash("0".repeat(32), text),
  eventId,
};

function play(call: ReferenceCall, steps: readonly RecordStep[]) {
  const start = Date.parse(`${call.job.date}T${call.job.arrived}:00-07:00`);
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

const withoutBody = (steps: RecordStep[], drop: (wanted: Command) => boolean): RecordStep[] => {
  // An event that is left out keeps its place as an unknown step, so that ids of the others stay.
  return steps.map((step) =>
    drop(step.command) ? { ...step, command: { type: "nothing.happened", body: {} } as never } : step,
  );
};

describe("reference calls of the family", () => {
  it("are at least the three that the family has", () =>
    expect(family.map((call) => call.id)).toEqual(["R01", "R06", "R10"]));

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
      if (call.outcome === "fixed") expect([...states]).toEqual(["proven"]);
      else expect(states.has("stopped")).toBe(true);
    });

    it("folds to the same state event by event and all at once", () => {
      const { state } = play(call, steps);
      expect(fold(state.log)).toEqual(state);
    });

    it("is flagged when the decisive readings are left out", () => {
      const decisive = new Set([
        "ck-flame-current",
        "ck-filter",
        "ck-temp-rise",
        "ck-limit-voltage",
        "ck-rollout",
        "ck-heat-exchanger",
        "ck-vent-inspect",
        "ck-flame-appearance",
      ]);
      const twin = withoutBody(
        steps,
        (wanted) =>
          (wanted.type === "check.answered" || wanted.type === "look.answered") &&
          decisive.has(wanted.body.check ?? ""),
      );
      expect(play(call, twin).rules).toContain("decisive-reading-missing");
    });

    it("is flagged when one put-back stays open", () => {
      const last = steps.findLastIndex((step) => step.command.type === "put-back.restored");
      const twin = steps.filter((_, index) => index !== last);
      const { rules } = play(
        call,
        twin.map((step) => step),
      );
      if (call.outcome === "fixed") expect(rules).toContain("put-back-open");
      else expect(play(call, twin).state.putBacks.some((item) => !item.restored)).toBe(true);
    });

    it("is flagged when a jumper is left on", () => {
      const close = steps.findIndex((step) => step.command.type === "diagnosis.closed");
      const jumper: RecordStep = {
        minute: steps[close]?.minute ?? 0,
        command: command("put-back.opened", {
          kind: "jumper-fitted",
          what: "r-w-jumper",
          device: "thermostat",
          limitS: 60,
        }),
      };
      const twin = [...steps.slice(0, close), jumper, ...steps.slice(close)];
      const { rules } = play(call, twin);
      if (call.outcome === "shut-off") expect(rules).not.toContain("safety-bypassed");
      else expect(rules).toContain("safety-bypassed");
    });

    it("is flagged when a limit is bridged at all", () => {
      const close = steps.findIndex((step) => step.command.type === "diagnosis.closed");
      const jumper: RecordStep = {
        minute: 30,
        command: command("put-back.opened", { kind: "jumper-fitted", what: "r-w-jumper", device: "limit" }),
      };
      expect(play(call, [...steps.slice(0, close), jumper, ...steps.slice(close)]).rules).toContain(
        "jumper-forbidden",
      );
    });

    it("is flagged when a stop rule stays unanswered", () => {
      const door = steps.findIndex(
        (step) => step.command.type === "door.answered" && step.command.body.question === "people",
      );
      const twin = steps.map((step, index) =>
        index === door
          ? { ...step, command: command("door.answered", { question: "people", unwell: true, alarm: false }) }
          : step,
      );
      expect(play(call, twin).rules).toContain("stop-open");
    });

    it("is flagged when a symptom is concluded as the cause", () => {
      const twin = steps.map((step) =>
        step.command.type === "cause.concluded"
          ? {
              ...step,
              command: command("cause.concluded", { ...step.command.body, cause: "delayed-ignition" }),
            }
          : step,
      );
      expect(play(call, twin).rules).toContain("symptom-is-not-a-cause");
    });

    if (call.outcome === "fixed") {
      it("is flagged when it was lit too few times", () => {
        const twin = steps.map((step) =>
          step.command.type === "proof.recorded" && step.command.body.closing === "close-cycles"
            ? { ...step, command: command("proof.recorded", { ...step.command.body, value: 0 }) }
            : step,
        );
        expect(play(call, twin).rules).toContain("too-few-lights");
      });

      it("is flagged when the room was not read after the burn", () => {
        const twin = withoutBody(
          steps,
          (wanted) => wanted.type === "proof.recorded" && wanted.body.closing === "close-room-co",
        );
        expect(play(call, twin).rules).toContain("proof-missing");
      });
    } else {
      it("is flagged when it is closed as fixed after all", () => {
        const twin = steps.map((step) =>
          step.command.type === "diagnosis.closed"
            ? {
                ...step,
                command: command("diagnosis.closed", {
                  outcome: "fixed",
                  left: { inService: true, gas: "open", power: "on" },
                }),
              }
            : step,
        );
        expect(play(call, twin).rules).toEqual(expect.arrayContaining(["stop-open", "no-repair"]));
      });

      it("is flagged when the root cause of the tripped switch is left out", () => {
        const twin = steps.map((step) =>
          step.command.type === "cause.concluded"
            ? { ...step, command: command("cause.concluded", { ...step.command.body, rootCause: undefined }) }
            : step,
        );
        expect(play(call, twin).rules).toContain("root-cause-missing");
      });
    }
  });
});
