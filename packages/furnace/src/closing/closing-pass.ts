import { classInBand, resolveBands } from "../bands.ts";
import { roundLimit } from "../bands-chain.ts";
import type { CheckId } from "../checks/check-ids.ts";
import type { Outcome, ReadingUnit } from "../codes.ts";
import type { UnitProfile } from "../profile.ts";
import type { ClosingCheckId } from "./closing-ids.ts";
import { COLD_ITEMS } from "./closing-checks.ts";

/** A closing check as it was recorded. */
export interface ClosingReading {
  value?: number;
  unit?: ReadingUnit;
  also?: Readonly<Record<string, number | boolean>>;
  /** A look: what was seen is right. */
  seenRight?: boolean;
}

/** What a passed or failed closing check asks for besides. */
export type ClosingNotice =
  "action-required" | "stop-rule-co-30" | "supervisor-sees" | "cannot-close-as-fixed" | "shut-off";

export interface ClosingVerdict {
  readonly pass: boolean;
  readonly notice?: ClosingNotice;
  /** What has to be given before it can be judged: fields of the reading or figures of the plate. */
  readonly missing: readonly string[];
}

const passIf = (pass: boolean, notice?: ClosingNotice): ClosingVerdict => ({ pass, notice, missing: [] });
const lacks = (...missing: string[]): ClosingVerdict => ({ pass: false, missing });

/** What a judge of a closing check is given: the reading taken apart, the unit, and the lights asked for. */
interface Case {
  value: number | undefined;
  seenRight: boolean | undefined;
  number: (field: string) => number | undefined;
  yes: (field: string) => boolean | undefined;
  profile: UnitProfile;
  lights: number;
}

type Judge = (closing: Case) => ClosingVerdict;

/** A look: right by what was seen, or by a count of what was wrong that is zero. */
const nothingWrong: Judge = ({ seenRight, value }) =>
  seenRight === undefined && value === undefined ? lacks("seenRight") : passIf(seenRight ?? value === 0);

const seen: Judge = ({ seenRight, value }) =>
  seenRight === undefined && value === undefined ? lacks("seenRight") : passIf(seenRight ?? true);

const withValue =
  (judge: (value: number, closing: Case) => ClosingVerdict): Judge =>
  (closing) =>
    closing.value === undefined || Number.isNaN(closing.value)
      ? lacks("value")
      : judge(closing.value, closing);

function classOf(
  check: CheckId,
  value: number,
  profile: UnitProfile,
  way?: string,
): Outcome | "stop" | undefined {
  const band = resolveBands(check, profile, { way })[0];
  return band && classInBand(band, value);
}

/** Microamps a proven flame has at least, whatever the label. Common practice. */
const LEAST_FLAME_UA = 1;
/** Default drop-out of the flame circuit in a main flame and in a pilot flame. Common practice; the label outranks. */
const DROP_OUT_UA = { main: 0.5, pilot: 0.4 };
/** Suction that a pressure switch has beyond its closes-at figure, inches of water. Common practice. */
const SUCTION_MARGIN_INWC = 0.1;

