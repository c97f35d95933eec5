import type {
  ChainDevice,
  OptionFlag,
  PlateFigures,
  ReadingUnit,
  Timings,
  VariantCodes,
} from "@emberladder/furnace";
import { isDirect } from "@emberladder/furnace";

/**
 * Which questions about a unit its six codes leave open. A form asks only these, so that a unit can be described
 * on a roof. Which part comes with which kind of unit is common practice, not a standard; nothing here refuses an
 * unusual unit, it only leaves a question out.
 */
type Applies = (codes: VariantCodes) => boolean;

const always: Applies = () => true;
const hasInducer: Applies = (codes) => codes.draft !== "ND";
const hasPressureSwitch: Applies = (codes) => codes.draft === "IDP" || codes.draft === "CON";
const isStaged: Applies = (codes) => codes.staging !== "1S";
const isRooftop: Applies = (codes) => codes.location === "RTU";
const isIndoors: Applies = (codes) => codes.location !== "RTU";
const hasHotSurface: Applies = (codes) => codes.ignition === "HSI" || codes.ignition === "IPH";
const hasSpark: Applies = (codes) => codes.ignition === "IPS" || codes.ignition === "DSI";
const hasFlameSensor: Applies = (codes) => codes.ignition !== "SP";
const hasPilotFlame: Applies = (codes) => !isDirect(codes);
const hasBoard: Applies = (codes) => codes.control === "IFC";

/** Units of the plate that no reading has. */
export type PlateUnit = ReadingUnit | "btuh" | "VA" | "btuPerFt3";

export interface PlateField {
  name: keyof PlateFigures;
  unit?: PlateUnit;
  isRise?: boolean;
  applies: Applies;
}

/** Figures of the rating plate and the labels, in the order in which a plate is usually read. */
export const PLATE_FIELDS: readonly PlateField[] = [
  { name: "inputBtuh", unit: "btuh", applies: always },
  { name: "lowInputBtuh", unit: "btuh", applies: isStaged },
  { name: "outputBtuh", unit: "btuh", applies: always },
  { name: "efficiencyPct", unit: "pct", applies: (codes) => codes.draft === "CON" },
  { name: "manifoldHighInwc", unit: "inwc", applies: always },
  { name: "manifoldLowInwc", unit: "inwc", applies: isStaged },
  { name: "inletMinInwc", unit: "inwc", applies: always },
  { name: "inletMaxInwc", unit: "inwc", applies: always },
  { name: "riseMinF", unit: "F", isRise: true, applies: always },
  { name: "riseMaxF", unit: "F", isRise: true, applies: always },
  { name: "staticMaxInwc", unit: "inwc", applies: always },
  { name: "ratedVolts", unit: "V", applies: always },
  { name: "phase", applies: isRooftop },
  { name: "transformerVa", unit: "VA", applies: always },
  { name: "fuseA", unit: "A", applies: hasBoard },
  { name: "switchMakeInwc", unit: "inwc", applies: hasPressureSwitch },
  {
    name: "highSwitchMakeInwc",
    unit: "inwc",
    applies: (codes) => hasPressureSwitch(codes) && isStaged(codes),
  },
  { name: "igniterVolts", unit: "V", applies: hasHotSurface },
  { name: "igniterKind", applies: hasHotSurface },
  { name: "igniterOhmMin", unit: "ohm", applies: hasHotSurface },
  { name: "igniterOhmMax", unit: "ohm", applies: hasHotSurface },
  { name: "sparkGapMinIn", unit: "in", applies: hasSpark },
  { name: "sparkGapMaxIn", unit: "in", applies: hasSpark },
  { name: "dropOutUa", unit: "uA", applies: hasFlameSensor },
  { name: "goodUa", unit: "uA", applies: hasFlameSensor },
  { name: "inducerFlaA", unit: "A", applies: hasInducer },
  { name: "blowerFlaA", unit: "A", applies: always },
  { name: "heatingValueBtuPerFt3", unit: "btuPerFt3", applies: always },
  { name: "draftMinInwc", unit: "inwc", applies: (codes) => !hasInducer(codes) },
];

export interface TimingField {
  name: keyof Timings;
  unit?: "s";
  applies: Applies;
}

/** Timings of the control, in the order of a cycle; the last two are counts. */
export const TIMING_FIELDS: readonly TimingField[] = [
  { name: "prepurgeS", unit: "s", applies: hasInducer },
  { name: "warmUpS", unit: "s", applies: hasHotSurface },
  { name: "trialS", unit: "s", applies: hasFlameSensor },
  { name: "blowerOnDelayS", unit: "s", applies: always },
  { name: "stageTwoDelayS", unit: "s", applies: isStaged },
  { name: "postPurgeS", unit: "s", applies: hasInducer },
  { name: "blowerOffDelayS", unit: "s", applies: always },
  { name: "interpurgeS", unit: "s", applies: hasFlameSensor },
  { name: "softLockoutS", unit: "s", applies: hasFlameSensor },
  { name: "tries", applies: hasFlameSensor },
  { name: "recycles", applies: hasFlameSensor },
];

const OPTION_APPLIES: Record<OptionFlag, Applies> = {
  "vent-damper": (codes) => !hasInducer(codes),
  "ac-coil": always,
  "psc-inducer": hasInducer,
  "psc-blower": always,
  "ecm-blower": always,
  "belt-blower": isRooftop,
  twinned: isIndoors,
  "three-phase": isRooftop,
  downflow: isIndoors,
  economizer: isRooftop,
  bas: isRooftop,
  smoke: isRooftop,
  "low-limit": isRooftop,
  "airflow-switch": isRooftop,
  "electromech-stat": always,
  "stat-battery": always,
  "lv-fuse": hasBoard,
  overflow: always,
  "condensate-pump": (codes) => codes.draft === "CON",
  "direct-vent": hasInducer,
  "fusible-link": always,
  "multi-burner": always,
  "multi-tap": always,
  // Follows from the altitude of the site, so it is never asked.
  altitude: () => false,
  "gas-meter": always,
  "start-check": hasInducer,
  zoned: isIndoors,
  "tc-cutout": hasPilotFlame,
  "transformer-breaker": always,
  gfci: isIndoors,
};

const CHAIN_APPLIES: Partial<Record<ChainDevice, Applies>> = {
  "spill-switch": (codes) => !hasInducer(codes),
  "vent-damper-end-switch": (codes) => !hasInducer(codes),
  "smoke-contact": isRooftop,
  "airflow-switch": isRooftop,
  "low-limit": isRooftop,
  "pressure-switch": hasPressureSwitch,
  "pressure-switch-2": (codes) => hasPressureSwitch(codes) && isStaged(codes),
  "centrifugal-switch": (codes) => codes.draft === "IDC",
};

/** Plate figures that a unit of these codes can have. */
export function plateFieldsFor(codes: VariantCodes): PlateField[] {
  return PLATE_FIELDS.filter((field) => field.applies(codes));
}

/** Timings that a unit of these codes can have. */
export function timingFieldsFor(codes: VariantCodes): TimingField[] {
  return TIMING_FIELDS.filter((field) => field.applies(codes));
}

/** Whether an option is asked for on a unit of these codes. */
export function optionApplies(flag: OptionFlag, codes: VariantCodes): boolean {
  return OPTION_APPLIES[flag](codes);
}

/** Whether a device can stand in the safety chain of a unit of these codes. */
export function chainDeviceApplies(device: ChainDevice, codes: VariantCodes): boolean {
  return CHAIN_APPLIES[device]?.(codes) ?? true;
}
