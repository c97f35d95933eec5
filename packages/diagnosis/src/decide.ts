import { parseBody } from "./events/index.ts";
import type { BodyOf, EventBody, EventType } from "./events/index.ts";
import { BODY_SCHEMA_VERSION } from "./events/index.ts";
import { breaches } from "./rules/breaches.ts";
import type { Breach } from "./rules/breach.ts";
import type { DiagnosisState } from "./state/diagnosis-state.ts";
import { evolve } from "./state/evolve.ts";

/** What a person wants to record: an event that has not been judged yet. */
export type Command = EventBody;

/** Why a command was not taken. Nothing was recorded; the words are found by the rule's id. */
export interface Refusal {
  breaches: Breach[];
}

export type Decision = { ok: true; events: EventBody[] } | { ok: false; refusal: Refusal };

/**
 * Applies the rules of the trade at the moment of acting. Several commands are one step: all are taken or
 * none, and each is judged on the state that the ones before it make.
 */
export function decide(
  state: DiagnosisState,
  commands: readonly Command[],
  context: { now: number },
): Decision {
  const events: EventBody[] = [];
  let current = state;
  for (const [index, wanted] of commands.entries()) {
    const parsed = parseBody(wanted.type, BODY_SCHEMA_VERSION, wanted.body);
    if (!parsed.ok) {
      const field = parsed.issues[0]?.path ?? "";
      return { ok: false, refusal: { breaches: [{ rule: "unreadable", params: { field } }] } };
    }
    const found = breaches(current, wanted, context);
    if (found.length > 0) return { ok: false, refusal: { breaches: found } };
    events.push(wanted);
    current = evolve(current, {
      id: `step-${current.log.length}-${index}`,
      type: wanted.type,
      schemaVersion: BODY_SCHEMA_VERSION,
      body: wanted.body,
      occurredAt: context.now,
      deviceId: "",
      deviceSeq: 0,
    });
  }
  return { ok: true, events };
}

/** A command with its type checked against its body; shortens call sites. */
export function command<T extends EventType>(type: T, body: BodyOf<T>): Command {
  return { type, body } as Command;
}