const judges: Readonly<Record<ClosingCheckId, Judge>> = {
  "close-cycles": withValue((value, { number, lights }) =>
    passIf(value >= lights && (number("retries") ?? 0) === 0),
  ),
  "close-flame": nothingWrong,
  "close-cycle-end": (closing) =>
    closing.value === undefined
      ? nothingWrong(closing)
      : passIf(closing.value <= 2 && closing.seenRight !== false),
  "close-room-co": withValue((value, { number, yes }) => {
    if (value >= 30) return passIf(false, "stop-rule-co-30");
    if (yes("alarmExplained") === false) return passIf(false);
    if (value > 9)
      return passIf(yes("sourceFound") === true && yes("occupantTold") === true, "action-required");
    return passIf(value <= (number("beforePpm") ?? value));
  }),
  "close-panels": seen,
  "close-tstat": seen,
  "close-jumpers": withValue((value) => passIf(value === 0)),
  "close-docs": withValue((value) => passIf(value >= 1)),
  "close-leak-up": withValue((value, { yes }) => passIf(value === 0 && yes("bubbles") !== true)),
  "close-leak-down": withValue((value, { yes }) => passIf(value === 0 && yes("bubbles") !== true)),
  "close-restore": (closing) => {
    const { number, yes, seenRight } = closing;
    const unlit = (number("pilots") ?? 0) - (number("pilotsLitOrTagged") ?? number("pilots") ?? 0);
    if (yes("movement") === true || unlit > 0) return passIf(false);
    return seenRight === undefined && yes("movement") === undefined
      ? lacks("movement")
      : passIf(seenRight ?? true);
  },
  "close-inlet-static": withValue((value, { profile }) => {
    const cls = classOf("ck-inlet-pressure-static", value, profile);
    return passIf(cls === "good" || cls === "marginal");
  }),
  "close-inlet-run": withValue((value, { profile, number }) => {
    const drop = number("dropInwc");
    if (drop === undefined) return lacks("dropInwc");
    const cls = classOf("ck-inlet-pressure-running", value, profile, "pressure");
    return passIf((cls === "good" || cls === "marginal") && Math.abs(drop) <= 1);
  }),
  "close-manifold": withValue((value, { profile, number }) => {
    if (profile.codes.staging === "2S" && number("lowInwc") === undefined) return lacks("lowInwc");
    const low = number("lowInwc");
    const isLowRight =
      low === undefined || classOf("ck-manifold-pressure", low, profile, "low-fire") === "good";
    return passIf(classOf("ck-manifold-pressure", value, profile, "high-fire") === "good" && isLowRight);
  }),
  "close-input": withValue((value) => passIf(value >= 95 && value <= 100)),
  "close-rise": withValue((value, { profile }) => {
    const { riseMinF, riseMaxF } = profile.plate;
    if (riseMinF === undefined || riseMaxF === undefined) return lacks("plate.riseMinF", "plate.riseMaxF");
    return passIf(value >= riseMinF && value <= riseMaxF);
  }),
  "close-sensor": withValue((value, { profile, number }) => {
    if (profile.codes.ignition === "SP") {
      const dropOutS = number("dropOutS");
      return dropOutS === undefined ? lacks("dropOutS") : passIf(value >= 12 && dropOutS <= 180);
    }
    const isPilot = profile.codes.ignition === "IPS" || profile.codes.ignition === "IPH";
    const dropOut = profile.plate.dropOutUa ?? (isPilot ? DROP_OUT_UA.pilot : DROP_OUT_UA.main);
    return passIf(value >= LEAST_FLAME_UA && value >= 2 * dropOut);
  }),
  "close-co": withValue((value, { yes }) => {
    if (value > 400 || yes("rising") === true) return passIf(false, "shut-off");
    if (value > 200) return passIf(false, "cannot-close-as-fixed");
    if (value <= 100) return passIf(true);
    return yes("causeSought") === true ? passIf(true, "supervisor-sees") : lacks("causeSought");
  }),
  "close-draft": withValue(judgeDraft),
  "close-draft-opens": withValue((value, { yes }) => passIf(value >= 60 && yes("ignitionStarted") !== true)),
  "close-safeties": ({ seenRight, value }) =>
    seenRight === undefined && value === undefined
      ? lacks("seenRight")
      : passIf(seenRight ?? (value ?? 1) <= 0.5),
  "close-cold": withValue((value) => passIf(value >= COLD_ITEMS.length)),
};

function judgeDraft(value: number, { profile, number }: Case): ClosingVerdict {
  if ((number("ventJointsCoPpm") ?? 0) > 0) return passIf(false);
  if (profile.codes.draft === "ND") {
    const spill = number("spillStopsS");
    if (spill === undefined) return lacks("spillStopsS");
    const cls = classOf("ck-draft", value, profile);
    return passIf((cls === "good" || cls === "marginal") && spill <= 300);
  }
  // A centrifugal switch has no closes-at figure: it is seen to close, and the value is CO at the vent joints.
  if (profile.codes.draft === "IDC") return passIf(value === 0);
  const make = profile.plate.switchMakeInwc ?? number("makeInwc");
  if (make === undefined) return lacks("plate.switchMakeInwc");
  const highMake = profile.plate.highSwitchMakeInwc ?? number("highMakeInwc");
  const highSuction = number("highSuctionInwc");
  if (highMake !== undefined && highSuction === undefined) return lacks("highSuctionInwc");
  const isHighRight =
    highMake === undefined || highSuction === undefined || reachesSuction(highSuction, highMake);
  return passIf(reachesSuction(value, make) && isHighRight);
}

/** Suction as a gauge shows it, compared as it is written: binary fractions do not fail 0.62 + 0.10. */
function reachesSuction(suction: number, closesAt: number): boolean {
  return Math.abs(suction) >= roundLimit(closesAt + SUCTION_MARGIN_INWC);
}

/**
 * Whether a closing check passes on a unit, and what it asks for besides. `lights` is the count of first-try
 * lights that the rows touched ask for; only close-cycles uses it. Common practice; the plate outranks.
 */
export function closingPass(
  id: ClosingCheckId,
  reading: ClosingReading,
  profile: UnitProfile,
  asked: { lights?: number } = {},
): ClosingVerdict {
  const also = reading.also ?? {};
  return judges[id]({
    value: reading.value,
    seenRight: reading.seenRight,
    number: (field) => (typeof also[field] === "number" ? also[field] : undefined),
    yes: (field) => (typeof also[field] === "boolean" ? also[field] : undefined),
    profile,
    lights: asked.lights ?? 1,
  });
}
