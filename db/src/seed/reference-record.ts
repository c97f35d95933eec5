import {
  command,
  evolve,
  initialState,
  needsPowerOff,
  openPutBacks,
  openStops,
  proofOf,
} from "@emberladder/diagnosis";
import type { Command, DiagnosisState, VisitOutcome } from "@emberladder/diagnosis";
import {
  CATALOGUE_VERSION,
  getFault,
  getRepair,
  isFaultId,
  MODEL_VERSION,
  TOUCH_ROWS,
} from "@emberladder/furnace";
import type { StopAct, TouchRow } from "@emberladder/furnace";
import { profileOf } from "./reference-call.ts";
import type { ReferenceCall, ReferenceObservation, ReferenceWatch } from "./reference-call.ts";

/** One step of a record made from a reference call: what was recorded, when, and its free text. */
export interface RecordStep {
  /** Minutes after arrival. */
  minute: number;
  command: Command;
  /** Text of the note that the command's `noteRef` stands for. */
  text?: string;
}

/** What a record has to be given from outside: ids, the tree it pins, and how a note is named. */
export interface RecordFrame {
  callId: string;
  unitId: string;
  tree: { id: string; version: number; hash: string } | null;
  /** Makes the reference of a free text. */
  noteRef: (text: string) => string;
  /** Makes the id of the n-th event, so that later events can name earlier ones. */
  eventId: (index: number) => string;
}

const LOOK_ITEMS: Record<string, string> = {
  Thermostat: "thermostat",
  "Switch and breaker": "switch-breaker",
  Door: "door",
  Filter: "filter",
  Shutoff: "shutoff",
  "Status light": "status-light",
  Water: "water",
};

const SIGHTS: Record<string, string> = {
  inducer: "inducer",
  "ignition-source": "glow",
  lightoff: "flame",
  "main-burner": "flame-stays",
  "blower-on": "blower",
};

const WHAT: Record<string, string> = {
  "cover-removed": "burner-door",
  "part-removed": "burner-tray",
  "gas-port-opened": "manifold-tap",
  "gas-joint-opened": "valve-inlet-joint",
  "tube-pulled": "pressure-switch-hose",
  "lead-lifted": "flame-sensor-wire",
  "meter-in-series": "flame-sensor-wire",
  "valve-closed": "unit-gas-valve",
  "jumper-fitted": "r-w-jumper",
};

/**
 * The steps of a diagnosis that records a reference call, in order, made by the same rules as on a phone: stop
 * rules get their acts, what was opened gets back, and the proof is what the visit's own list asks for.
 * Nothing in a reference call was measured; the record is demo data.
 */
