import { initialTransition, transition } from "xstate";
import type { UnitProfile } from "../profile.ts";
import { createSequence } from "./create-sequence.ts";
import { respondAsHealthyUnit } from "./healthy-unit.ts";
import type { UnitBehaviour, UnitResponse } from "./healthy-unit.ts";
import { readSequence } from "./read-sequence.ts";
import type { SequenceReading } from "./read-sequence.ts";
import type { SequenceEvent, SequenceTimer } from "./sequence-types.ts";

/** An event from outside the unit: line power, the call, a contact, at a second of the run. */
export interface ScriptedEvent {
  atS: number;
  event: SequenceEvent;
}

/** A state that the sequence came into: when, by which event, and what it then does. */
export interface SequenceMoment extends SequenceReading {
  atS: number;
  by: SequenceEvent["type"] | "start";
}

export interface SequenceRun {
  /** What happens to the unit from outside. */
  script: readonly ScriptedEvent[];
  /** Seconds to run for. */
  untilS: number;
  /** How the unit answers its control; without a fault where it is left out. */
  respond?: UnitBehaviour;
}

const MOST_EVENTS = 100_000;

/**
 * Runs a unit's sequence through a stretch of time that is counted, not waited for: its timers, the events of a
 * script and the unit's own answers come in order of their seconds. Returns every change of state, and none
 * where an event changed nothing.
 * @throws where the sequence of this kind of unit is not written, as `createSequence`
 */
export function runSequenceClock(profile: UnitProfile, run: SequenceRun): SequenceMoment[] {
  const { machine, input, timers } = createSequence(profile);
  const respond = run.respond ?? respondAsHealthyUnit;
  const script = run.script.toSorted((a, b) => a.atS - b.atS);
  const answers = new Map<UnitResponse["kind"], ScriptedEvent>();
  let running: { of: string; timer: SequenceTimer; atS: number }[] = [];
  let [snapshot] = initialTransition(machine, input);
  let reading = readSequence(snapshot);
  const moments: SequenceMoment[] = [{ atS: 0, by: "start", ...reading }];

  /** Takes the next event off whichever list has it; on a tie the script first, then the unit, then the timers. */
  function takeNext(): ScriptedEvent | undefined {
    const scripted = script[0];
    const [kind, answer] = [...answers].toSorted((a, b) => a[1].atS - b[1].atS)[0] ?? [];
    const timer = running.toSorted((a, b) => a.atS - b.atS)[0];
    const first = Math.min(scripted?.atS ?? Infinity, answer?.atS ?? Infinity, timer?.atS ?? Infinity);
    if (first > run.untilS) return undefined;
    if (scripted?.atS === first) return script.shift();
    if (kind && answer?.atS === first) {
      answers.delete(kind);
      return answer;
    }
    if (!timer) return undefined;
    timer.atS = Infinity;
    return { atS: first, event: { type: `TIMER.${timer.timer}` } };
  }

  for (let count = 0; count < MOST_EVENTS; count++) {
    const next = takeNext();
    if (!next) break;
    const before = reading;
    [snapshot] = transition(machine, snapshot, next.event);
    reading = readSequence(snapshot);
    running = reading.timers.map(
      ({ of, timer }) =>
        running.find((old) => old.of === of && old.timer === timer) ?? {
          of,
          timer,
          atS: next.atS + timers[timer],
        },
    );
    for (const { kind, afterS, event } of respond(reading.outputs, before.outputs)) {
      // A flame that went out, or never came, can no longer be proved.
      if (kind === "flame") answers.delete("flame-proof");
      answers.set(kind, { atS: next.atS + afterS, event });
    }
    if (reading.state !== before.state || reading.blower !== before.blower) {
      moments.push({ atS: next.atS, by: next.event.type, ...reading });
    }
  }
  return moments;
}
