import { chainDevices } from "./en/chain-devices.ts";
import { checks } from "./en/checks.ts";
import { closing, closingNotices, coldItems, touched } from "./en/closing.ts";
import { codes } from "./en/codes.ts";
import { departures } from "./en/departures.ts";
import { door } from "./en/door.ts";
import { faults } from "./en/faults.ts";
import { findings } from "./en/findings.ts";
import { firstLook } from "./en/first-look.ts";
import { hazards } from "./en/hazards.ts";
import { instruments } from "./en/instruments.ts";
import { jumpers } from "./en/jumpers.ts";
import { meterRules } from "./en/meter-rules.ts";
import { options } from "./en/options.ts";
import { parts } from "./en/parts.ts";
import { putBack } from "./en/put-back.ts";
import { repairNeeds } from "./en/repair-needs.ts";
import { repairs } from "./en/repairs.ts";
import { sameFaults } from "./en/same-faults.ts";
import { setUp } from "./en/set-up.ts";
import { stages } from "./en/stages.ts";
import { standingPilot } from "./en/standing-pilot.ts";
import { afterwards, stopRules } from "./en/stop-rules.ts";
import { symptoms } from "./en/symptoms.ts";
import { units } from "./en/units.ts";
import { variantProblems } from "./en/variant-problems.ts";
import { ways } from "./en/ways.ts";

/** The trade's words in English: one resource of the name space `trade`, keyed by the ids of the catalogue. */
export const en = {
  afterwards,
  chainDevices,
  checks,
  closing,
  closingNotices,
  codes,
  coldItems,
  departures,
  door,
  faults,
  findings,
  firstLook,
  hazards,
  instruments,
  jumpers,
  meterRules,
  options,
  parts,
  putBack,
  repairNeeds,
  repairs,
  sameFaults,
  setUp,
  stages,
  standingPilot,
  stopRules,
  symptoms,
  touched,
  units,
  variantProblems,
  ways,
} as const;

export type TradeWords = typeof en;
