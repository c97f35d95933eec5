import { parseBody } from "../events/index.ts";
import type { BodyOf, EventBody } from "../events/index.ts";
import { initialState } from "./diagnosis-state.ts";
import type { DiagnosisState, PutBack, RecordedEvent, Trace, TreeStep, Watch } from "./diagnosis-state.ts";

/**
 * The fold. `evolve` is total: it never refuses and never throws. What is against the rules is found by
 * `breaches`, what cannot be read becomes an unknown step, and an undo or a correction replays the log
 * without, or with the new body of, the event it names.
 */
export function evolve(state: DiagnosisState, event: RecordedEvent): DiagnosisState {
  const parsed = parseBody(event.type, event.schemaVersion, event.body);
  const trace: Trace = { eventId: event.id, at: event.occurredAt };
  const withLog = { ...state, log: [...state.log, event] };
  if (!parsed.ok || !parsed.known) {
    return { ...withLog, unknownSteps: [...state.unknownSteps, { ...trace, type: event.type }] };
  }
  const { type, body } = parsed.event;
  if (type === "event.undone" || type === "event.corrected") {
    return state.log.some((earlier) => earlier.id === body.of) ? fold(withLog.log) : withLog;
  }
  return apply(withLog, parsed.event, trace);
}

/** The state after a list of events in their order. */
export function fold(events: readonly RecordedEvent[]): DiagnosisState {
  const { undone, corrected, newBodies } = readChanges(events);
  const start: DiagnosisState = { ...initialState, undone, corrected };
  const state = events.reduce<DiagnosisState>((current, event) => {
    if (undone[event.id]) return current;
    const parsed = parseBody(event.type, event.schemaVersion, newBodies.get(event.id) ?? event.body);
    const trace: Trace = { eventId: event.id, at: event.occurredAt };
    if (!parsed.ok || !parsed.known) {
      return { ...current, unknownSteps: [...current.unknownSteps, { ...trace, type: event.type }] };
    }
    return apply(current, parsed.event, trace);
  }, start);
  return { ...state, log: events };
}

/** Which events were taken back or put right. An undo can itself be undone; the last word counts. */
function readChanges(events: readonly RecordedEvent[]) {
  const undone: Record<string, string> = {};
  const corrections: { of: string; by: string; body: unknown }[] = [];
  for (const event of events.toReversed()) {
    if (undone[event.id]) continue;
    const parsed = parseBody(event.type, event.schemaVersion, event.body);
    if (!parsed.ok || !parsed.known) continue;
    if (parsed.event.type === "event.undone") undone[parsed.event.body.of] = event.id;
    if (parsed.event.type === "event.corrected") {
      corrections.unshift({ of: parsed.event.body.of, by: event.id, body: parsed.event.body.body });
    }
  }
  const corrected: Record<string, string[]> = {};
  const newBodies = new Map<string, unknown>();
  for (const { of, by, body } of corrections) {
    const original = events.find((event) => event.id === of);
    // A correction whose body cannot be read changes nothing: the first answer stands.
    if (!original || !parseBody(original.type, original.schemaVersion, body).ok) continue;
    (corrected[of] ??= []).push(by);
    newBodies.set(of, body);
  }
  return { undone, corrected, newBodies };
}

