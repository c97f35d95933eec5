import { readdirSync, readFileSync } from "node:fs";
import type {
  ClosingCheckId,
  ClosingOutcome,
  LastStage,
  ReadingUnit,
  TouchRow,
  UnitProfile,
} from "@emberladder/furnace";
import { buildProfile } from "./build-profile.ts";

/** One observation of an invented reference call. */
export interface ReferenceObservation {
  check: string;
  stage: string;
  power?: "ON" | "OFF" | "ON-idle" | "ON-call" | "any";
  outcome?: "good" | "marginal" | "fail";
  finding?: string;
  value?: number;
  unit?: ReadingUnit;
  inV?: number;
  outV?: number;
}

export interface ReferenceCall {
  slug: string;
  job: { date: string };
  unit: {
    ignition: UnitProfile["codes"]["ignition"];
    draft: UnitProfile["codes"]["draft"];
    staging: UnitProfile["codes"]["staging"];
    location: UnitProfile["codes"]["location"];
    control: UnitProfile["codes"]["control"];
    fuel: UnitProfile["codes"]["fuel"];
    profile: {
      manifoldInwc?: { high?: number; low?: number };
      inletInwc?: { min: number; max: number };
      riseF?: { min: number; max: number };
      externalStaticMaxInwc?: number;
      supply?: { volts: number };
      transformerVa?: number;
      draftSwitches: { makeInwc?: number }[];
      flameSignal?: { goodUa?: number; dropOutUa?: number };
      ignition?: { kind: string; ohmsCold?: { min: number; max: number } };
      lastFlueCo?: { date: string; airFreePpm: number };
    };
  };
  firstLook: { hit: string | null };
  stops: { rule: string }[];
  observations: ReferenceObservation[];
  afterRepair: ReferenceObservation[];
  putBack: { kind: string; leakCheck: "up" | "down" | null }[];
  conclusion: { cause: string; evidence: number[] };
  touched: (TouchRow | "left-off")[];
  lightOffProof: {
    id: ClosingCheckId;
    applies: boolean;
    pass?: boolean;
    value?: number;
    unit?: ReadingUnit;
    also?: Record<string, number | boolean>;
  }[];
  outcome: ClosingOutcome;
  assess: {
    lastStage: LastStage;
    truth: string[];
    unit: { options?: Record<string, boolean> };
    observations: ReferenceObservation[];
  };
}

const folder = new URL("../../fixtures/reference-calls/", import.meta.url);

/** The twelve invented calls. */
export const referenceCalls: ReferenceCall[] = readdirSync(folder)
  .filter((name) => name.endsWith(".json"))
  .toSorted()
  .map((name) => JSON.parse(readFileSync(new URL(name, folder), "utf8")) as ReferenceCall);

/** The unit profile that a reference call describes. */
export function profileOf({ unit, assess }: ReferenceCall): UnitProfile {
  const { profile, ...codes } = unit;
  const [first, second] = profile.draftSwitches;
  return buildProfile({
    codes,
    options: assess.unit.options ?? {},
    plate: {
      manifoldHighInwc: profile.manifoldInwc?.high,
      manifoldLowInwc: profile.manifoldInwc?.low,
      inletMinInwc: profile.inletInwc?.min,
      inletMaxInwc: profile.inletInwc?.max,
      riseMinF: profile.riseF?.min,
      riseMaxF: profile.riseF?.max,
      staticMaxInwc: profile.externalStaticMaxInwc,
      ratedVolts: profile.supply?.volts,
      transformerVa: profile.transformerVa,
      switchMakeInwc: first?.makeInwc,
      highSwitchMakeInwc: second?.makeInwc,
      goodUa: profile.flameSignal?.goodUa,
      dropOutUa: profile.flameSignal?.dropOutUa,
    },
    lastFlueCo: profile.lastFlueCo,
  });
}
