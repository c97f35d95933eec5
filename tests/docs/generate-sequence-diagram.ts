import type { AnyStateNode } from "xstate";
import {
  DEFAULT_TIMINGS,
  DRAFT_REST_S,
  DRAFT_WAIT_S,
  SEQUENCE_TIMERS,
  directIgnitionMachine,
  timerSeconds,
  unitProfileSchema,
} from "@emberladder/furnace";
import type { SequenceMeta, SequenceTimer, TimingName } from "@emberladder/furnace";
import { GENERATED_FOOT, GENERATED_HEAD, table } from "./markdown.ts";

const USUAL_UNIT = unitProfileSchema.parse({
  codes: { ignition: "HSI", draft: "IDP", staging: "2S", location: "IND", control: "IFC", fuel: "NG" },
});

/** What each state is, for a reader who has not seen the machine. */
const STATE_WORDS: Record<string, string> = {
  dead: "No line power at the unit.",
  idle: "Power, and no call for heat.",
  falseFlame: "A flame is sensed with the gas shut. Nothing starts until it is gone.",
  called: "The thermostat calls; the control makes sure of it.",
  limitOpen: "A limit or rollout is open.",
  checkingOpen: "The pressure switch has to be open before the inducer starts.",
  stuckClosed: "It is closed: the inducer stays off.",
  starting: "The inducer has been given its volts.",
  inducer: "The inducer runs; the pressure switch has not closed.",
  draftPause: "It did not close in time. A rest before the next try.",
  prepurge: "Draft is proved; the exchanger is aired.",
  warmUp: "The igniter heats up.",
  trial: "Trial for ignition: gas on a glowing igniter.",
  "trial.gas": "Gas flows; no flame yet.",
  "trial.lightoff": "A flame, not yet accepted.",
  interpurge: "Between tries: aired again.",
  burning: "Flame proved. Heat and rate go on side by side.",
  "burning.heat": "The climb from flame to steady heat.",
  "burning.heat.flameProved": "The igniter is off; the flame crosses over.",
  "burning.heat.mainBurner": "All burners lit; the exchanger warms.",
  "burning.heat.blowerOn": "The circulating blower has started.",
  "burning.heat.steady": "Steady heat.",
  "burning.rate": "How high the fire is.",
  "burning.rate.low": "Low fire; the only fire of a one-stage unit.",
  "burning.rate.raising": "The inducer is on high; the gas waits for the high switch.",
  "burning.rate.high": "High fire.",
  postPurge: "The call is over: gas shut, exchanger aired.",
  softLockout: "Tries used up on natural gas: a wait, then a fresh start.",
  hardLockout: "Locked out until the call is taken away or power is cut.",
};

const TIMING_OF_TIMER: Partial<Record<SequenceTimer, TimingName>> = {
  prepurge: "prepurgeS",
  warmUp: "warmUpS",
  trial: "trialS",
  blowerOn: "blowerOnDelayS",
  blowerOff: "blowerOffDelayS",
  postPurge: "postPurgeS",
  interpurge: "interpurgeS",
  softLockout: "softLockoutS",
  stageTwo: "stageTwoDelayS",
};

/** Where the seconds that no label states come from. */
const PROVENANCE: Partial<Record<SequenceTimer, string>> = {
  trial: "common practice; gas has to light within 4 s: ANSI Z21.47, from memory",
  softLockout: "common practice: 1 to 3 hours",
  limitLockout: "common practice: some boards lock out after 2 to 3 minutes",
  steady: "common practice: 10 minutes",
  debounce: "common practice: 1 to 3 s",
  startCheck: "judgement",
  spinUp: "judgement",
  crossover: "judgement; at most 4 s: ANSI Z21.47, from memory",
};

function childrenOf(node: AnyStateNode): AnyStateNode[] {
  return Object.values(node.states) as AnyStateNode[];
}

function nodesBelow(node: AnyStateNode): AnyStateNode[] {
  return childrenOf(node).flatMap((child) => [child, ...nodesBelow(child)]);
}

function pathOf(node: AnyStateNode): string {
  return node.path.join(".");
}

// Mermaid takes no dots in the names of states.
function mermaidId(node: AnyStateNode): string {
  return node.path.join("_");
}

/** Lines of a composite state: its own diagram inside, regions that hold at once parted by `--`. */
function drawState(node: AnyStateNode, indent: string): string[] {
  const children = childrenOf(node);
  if (children.length === 0) return [`${indent}${mermaidId(node)} : ${node.key}`];
  const inner = children.flatMap((child, index) => [
    ...(node.type === "parallel" && index > 0 ? [`${indent}  --`] : []),
    ...drawState(child, `${indent}  `),
  ]);
  const start =
    node.type === "parallel"
      ? []
      : [`${indent}  [*] --> ${mermaidId(node.initial.target[0] as AnyStateNode)}`];
  return [`${indent}state "${node.key}" as ${mermaidId(node)} {`, ...start, ...inner, `${indent}}`];
}

