import type { LastStage, Outcome, ReadingStage, ReadingUnit, VariantCodes } from "@emberladder/furnace";
import type { UnitProfile } from "@emberladder/furnace";

/** The shape of an invented reference call, as far as records are made from it. */
export interface ReferenceCall {
  id: string;
  slug: string;
  title: string;
  demo: true;
  job: {
    company: string;
    jobNumber: string;
    date: string;
    arrived: string;
    technician: { name: string; email: string };
    customer: { name: string; email: string; phone: string };
    site: { address: string; town: string; altitudeFt: number };
    access?: string;
  };
  unit: VariantCodes & { profile: ReferenceProfile };
  complaint: string;
  arrivalGate: {
    minute: number;
    answers: { ask: string; check?: string; answer: string; value?: number }[];
    stopRules: string[];
  };
  stops: { rule: string; minute: number; action: string }[];
  firstLook: {
    minute: number;
    items: { item: string; check?: string; answer: string }[];
    hit: string | null;
  };
  watch?: ReferenceWatch[];
  watchSkipped?: { minute: number; why: string };
  observations: ReferenceObservation[];
  afterRepair: ReferenceObservation[];
  putBack: {
    id: string;
    kind: string;
    what: string;
    openedMinute: number;
    restoredMinute: number;
    leakCheck: "up" | "down" | null;
  }[];
  conclusion: {
    cause: string;
    also?: string[];
    evidence: number[];
    said: string;
    proven?: boolean;
    openQuestion?: string;
    rootCause?: { fault: string; why: string };
  };
  repair: {
    minutes: number;
    done: string[];
    parts: { what: string; qty: number; state: "fitted" | "ordered" }[];
  };
  touched: string[];
  lightOffProof: ReferenceProof[];
  outcome: "fixed" | "part-needed" | "shut-off" | "referred" | "not-found";
  leftState: { inService: boolean; gasValve: string; power: string };
  plainReport: string;
  assess: { unit: { options?: Record<string, boolean>; plate?: Record<string, number | string> } };
}

export interface ReferenceWatch {
  minute: number;
  rungs: { stage: string; state: string; seconds: number | null }[];
  tries: number;
  lastStage: LastStage;
  resetsBefore: number | null;
  before?: { gasShutS: number; lelBurnerBoxPct: number; lelVentPct: number };
  blowerWithInducer?: boolean;
}

export interface ReferenceObservation {
  minute: number;
  check: string;
  stage: ReadingStage;
  power: "ON" | "OFF" | "ON-idle" | "ON-call" | "any";
  outcome?: Outcome;
  finding?: string;
  value?: number;
  unit?: ReadingUnit;
  inV?: number;
  outV?: number;
  note?: string;
}

export interface ReferenceProof {
  id: string;
  applies: boolean;
  pass?: boolean;
  value?: number;
  unit?: ReadingUnit;
  minute?: number;
  also?: Record<string, number>;
}

interface ReferenceProfile {
  name: string;
  inputBtuh: number;
  lowInputBtuh?: number;
  outputBtuh: number;
  efficiencyPct: number;
  altitudeFt: number;
  manifoldInwc: { high?: number; low?: number };
  inletInwc: { min?: number; max?: number };
  riseF: { min: number; max: number };
  externalStaticMaxInwc?: number;
  supply: { volts: number; phase: 1 | 3 };
  transformerVa: number;
  controlFuseA: number | null;
  draftSwitches: { name: string; makeInwc?: number }[];
  ignition?: { kind: string; warmUpS?: number; ohmsCold?: { min: number; max: number } };
  flameSignal?: { goodUa?: number; dropOutUa?: number };
  prepurgeS?: number;
  trialS?: number;
  blowerOnDelayS?: number;
  blowerOffDelayS?: number;
  postPurgeS?: number;
  blower?: { kind: string; flaA?: number };
  heatingValueBtuPerFt3?: number;
  lastFlueCo?: { date: string; airFreePpm: number };
}

/** The unit profile of a reference call, from its plate. */
export function profileOf(call: ReferenceCall): UnitProfile {
  const { profile: p, ignition, draft, staging, location, control, fuel } = call.unit;
  const [first, second] = p.draftSwitches;
  const element = p.ignition?.kind ?? "";
  const given = <T extends object>(values: T) =>
    Object.fromEntries(Object.entries(values).filter(([, value]) => value !== undefined)) as Partial<T>;
  return {
    codes: { ignition, draft, staging, location, control, fuel },
    options: {
      "lv-fuse": p.controlFuseA !== null,
      "multi-burner": true,
      altitude: p.altitudeFt > 2000,
      ...(p.blower
        ? { "psc-blower": p.blower.kind.startsWith("PSC"), "ecm-blower": p.blower.kind.startsWith("ECM") }
        : {}),
      ...call.assess.unit.options,
    },
    plate: given({
      inputBtuh: p.inputBtuh,
      lowInputBtuh: p.lowInputBtuh,
      outputBtuh: p.outputBtuh,
      efficiencyPct: p.efficiencyPct,
      manifoldHighInwc: p.manifoldInwc.high,
      manifoldLowInwc: p.manifoldInwc.low,
      inletMinInwc: p.inletInwc.min,
      inletMaxInwc: p.inletInwc.max,
      riseMinF: p.riseF.min,
      riseMaxF: p.riseF.max,
      staticMaxInwc: p.externalStaticMaxInwc,
      ratedVolts: p.supply.volts,
      phase: p.supply.phase,
      transformerVa: p.transformerVa,
      fuseA: p.controlFuseA,
      switchMakeInwc: first?.makeInwc,
      highSwitchMakeInwc: second?.makeInwc,
      igniterKind: element.startsWith("nitride")
        ? ("SiN" as const)
        : element.startsWith("carbide")
          ? ("SiC" as const)
          : undefined,
      igniterOhmMin: p.ignition?.ohmsCold?.min,
      igniterOhmMax: p.ignition?.ohmsCold?.max,
      dropOutUa: p.flameSignal?.dropOutUa,
      goodUa: p.flameSignal?.goodUa,
      blowerFlaA: p.blower?.flaA,
      heatingValueBtuPerFt3: p.heatingValueBtuPerFt3,
    }),
    timings: given({
      prepurgeS: p.prepurgeS,
      warmUpS: p.ignition?.warmUpS,
      trialS: p.trialS,
      blowerOnDelayS: p.blowerOnDelayS,
      blowerOffDelayS: p.blowerOffDelayS,
      postPurgeS: p.postPurgeS,
    }),
    altitudeFt: p.altitudeFt,
    altitudeRule: "4-from-sea-level",
    bands: [],
    ...(p.lastFlueCo ? { lastFlueCo: p.lastFlueCo } : {}),
  };
}