export function recordOf(call: ReferenceCall, frame: RecordFrame): RecordStep[] {
  const steps: RecordStep[] = [];
  let state: DiagnosisState = initialState;
  const start = Date.parse(`${call.job.date}T${call.job.arrived}:00-07:00`);
  const idOf = new Map<ReferenceObservation, string>();

  const add = (minute: number, wanted: Command, text?: string): string => {
    const id = frame.eventId(steps.length);
    steps.push({ minute, command: wanted, ...(text ? { text } : {}) });
    state = evolve(state, {
      id,
      type: wanted.type,
      schemaVersion: 1,
      body: wanted.body,
      occurredAt: start + minute * 60_000,
      deviceId: "",
      deviceSeq: steps.length,
    });
    return id;
  };
  const settleStops = (minute: number) => {
    for (const stop of openStops(state)) {
      for (const act of stop.acts)
        if (!act.done && isDueNow(act, call))
          add(
            minute,
            actCommand(stop.rule, act, call, frame),
            act.kind === "text" ? stopText(call, stop.rule) : undefined,
          );
    }
  };

  add(
    0,
    command("diagnosis.opened", {
      callId: frame.callId,
      unitId: frame.unitId,
      profile: profileOf(call),
      tree: frame.tree,
      catalogueVersion: CATALOGUE_VERSION,
      modelVersion: MODEL_VERSION,
    }),
  );
  const gate = call.arrivalGate;
  const valueOf = (check: string) => gate.answers.find((answer) => answer.check === check)?.value;
  add(
    gate.minute,
    command("door.answered", {
      question: "people",
      unwell: false,
      alarm: false,
      coPpm: valueOf("ck-co-ambient") ?? 0,
    }),
  );
  add(
    gate.minute,
    command("door.answered", { question: "smell", smell: false, lelPct: valueOf("ck-gas-detector") ?? 0 }),
  );
  add(gate.minute, command("door.answered", { question: "way-in", safe: true }));
  settleStops(gate.minute);
  add(gate.minute, command("unit.confirmed", {}));
  if (gate.stopRules.includes("SOOT")) add(gate.minute, command("unit-state.set", { gas: "shut" }));
  add(
    gate.minute,
    command("door.answered", {
      question: "at-unit",
      found: gate.stopRules.includes("SOOT") ? ["soot"] : [],
      cabinetV: valueOf("ck-cabinet-earth") ?? 0,
    }),
  );
  settleStops(gate.minute);
  addLooks();
  const work = [
    ...(call.watch ?? []).map((watch) => ({ minute: watch.minute, run: () => addWatch(watch) })),
    ...call.observations
      .filter((one) => !idOf.has(one))
      .map((one) => ({ minute: one.minute, run: () => addObservation(one, false) })),
    ...call.putBack.map((item) => ({
      minute: item.openedMinute,
      run: () =>
        void add(
          item.openedMinute,
          command("put-back.opened", {
            kind: item.kind as never,
            what: WHAT[item.kind] ?? "burner-door",
            ...(item.leakCheck ? { side: item.leakCheck } : {}),
          }),
        ),
    })),
  ].toSorted((a, b) => a.minute - b.minute);
  for (const step of work) step.run();
  addConclusion();
  addRepair();
  for (const item of openPutBacks(state)) {
    if (needsPowerOff(item)) add(lastMinute(), command("unit-state.set", { power: "off" }));
    add(
      lastMinute(),
      command("put-back.restored", {
        of: item.eventId,
        entry: item.entry,
        ...(needsPowerOff(item) ? { powerWasOff: true } : {}),
      }),
    );
  }
  for (const one of call.afterRepair) addObservation(one, true);
  addProof();
  addClose();
  return steps;

  function lastMinute(): number {
    return steps.at(-1)?.minute ?? 0;
  }

  function addLooks() {
    const { minute, items, hit } = call.firstLook;
    for (const item of items) {
      const id = LOOK_ITEMS[item.item];
      if (!id) continue;
      const seen = call.observations.find((one) => one.check === item.check && one.finding !== undefined);
      const settles =
        seen !== undefined &&
        hit !== null &&
        isFaultId(hit) &&
        getFault(hit).decisive.some(({ check }) => check === seen.check);
      const answer = seen ? (settles ? "hit" : "note") : "right";
      const eventId = add(
        minute,
        command("look.answered", {
          item: id,
          answer,
          ...(seen ? { check: seen.check, finding: seen.finding, outcome: seen.outcome } : {}),
        }),
      );
      if (seen) idOf.set(seen, eventId);
    }
  }

  function addWatch(watch: ReferenceWatch) {
    add(
      watch.minute,
      command("watch.started", {
        resetsBefore: watch.resetsBefore,
        ...(watch.before ? { before: watch.before } : {}),
      }),
    );
    for (const rung of watch.rungs) {
      const sight = SIGHTS[rung.stage];
      if (rung.state === "proven" && sight && rung.seconds !== null)
        add(watch.minute, command("watch.seen", { sight, atS: rung.seconds }));
    }
    const stopped = watch.rungs.find((rung) => rung.state === "stopped");
    add(
      watch.minute + 1,
      command("watch.ended", {
        how: howEnded(watch),
        atS: stopped?.seconds ?? 60,
        tries: watch.tries,
        ...(watch.blowerWithInducer === undefined ? {} : { blowerWithInducer: watch.blowerWithInducer }),
      }),
    );
  }

  function addObservation(one: ReferenceObservation, afterRepair: boolean) {
    const power = one.power === "OFF" ? ("off" as const) : ("on" as const);
    if (
      one.power !== "any" &&
      (state.unit.power !== power || state.unit.calling !== (one.power === "ON-call"))
    ) {
      add(one.minute, command("unit-state.set", { power, calling: one.power === "ON-call" }));
    }
    const { minute, note, check, ...rest } = one;
    const body = {
      check,
      stage: one.stage,
      power: one.power,
      outcome: rest.outcome,
      finding: rest.finding,
      value: rest.value,
      unit: rest.unit,
      inV: rest.inV,
      outV: rest.outV,
    };
    const given = Object.fromEntries(
      Object.entries(body).filter(([, value]) => value !== undefined),
    ) as typeof body;
    const id = add(
      minute,
      command("check.answered", {
        ...given,
        ...(note ? { noteRef: frame.noteRef(note) } : {}),
        ...(afterRepair ? { afterRepair } : {}),
        shown: { check, unitState: state.unit, versions: { catalogue: CATALOGUE_VERSION } },
      }),
      note,
    );
    idOf.set(one, id);
    settleStops(minute);
  }

  function addConclusion() {
    const { cause, also, evidence, said, proven = true, openQuestion, rootCause } = call.conclusion;
    const ids = evidence.flatMap((index) => idOf.get(call.observations[index] as ReferenceObservation) ?? []);
    add(
      lastMinute(),
      command("cause.concluded", {
        cause,
        ...(also ? { also } : {}),
        evidence: ids,
        proven,
        ...(rootCause
          ? { rootCause: { fault: rootCause.fault, noteRef: frame.noteRef(rootCause.why) } }
          : {}),
        ...(proven ? {} : { openQuestionRef: frame.noteRef(openQuestion ?? said) }),
      }),
      proven ? rootCause?.why : (openQuestion ?? said),
    );
  }

  function addRepair() {
    const { cause } = call.conclusion;
    if (call.outcome !== "fixed" || !isFaultId(cause)) return;
    const [usual] = getFault(cause).repairs;
    if (!usual) return;
    const touched = call.touched.filter((row): row is TouchRow =>
      (TOUCH_ROWS as readonly string[]).includes(row),
    );
    add(
      lastMinute() + call.repair.minutes,
      command("repair.recorded", {
        done: [usual],
        parts: getRepair(usual).parts.map((part) => ({ part, quantity: 1, state: "fitted" as const })),
        touched,
      }),
    );
  }

  function addProof() {
    const asked = proofOf(state, call.outcome, start).map((item) => item.id as string);
    if (call.outcome === "fixed")
      add(lastMinute(), command("unit-state.set", { power: "on", calling: true }));
    for (const proof of call.lightOffProof) {
      if (
        !proof.applies ||
        !asked.includes(proof.id) ||
        proof.id === "close-jumpers" ||
        proof.id === "close-docs"
      )
        continue;
      add(
        proof.minute ?? lastMinute(),
        command("proof.recorded", {
          closing: proof.id,
          ...(proof.value === undefined
            ? { seenRight: proof.pass ?? true }
            : { value: proof.value, unit: proof.unit }),
          ...(proof.also ? { also: proof.also } : {}),
        }),
      );
    }
  }

  function addClose() {
    const outcome: VisitOutcome = call.outcome;
    const left =
      outcome === "shut-off"
        ? { inService: false, gas: "shut-tagged" as const, power: "off-locked" as const, told: true }
        : call.leftState.inService
          ? { inService: true, gas: "open" as const, power: "on" as const }
          : { inService: false, gas: "shut" as const, power: "off" as const, told: true };
    add(lastMinute() + 1, command("diagnosis.closed", { outcome, left }));
    add(lastMinute(), command("report.requested", { to: "customer" }));
  }
}