/** Arrows from a state, one for each target with all its events. */
function drawArrows(node: AnyStateNode): string[] {
  const labels = new Map<string, string[]>();
  const all = [...[...node.transitions.values()].flat(), ...(node.always ?? [])];
  for (const { eventType, guard, target } of all) {
    for (const to of target ?? []) {
      const name = eventType || "at once";
      const label = typeof guard === "string" ? `${name} [${guard}]` : name;
      labels.set(mermaidId(to), [...(labels.get(mermaidId(to)) ?? []), label]);
    }
  }
  return [...labels].map(([to, names]) => `  ${mermaidId(node)} --> ${to} : ${names.join(", ")}`);
}

/** What the control's actions do, in words. */
const ACTION_WORDS: Record<string, string> = {
  powerLost: "counts and timers are forgotten; everything is off",
  callOn: "there is a call",
  callOff: "there is no call; tries and re-lights count from nothing",
  highCallOn: "high fire is asked for",
  highCallOff: "low fire is enough",
  limitOpens: "the limit is open",
  limitCloses: "the limit is closed",
  draftOpens: "the pressure switch is open",
  draftCloses: "the pressure switch is closed",
  flameSeen: "a flame is sensed",
  flameGone: "no flame is sensed",
  blowerStops: "the circulating blower stops, if it was running on",
};

function energised({ outputs }: SequenceMeta): string {
  if (Object.keys(outputs).length === 0) return "";
  const parts = [
    outputs.inducer && outputs.inducer !== "off" ? `inducer ${outputs.inducer}` : "",
    outputs.igniter ? "igniter" : "",
    outputs.gas && outputs.gas !== "off" ? `gas ${outputs.gas}` : "",
  ].filter(Boolean);
  return parts.join(", ") || "nothing";
}

/** Entry and exit actions are what the circulating blower does. */
function blowerOf(node: AnyStateNode): string {
  const on = node.entry.some((action) => action === "blowerStarts") ? "starts" : "";
  const off = node.exit.some((action) => action === "blowerRunsOn") ? "runs on after it" : "";
  return [on, off].filter(Boolean).join(", ");
}

function timerRows(): (string | number)[][] {
  const seconds = timerSeconds(USUAL_UNIT);
  return SEQUENCE_TIMERS.map((timer) => {
    const timing = TIMING_OF_TIMER[timer];
    const span = timing
      ? DEFAULT_TIMINGS[timing]
      : { draftWait: DRAFT_WAIT_S, draftPause: DRAFT_REST_S }[timer as string];
    return [
      timer,
      seconds[timer],
      span ? `${span.least} to ${span.most}` : "",
      `${timing ? "the unit's label, else " : ""}${PROVENANCE[timer] ?? "common practice"}`,
    ];
  });
}

/** The ignition sequence as a page: a diagram drawn from the machine, its states, its timers. */
export function makeSequenceDocument(): string {
  const { root } = directIgnitionMachine;
  const nodes = nodesBelow(root);
  const diagram = [
    "stateDiagram-v2",
    `  [*] --> ${mermaidId(root.initial.target[0] as AnyStateNode)}`,
    ...childrenOf(root).flatMap((child) => drawState(child, "  ")),
    ...nodes.flatMap(drawArrows),
  ];
  const stateRows = nodes
    .filter((node) => node.meta !== undefined || childrenOf(node).length > 0)
    .map((node) => {
      const meta = (node.meta as SequenceMeta | undefined) ?? { outputs: {} };
      return [
        `\`${pathOf(node)}\``,
        STATE_WORDS[pathOf(node)],
        meta.completed ?? "",
        node.meta === undefined ? "" : energised(meta),
        blowerOf(node),
        meta.timer ?? "",
      ];
    });
  const everywhere = [...root.transitions.values()]
    .flat()
    .map(({ eventType, target, actions }) => [
      `\`${eventType}\``,
      (target ?? []).map((node) => `goes to \`${node.path.join(".")}\``).join("") || "stays",
      actions.map((action) => (typeof action === "string" ? ACTION_WORDS[action] : "")).join(", "),
    ]);
  return (
    GENERATED_HEAD +
    "# Ignition sequence: direct hot surface, induced draft, integrated board\n\n" +
    "One or two stages, natural gas or propane. Order and behaviour are common practice; safe start and lockout follow\n" +
    "ANSI Z21.20, from memory. The unit's own label and diagram outrank every figure here.\n\n" +
    "```mermaid\n" +
    diagram.join("\n") +
    "\n```\n\n## In every state\n\nA state's own answer to an event comes before these.\n\n" +
    table(["event", "state", "what the control keeps in mind"], everywhere) +
    "\n## States\n\n`completed` is the last rung of the ladder that is behind the unit on coming into the state. Where several\nstates hold at once, the highest stage and the highest rate count.\n\n" +
    table(["state", "what it is", "completed", "energised", "circulating blower", "timer"], stateRows) +
    "\n## Timers\n\n" +
    table(["timer", "seconds", "range met", "where from"], timerRows()) +
    GENERATED_FOOT
  );
}
