import type { BandClass } from "./bands-chain.ts";
import { classInBand, resolveBands } from "./bands.ts";
import type { ReadingSituation, ResolvedBand } from "./bands.ts";
import { lowerByFinding, worseOutcome } from "./checks/findings.ts";
import type { CheckId } from "./checks/check-ids.ts";
import { getCheck } from "./checks/checks.ts";
import { CLOSED_CONTACT_V } from "./contact-voltage.ts";
import type { Outcome, ReadingUnit } from "./codes.ts";
import type { UnitProfile } from "./profile.ts";

/** A reading as the meter shows it. "OL", beyond the meter's range, counts as infinite. */
export interface Reading extends ReadingSituation {
  check: CheckId;
  value?: number | "OL";
  unit?: ReadingUnit;
  /** Volts to C on both sides of a 24 V switch or fuse. */
  inV?: number;
  outV?: number;
  /** A coded finding; it can only lower the class. */
  finding?: string;
}

export interface Classified {
  /** Absent where the reading has no class. */
  outcome?: Outcome;
  /** The reading stops work by itself. */
  stop?: boolean;
  /** Set where the reading says nothing about the device. */
  finding?: "no-path";
  /** The band that was used. */
  band?: ResolvedBand;
}

/** Out V under this with the path there is open; between it and a closed contact's 22 V the contact is bad. */
export const OPEN_OUT_V = 18;

/**
 * The class of a reading on one unit. A number falls into the band of its unit and situation; a 24 V contact is
 * judged by In V and Out V, and one read across only, or with less than 22 V in, has no class and the finding
 * `no-path`. A reading without a band has the class of its finding, if that carries one only.
 */
export function classifyReading(reading: Reading, profile: UnitProfile): Classified {
  const byValue = classifyValue(reading, profile);
  if (byValue.finding === "no-path") return byValue;
  const outcome = lowerByFinding(byValue.outcome, reading.check, reading.finding);
  return { ...byValue, outcome };
}

function classifyValue(reading: Reading, profile: UnitProfile): Classified {
  const value = reading.value === "OL" ? Infinity : reading.value;
  const isContact = getCheck(reading.check).reading === "in-out";
  if (isContact && (reading.inV !== undefined || reading.outV !== undefined)) {
    return classifyContact({ ...reading, value }, profile);
  }
  if (value === undefined || Number.isNaN(value) || reading.unit === undefined) return {};
  const band = resolveBands(reading.check, profile, reading).find(({ unit }) => unit === reading.unit);
  if (!band) {
    // An igniter whose kind is not stated still fails when it is open.
    return reading.check === "ck-igniter-ohms" && value === Infinity ? { outcome: "fail" } : {};
  }
  if (band.quantity === "across") return { finding: "no-path", band };
  return { ...outcomeOf(classInBand(band, value)), band };
}

function outcomeOf(cls: BandClass): { outcome: Outcome; stop?: true } {
  return cls === "stop" ? { outcome: "fail", stop: true } : { outcome: cls };
}

/**
 * A 24 V contact by its two sides. With less than 22 V in nothing is known of it; with 22 V on both sides it is
 * closed and the drop gives the class; under 18 V out it is open; between, the contact is bad and never better
 * than marginal. A switch that must be open before start is classed by the drop alone. Common practice.
 */
function classifyContact(reading: Reading & { value?: number }, profile: UnitProfile): Classified {
  const inV = reading.inV ?? add(reading.outV, reading.value);
  const outV = reading.outV ?? add(reading.inV, reading.value === undefined ? undefined : -reading.value);
  const band = resolveBands(reading.check, profile, reading).find(({ quantity }) => quantity === "across");
  if (inV === undefined || outV === undefined || !(inV >= CLOSED_CONTACT_V))
    return { finding: "no-path", band };
  if (!band) return {};
  const byDrop = outcomeOf(classInBand(band, inV - outV));
  const mustRestOpen = reading.check === "ck-pressure-switch-rest";
  const isBadContact = outV < CLOSED_CONTACT_V && outV >= OPEN_OUT_V;
  return {
    ...byDrop,
    outcome: isBadContact && !mustRestOpen ? worseOutcome(byDrop.outcome, "marginal") : byDrop.outcome,
    band,
  };
}

function add(a: number | undefined, b: number | undefined): number | undefined {
  return a === undefined || b === undefined ? undefined : a + b;
}
