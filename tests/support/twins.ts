import type { RecordStep, ReferenceCall } from "@emberladder/db/seed";
import { command } from "@emberladder/diagnosis";
import type { BodyOf, Command, EventType } from "@emberladder/diagnosis";

/** A reference call with one thing wrong: what it is, on which calls it can be, and the rule that has to say so. */
export interface Twin {
  /** Ends "is flagged when ...". */
  when: string;
  rule: string;
  fits: (call: ReferenceCall) => boolean;
  /** The phone lets it pass, because nothing may hold up leaving a unit off; the server flags it. */
  isServersOnly?: boolean;
  make: (steps: readonly RecordStep[]) => RecordStep[];
}

const everyCall = () => true;
const onlyFixed = (call: ReferenceCall) => call.outcome === "fixed";
const onlyShutOff = (call: ReferenceCall) => call.outcome === "shut-off";

/** Checks of which one decides the cause in each reference call of the family. */
const DECISIVE = new Set([
  "ck-flame-current",
  "ck-filter",
  "ck-temp-rise",
  "ck-limit-voltage",
  "ck-rollout",
  "ck-heat-exchanger",
  "ck-vent-inspect",
  "ck-flame-appearance",
]);

/** Steps left out. Each keeps its place as a step nobody knows, so that the ids of the others stay. */
export function leaveOut(steps: readonly RecordStep[], drop: (wanted: Command) => boolean): RecordStep[] {
  return steps.map((step) =>
    drop(step.command) ? { ...step, command: { type: "nothing.happened", body: {} } as never } : step,
  );
}

/** Steps with the commands of one type made differently. */
function change<T extends EventType>(
  steps: readonly RecordStep[],
  type: T,
  how: (body: BodyOf<T>) => Command | undefined,
): RecordStep[] {
  return steps.map((step) => {
    if (step.command.type !== type) return step;
    const other = how(step.command.body as BodyOf<T>);
    return other ? { ...step, command: other } : step;
  });
}

/** Steps with others put in right before the closing, where no later step names one by its id. */
function insertBeforeClose(steps: readonly RecordStep[], commands: readonly Command[]): RecordStep[] {
  const close = steps.findIndex((step) => step.command.type === "diagnosis.closed");
  const minute = steps[close]?.minute ?? 0;
  return [
    ...steps.slice(0, close),
    ...commands.map((one) => ({ minute, command: one })),
    ...steps.slice(close),
  ];
}

/** The events that the conclusion rests on: their ids and what was recorded. */
function evidenceOf(steps: readonly RecordStep[], eventId: (index: number) => string) {
  const named = steps.flatMap(({ command: one }) =>
    one.type === "cause.concluded" ? one.body.evidence : [],
  );
  return steps.flatMap((step, index) =>
    named.includes(eventId(index)) ? [{ id: eventId(index), command: step.command }] : [],
  );
}

/** An answer put right afterwards, so that it says that all was well. */
function correctToGood(of: string, wrong: Command): Command[] {
  if (wrong.type === "check.answered") {
    const { check, stage, power } = wrong.body;
    const body = { check, stage, power, outcome: "good" };
    return [command("event.corrected", { of, body, reason: "read-wrong" })];
  }
  if (wrong.type !== "look.answered") return [];
  return [
    command("event.corrected", {
      of,
      body: { item: wrong.body.item, answer: "right" },
      reason: "read-wrong",
    }),
  ];
}

/**
 * The twins of a reference call.
 * @param eventId the id of the n-th event, as the steps were made with
 */
export function twinsOf(call: ReferenceCall, eventId: (index: number) => string): Twin[] {
  const all: Twin[] = [
    {
      when: "the decisive readings are left out",
      rule: "decisive-reading-missing",
      fits: everyCall,
      make: (steps) =>
        leaveOut(
          steps,
          (wanted) =>
            (wanted.type === "check.answered" || wanted.type === "look.answered") &&
            DECISIVE.has(wanted.body.check ?? ""),
        ),
    },
    {
      when: "the decisive readings are taken back before the closing",
      rule: "decisive-reading-missing",
      fits: everyCall,
      isServersOnly: call.outcome === "shut-off",
      make: (steps) =>
        insertBeforeClose(
          steps,
          evidenceOf(steps, eventId).map(({ id }) => command("event.undone", { of: id })),
        ),
    },
    {
      when: "the decisive readings are corrected to good ones before the closing",
      rule: "decisive-reading-missing",
      fits: everyCall,
      isServersOnly: call.outcome === "shut-off",
      make: (steps) =>
        insertBeforeClose(
          steps,
          evidenceOf(steps, eventId).flatMap(({ id, command: wrong }) => correctToGood(id, wrong)),
        ),
    },
    {
      when: "one put-back stays open",
      rule: "put-back-open",
      fits: onlyFixed,
      make: (steps) => {
        const last = steps.findLastIndex((step) => step.command.type === "put-back.restored");
        return steps.filter((_, index) => index !== last);
      },
    },
    {
      when: "a jumper is left on",
      rule: "safety-bypassed",
      fits: onlyFixed,
      make: (steps) =>
        insertBeforeClose(steps, [
          command("put-back.opened", {
            kind: "jumper-fitted",
            what: "r-w-jumper",
            device: "thermostat",
            limitS: 60,
          }),
        ]),
    },
    {
      when: "a limit is bridged at all",
      rule: "jumper-forbidden",
      fits: everyCall,
      make: (steps) =>
        insertBeforeClose(steps, [
          command("put-back.opened", { kind: "jumper-fitted", what: "r-w-jumper", device: "limit" }),
        ]),
    },
    {
      when: "a stop rule stays unanswered",
      rule: "stop-open",
      fits: everyCall,
      make: (steps) =>
        change(steps, "door.answered", ({ question }) =>
          question === "people"
            ? command("door.answered", { question, unwell: true, alarm: false })
            : undefined,
        ),
    },
    {
      when: "a symptom is concluded as the cause",
      rule: "symptom-is-not-a-cause",
      fits: everyCall,
      make: (steps) =>
        change(steps, "cause.concluded", (body) =>
          command("cause.concluded", { ...body, cause: "delayed-ignition" }),
        ),
    },
    {
      when: "it was lit too few times",
      rule: "too-few-lights",
      fits: onlyFixed,
      make: (steps) =>
        change(steps, "proof.recorded", (body) =>
          body.closing === "close-cycles" ? command("proof.recorded", { ...body, value: 0 }) : undefined,
        ),
    },
    {
      when: "the room was not read after the burn",
      rule: "proof-missing",
      fits: onlyFixed,
      make: (steps) =>
        leaveOut(
          steps,
          (wanted) => wanted.type === "proof.recorded" && wanted.body.closing === "close-room-co",
        ),
    },
    {
      when: "it is closed as fixed after all",
      rule: "no-repair",
      fits: onlyShutOff,
      make: (steps) =>
        change(steps, "diagnosis.closed", () =>
          command("diagnosis.closed", {
            outcome: "fixed",
            left: { inService: true, gas: "open", power: "on" },
          }),
        ),
    },
    {
      when: "the root cause of the tripped switch is left out",
      rule: "root-cause-missing",
      fits: onlyShutOff,
      make: (steps) =>
        change(steps, "cause.concluded", (body) =>
          command("cause.concluded", { ...body, rootCause: undefined }),
        ),
    },
  ];
  return all.filter(({ fits }) => fits(call));
}