function apply(state: DiagnosisState, event: EventBody, trace: Trace): DiagnosisState {
  switch (event.type) {
    case "diagnosis.opened":
      return { ...state, opened: { ...event.body, ...trace }, profile: event.body.profile };
    case "door.answered":
      return { ...state, door: { ...state.door, [event.body.question]: { ...event.body, ...trace } } };
    case "stop.raised":
      return { ...state, raised: [...state.raised, { ...event.body, ...trace }] };
    case "stop.act-recorded":
      return { ...state, stopActs: [...state.stopActs, { ...event.body, ...trace }] };
    case "unit.confirmed":
      return {
        ...state,
        profile: event.body.profile ?? state.profile,
        confirmed: {
          ...trace,
          complaintRef: event.body.complaintRef,
          changedUnit: event.body.profile !== undefined,
        },
      };
    case "unit-state.set":
      return setUnit(state, event.body);
    case "look.answered":
      return {
        ...state,
        looks: [...state.looks.filter((look) => look.item !== event.body.item), { ...event.body, ...trace }],
      };
    case "watch.started":
      return {
        ...setUnit(state, { power: "on", calling: true }),
        watches: [...state.watches, { ...trace, ...event.body, seen: [] }],
      };
    case "watch.seen":
      return withLastWatch(state, (watch) => ({
        ...watch,
        seen: [...watch.seen, { ...event.body, eventId: trace.eventId }],
      }));
    case "watch.ended":
      return withLastWatch(
        setUnit(state, { calling: event.body.how !== "no-glow" && event.body.how !== "stopped" }),
        (watch) => ({
          ...watch,
          ended: { ...event.body, ...trace },
        }),
      );
    case "watch.skipped":
      return { ...state, watchSkipped: { ...event.body, ...trace } };
    case "check.started":
      return {
        ...state,
        current: { ...trace, check: event.body.check, way: event.body.way, treeNode: event.body.treeNode },
        putBacks: [
          ...state.putBacks,
          ...event.body.opens.map((opening, entry): PutBack => ({
            ...opening,
            ...trace,
            entry,
            check: event.body.check,
          })),
        ],
      };
    case "check.answered":
      return answerCheck(state, event.body, trace);
    case "check.declined":
      return {
        ...withTreeStep(state, "declined", event.body.treeNode, trace),
        current: null,
        declined: [...state.declined, { ...event.body, ...trace }],
      };
    case "tree.step-done":
      return withTreeStep(state, "done", event.body.treeNode, trace);
    case "tree.left":
      return {
        ...withTreeStep(state, "left", event.body.treeNode, trace),
        departures: [...state.departures, { ...event.body, ...trace }],
      };
    case "tree.entered":
      return withTreeStep(state, "entered", event.body.treeNode, trace);
    case "cause.concluded":
      return { ...state, current: null, conclusion: { ...event.body, ...trace } };
    case "repair.recorded":
      return { ...state, repairs: [...state.repairs, { ...event.body, ...trace }] };
    case "put-back.opened":
      return { ...state, putBacks: [...state.putBacks, { ...event.body, ...trace, entry: 0 }] };
    case "put-back.restored":
      return restore(state, event.body, trace);
    case "proof.recorded":
      return { ...state, proofs: { ...state.proofs, [event.body.closing]: { ...event.body, ...trace } } };
    case "diagnosis.closed":
      // The first closing counts; a later one is found by the rules and stays in the log.
      return state.closed ? state : { ...state, closed: { ...event.body, ...trace } };
    case "report.requested":
      return { ...state, report: { ...event.body, ...trace } };
    case "event.undone":
    case "event.corrected":
      return state;
  }
}

function setUnit(state: DiagnosisState, change: BodyOf<"unit-state.set">): DiagnosisState {
  const unit = { ...state.unit, ...change };
  // With the power off nothing calls, whatever the thermostat wants.
  return { ...state, unit: unit.power === "off" ? { ...unit, calling: false } : unit };
}

function withLastWatch(state: DiagnosisState, change: (watch: Watch) => Watch): DiagnosisState {
  const last = state.watches.at(-1);
  return last ? { ...state, watches: [...state.watches.slice(0, -1), change(last)] } : state;
}

function withTreeStep(
  state: DiagnosisState,
  kind: TreeStep["kind"],
  treeNode: string | undefined,
  trace: Trace,
): DiagnosisState {
  return treeNode ? { ...state, treeSteps: [...state.treeSteps, { kind, treeNode, ...trace }] } : state;
}

function answerCheck(state: DiagnosisState, body: BodyOf<"check.answered">, trace: Trace): DiagnosisState {
  const corrected = state.corrected[trace.eventId] !== undefined;
  const observation = { ...body, ...trace, ...(corrected ? { corrected } : {}) };
  const treeNode = body.shown?.treeNode;
  return {
    ...withTreeStep(state, "answered", treeNode, trace),
    current: null,
    observations: [...state.observations, observation],
  };
}

function restore(state: DiagnosisState, body: BodyOf<"put-back.restored">, trace: Trace): DiagnosisState {
  return {
    ...state,
    putBacks: state.putBacks.map((item) =>
      item.eventId === body.of && item.entry === body.entry && !item.restored
        ? { ...item, restored: { ...trace, powerWasOff: body.powerWasOff } }
        : item,
    ),
  };
}
