import { GENESIS_HASH, seal } from "@emberladder/diagnosis";
import type { Envelope, UnhashedEnvelope } from "@emberladder/diagnosis";
import { v7 as uuidv7 } from "uuid";
import { testProfile } from "./company.ts";
import type { TestCompany } from "./company.ts";

/** A phone that writes one diagnosis: it numbers and links its events as a real one does. */
export interface TestRecord {
  diagnosisId: string;
  /** The next event of this diagnosis. */
  next: (type: string, body: Record<string, unknown>, override?: Partial<UnhashedEnvelope>) => Envelope;
  /** The opening on the company's call and unit. */
  open: (override?: Record<string, unknown>) => Envelope;
  /** Goes on from another last event, as after a refused one. */
  goOnFrom: (event: Envelope | undefined) => void;
}

let lastSeq = 0;

/** Starts a record of a new diagnosis by a company's device. */
export function startRecord(
  company: TestCompany,
  { deviceId = company.people.technician.deviceId, diagnosisId = uuidv7() } = {},
): TestRecord {
  let prevHash = GENESIS_HASH;
  const next: TestRecord["next"] = (type, body, override = {}) => {
    lastSeq += 1;
    const event = seal({
      id: uuidv7(),
      diagnosisId,
      deviceId,
      deviceSeq: lastSeq,
      type,
      schemaVersion: 1,
      body,
      occurredAt: Date.now(),
      tzOffsetMin: -420,
      monotonicMs: Math.round(performance.now()),
      serverOffsetMs: 0,
      appBuild: "test",
      prevHash,
      ...override,
    });
    prevHash = event.hash;
    return event;
  };
  return {
    diagnosisId,
    next,
    open: (override = {}) =>
      next("diagnosis.opened", {
        callId: company.callId,
        unitId: company.unitId,
        profile: testProfile,
        tree: null,
        catalogueVersion: "1",
        modelVersion: "1",
        ...override,
      }),
    goOnFrom: (event) => {
      prevHash = event?.hash ?? GENESIS_HASH;
    },
  };
}

/** A door on which all is well, without readings. */
export const doorAllWell = [
  { question: "people", unwell: false, alarm: false, coPpm: 0 },
  { question: "smell", smell: false, lelPct: 0 },
  { question: "way-in", safe: true },
] as const;
