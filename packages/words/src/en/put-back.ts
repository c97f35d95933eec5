import type { OpenedThing, PutBackKind } from "@emberladder/furnace";

/** Words of the put-back list. */
interface PutBackWords {
  /** What was opened, as a noun. */
  readonly what: Readonly<Record<OpenedThing, string>>;
  /** What taking a check opens: said before it is started. */
  readonly out: Readonly<Record<OpenedThing, string>>;
  /** State of an entry that is still out. */
  readonly state: Readonly<Record<PutBackKind, string>>;
  /** The act that puts it back: a row's button. */
  readonly act: Readonly<Record<PutBackKind, string>>;
  /** How a row begins where a lead or a jumper is concerned. */
  readonly powerOffFirst: string;
  readonly endCallFirst: string;
}

const what: Readonly<Record<OpenedThing, string>> = {
  "burner-door": "Burner door",
  "blower-door": "Blower door",
  "line-leads": "Line leads",
  "door-switch-clamp": "Clamp on the door switch",
  "disconnect-cover": "Disconnect cover",
  "control-fuse": "Control fuse",
  "thermostat-leads": "Thermostat leads",
  "r-lead": "R lead",
  "unit-gas-valve": "Unit's gas valve",
  "r-w-jumper": "Jumper R to W",
  "thermostat-cover": "Thermostat cover",
  "thermostat-cable": "Thermostat cable",
  "w-lead": "W lead",
  "control-panel": "Control panel",
  "limit-lead": "Limit lead",
  "rollout-lead": "Rollout switch lead",
  "damper-cover": "Vent damper cover",
  "pressure-switch-lead": "Pressure switch lead",
  "pressure-switch-hose": "Pressure switch hose",
  "centrifugal-switch-lead": "Centrifugal switch lead",
  "inducer-plug": "Inducer plug",
  "inducer-capacitor-leads": "Inducer capacitor leads",
  inducer: "Inducer",
  "cleanout-cover": "Cleanout cover",
  "vent-cap": "Vent cap",
  "intake-screen": "Intake screen",
  "drain-hose": "Drain hose",
  "condensate-trap": "Condensate trap",
  "burner-tray": "Burner tray",
  "igniter-plug": "Igniter plug",
  "spark-lead": "Spark lead",
  "thermocouple-nut": "Thermocouple nut",
  "gas-valve-leads": "Gas valve leads",
  "flame-sensor-wire": "Flame sensor wire",
  "inlet-tap": "Inlet tap plug",
  "manifold-tap": "Manifold tap plug",
  "orifice-holders": "Orifice holders",
  "static-test-plugs": "Static test plugs",
  "blower-capacitor-leads": "Blower capacitor leads",
  "flue-test-plug": "Flue test plug",
  "valve-inlet-joint": "Joint ahead of the gas valve",
  "valve-outlet-joint": "Joint after the gas valve",
  "flame-sensor": "Flame sensor",
  igniter: "Igniter",
};

const state: Readonly<Record<PutBackKind, string>> = {
  "cover-removed": "off",
  "gas-port-opened": "open",
  "gas-joint-opened": "open",
  "part-removed": "out",
  "tube-pulled": "off",
  "meter-in-series": "in series",
  "lead-lifted": "lifted",
  "jumper-fitted": "fitted",
  "valve-closed": "shut",
};

/** How each thing is out, by the kind in which the catalogue opens it. */
const outBy: Readonly<Record<OpenedThing, PutBackKind>> = {
  "burner-door": "cover-removed",
  "blower-door": "cover-removed",
  "line-leads": "lead-lifted",
  "door-switch-clamp": "jumper-fitted",
  "disconnect-cover": "cover-removed",
  "control-fuse": "part-removed",
  "thermostat-leads": "lead-lifted",
  "r-lead": "lead-lifted",
  "unit-gas-valve": "valve-closed",
  "r-w-jumper": "jumper-fitted",
  "thermostat-cover": "cover-removed",
  "thermostat-cable": "lead-lifted",
  "w-lead": "lead-lifted",
  "control-panel": "cover-removed",
  "limit-lead": "lead-lifted",
  "rollout-lead": "lead-lifted",
  "damper-cover": "cover-removed",
  "pressure-switch-lead": "lead-lifted",
  "pressure-switch-hose": "tube-pulled",
  "centrifugal-switch-lead": "lead-lifted",
  "inducer-plug": "lead-lifted",
  "inducer-capacitor-leads": "lead-lifted",
  inducer: "part-removed",
  "cleanout-cover": "cover-removed",
  "vent-cap": "part-removed",
  "intake-screen": "part-removed",
  "drain-hose": "part-removed",
  "condensate-trap": "part-removed",
  "burner-tray": "part-removed",
  "igniter-plug": "lead-lifted",
  "spark-lead": "part-removed",
  "thermocouple-nut": "lead-lifted",
  "gas-valve-leads": "lead-lifted",
  "flame-sensor-wire": "lead-lifted",
  "inlet-tap": "gas-port-opened",
  "manifold-tap": "gas-port-opened",
  "orifice-holders": "gas-joint-opened",
  "static-test-plugs": "part-removed",
  "blower-capacitor-leads": "lead-lifted",
  "flue-test-plug": "part-removed",
  "valve-inlet-joint": "gas-joint-opened",
  "valve-outlet-joint": "gas-joint-opened",
  "flame-sensor": "part-removed",
  igniter: "part-removed",
};

const out = Object.fromEntries(
  Object.entries(outBy).map(([thing, kind]) => [thing, `${what[thing as OpenedThing]} ${state[kind]}`]),
) as Readonly<Record<OpenedThing, string>>;

export const putBack: PutBackWords = {
  what,
  out,
  state,
  act: {
    "cover-removed": "Back on",
    "gas-port-opened": "Plug in",
    "gas-joint-opened": "Made up",
    "part-removed": "Fitted",
    "tube-pulled": "Back on",
    "meter-in-series": "Meter out",
    "lead-lifted": "Back on",
    "jumper-fitted": "Taken off",
    "valve-closed": "Open again",
  },
  powerOffFirst: "Power off first.",
  endCallFirst: "End the call first.",
};
