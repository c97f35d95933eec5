import { initialTransition, transition } from "xstate";
import type { AnyStateNode, StateValue } from "xstate";
import { SEQUENCE_TIMERS, createSequence, readSequence } from "@emberladder/furnace";
import type { SequenceEvent, SequenceSnapshot, UnitProfile } from "@emberladder/furnace";

/** Every event that a control can see. */
export const EVERY_EVENT: SequenceEvent[] = [
  ...(["LINE.on", "LINE.off", "CALL.on", "CALL.off", "CALL.high", "CALL.low"] as const).map((type) => ({
    type,
  })),
  ...(["LIMIT.open", "LIMIT.closed", "DRAFT.open", "DRAFT.closed"] as const).map((type) => ({ type })),
  ...(["HIGH_DRAFT.open", "HIGH_DRAFT.closed"] as const).map((type) => ({ type })),
  ...(["FLAME.lit", "FLAME.proved", "FLAME.lost"] as const).map((type) => ({ type })),
  ...SEQUENCE_TIMERS.map((timer) => ({ type: `TIMER.${timer}` as const })),
];

/** One situation of the control and one event that can lead to it. */
export interface WalkedSituation {
  snapshot: SequenceSnapshot;
  state: string;
  from: number | null;
  by: SequenceEvent | null;
}

export interface Walk {
  situations: WalkedSituation[];
  /** Leaf and parent states that were come into. */
  states: Set<string>;
  /** Transitions that were taken, as `allTransitions` names them. */
  transitions: Set<string>;
  steps: number;
}

/** Names one transition: where it starts, its event, which of its branches. */
function nameTransition(node: AnyStateNode, event: string, branch: number): string {
  return `${node.path.join(".") || "(any state)"} --${event || "(at once)"}--> branch ${branch + 1}`;
}

/** Every state of a machine. */
export function allStates(root: AnyStateNode): string[] {
  return [root, ...Object.values(root.states).flatMap((child) => [...walkNodes(child)])].map(
    (node) => node.id,
  );
}

function* walkNodes(node: AnyStateNode): Generator<AnyStateNode> {
  yield node;
  for (const child of Object.values(node.states)) yield* walkNodes(child as AnyStateNode);
}

/** The states that hold, parents included. */
function* activeNodes(node: AnyStateNode, value: StateValue): Generator<AnyStateNode> {
  yield node;
  const inner = typeof value === "string" ? { [value]: undefined } : value;
  for (const [key, below] of Object.entries(inner)) {
    const child = node.states[key] as AnyStateNode;
    if (below === undefined) yield child;
    else yield* activeNodes(child, below);
  }
}

/** Every transition of a machine, each branch of a guarded one for itself. */
export function allTransitions(root: AnyStateNode): string[] {
  return [...walkNodes(root)].flatMap((node) => [
    ...[...node.transitions].flatMap(([event, branches]) =>
      branches.map((_, branch) => nameTransition(node, event, branch)),
    ),
    ...(node.always ?? []).map((_, branch) => nameTransition(node, "", branch)),
  ]);
}

/**
 * Walks every situation a control can come into, breadth first: each event is sent in each. Tries and re-lights
 * are limited to two and one, which is enough to take both sides of every count.
 */
export function walkMachine(profile: UnitProfile): Walk {
  const limited = { ...profile, timings: { ...profile.timings, tries: 2, recycles: 1 } };
  const { machine, input } = createSequence(limited);
  const [first] = initialTransition(machine, input);
  const situations: WalkedSituation[] = [];
  const known = new Set<string>();
  const walk: Walk = { situations, states: new Set(), transitions: new Set(), steps: 0 };

  const add = (snapshot: SequenceSnapshot, from: number | null, by: SequenceEvent | null) => {
    const key = JSON.stringify([snapshot.value, snapshot.context]);
    if (known.has(key)) return;
    known.add(key);
    for (const node of activeNodes(machine.root, snapshot.value)) walk.states.add(node.id);
    situations.push({ snapshot, state: readSequence(snapshot).state, from, by });
  };
  add(first, null, null);
  for (let at = 0; at < situations.length; at++) {
    const { snapshot } = situations[at] as WalkedSituation;
    for (const event of EVERY_EVENT) {
      walk.steps++;
      const taken = machine.getTransitionData(snapshot, event);
      for (const definition of taken) {
        const branches = definition.source.transitions.get(event.type) ?? [];
        walk.transitions.add(nameTransition(definition.source, event.type, branches.indexOf(definition)));
      }
      const [next] = transition(machine, snapshot, event);
      const active = new Set(activeNodes(machine.root, next.value));
      // `always` branches are taken inside the step; the state they start from is the one that was targeted.
      for (const definition of taken) {
        for (const target of definition.target ?? []) {
          target.always?.forEach((branch, index) => {
            const left = (branch.target ?? []).some((node) => active.has(node));
            if (left) walk.transitions.add(nameTransition(target, "", index));
          });
        }
      }
      add(next, at, event);
    }
  }
  return walk;
}