function howEnded(watch: ReferenceWatch) {
  if (watch.lastStage === "satisfied") return "satisfied";
  if (watch.blowerWithInducer) return "stopped";
  if (watch.lastStage === "prepurge") return "no-glow";
  if (watch.lastStage === "ignition-source" || watch.lastStage === "gas") return "no-flame";
  if (watch.lastStage === "blower-on" || watch.lastStage === "steady") return "limit-cut";
  if (
    watch.lastStage === "lightoff" ||
    watch.lastStage === "flame-proved" ||
    watch.lastStage === "main-burner"
  )
    return "flame-lost";
  return watch.lastStage === "inducer" ? "stopped" : "nothing";
}

/** Acts a reference call records: those due whatever happens, and those for going on where the visit was fixed. */
function isDueNow(act: StopAct, call: ReferenceCall): boolean {
  if (act.due === "closing") return true;
  if (act.check !== undefined && act.kind !== "reading") return false;
  return act.due === "all" || call.outcome === "fixed";
}

function actCommand(rule: string, act: StopAct, call: ReferenceCall, frame: RecordFrame): Command {
  const value =
    act.kind === "reading"
      ? act.pass?.above !== undefined
        ? act.pass.above + 1
        : 0
      : act.kind === "timer"
        ? act.seconds
        : undefined;
  return command("stop.act-recorded", {
    rule,
    act: act.id,
    ...(value === undefined ? {} : { value }),
    ...(act.kind === "text" ? { noteRef: frame.noteRef(stopText(call, rule)) } : {}),
  });
}

function stopText(call: ReferenceCall, rule: string): string {
  const code = rule.toUpperCase();
  return call.stops.find((stop) => stop.rule === code)?.action ?? call.conclusion.said;
}
