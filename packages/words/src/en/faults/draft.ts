import type { FaultId } from "@emberladder/furnace";
import type { FaultWords } from "./fault-words.ts";

export const draft = {
  "inducer-motor-failed": {
    name: "Inducer motor failed",
    plain: "The fan that clears exhaust from the furnace had failed.",
    what: "Rated volts at the inducer, no spin: winding open.",
    caution: "Turning parts.",
  },
  "inducer-seized": {
    name: "Inducer seized",
    plain: "The fan that clears exhaust had seized.",
    what: "Hums hot at locked current; wheel stiff.",
    caution: "Hot motor.",
  },
  "inducer-capacitor": {
    name: "Inducer capacitor weak",
    plain: "A part that starts the exhaust fan had worn out.",
    what: "Capacitor low: slow start or hum.",
    caution: "Stored charge: discharge first.",
  },
  "inducer-wheel-loose": {
    name: "Inducer wheel loose or eaten",
    plain: "The exhaust fan's wheel had come loose or rusted, so it moved too little.",
    what: "Shaft turns, suction stays low.",
    caution: "With a centrifugal switch it still lights: rollout, CO.",
  },
  "vent-blocked": {
    name: "Vent blocked",
    plain: "The vent that carries exhaust outside was blocked.",
    what: "Debris, collapse or cap blocks the vent.",
    caution: "CO.",
  },
  "vent-nest": {
    name: "Nest in the vent",
    plain: "A nest was blocking the vent outside.",
    what: "Nest or insects in the termination.",
    caution: "CO.",
  },
  "vent-disconnected": {
    name: "Vent apart",
    plain: "The vent pipe had come apart, so exhaust could get into the building.",
    what: "Joint apart or pipe rusted through.",
    caution: "CO. Shut off until it is whole again.",
  },
  "combustion-air-lacking": {
    name: "Too little combustion air",
    plain: "The room around the furnace did not let in enough air for the burner.",
    what: "Tight closet starves the burner: passes with the door open.",
    caution: "CO, spill, rollout. Never leave a door ajar as a cure.",
  },
  "vent-ice-snow": {
    name: "Ice or snow on the vent",
    plain: "Snow or ice was covering the vent outside.",
    what: "Exhaust or intake iced over.",
    caution: "CO.",
  },
  "intake-blocked": {
    name: "Intake blocked",
    plain: "The pipe that brings the burner fresh air was blocked.",
    what: "Leaves, lint or paint on the intake screen.",
  },
  "vent-too-long": {
    name: "Vent too long or sagging",
    plain: "The vent pipe was too long, too small, or held water in a sag.",
    what: "Equivalent length, size or sag: suction only just enough.",
    caution: "A permit may be needed.",
  },
  "vent-wind": {
    name: "Wind at the vent",
    plain: "Wind at the vent outside kept switching the furnace off.",
    what: "Gusts open the pressure switch.",
  },
  "pressure-tube-cracked": {
    name: "Pressure tube cracked or off",
    plain: "A small hose that proves the exhaust fan works was split or off.",
    what: "Suction good at the port, none at the switch.",
  },
  "pressure-tube-water": {
    name: "Water in the pressure tube",
    plain: "Water was sitting in a small hose, so a safety switch could not close.",
    what: "Water slug or low loop in the hose.",
  },
  "pressure-port-plugged": {
    name: "Pressure port plugged",
    plain: "A small opening that proves the exhaust fan works was clogged.",
    what: "Rust or a spider in the port: clears when probed.",
  },
  "pressure-switch-failed-open": {
    name: "Pressure switch failed open",
    plain: "The switch that proves the exhaust fan works had failed.",
    what: "Suction well past closes-at, still open.",
    caution: "Same rating only.",
  },
  "pressure-switch-stuck-closed": {
    name: "Pressure switch stuck closed",
    plain: "The switch that proves the exhaust fan works was stuck.",
    what: "Closed before start: control waits, or lights with no draft.",
    caution: "Rollout, CO. Prove the new one opens.",
  },
  "pressure-sensor-failed": {
    name: "Pressure sensor failed",
    plain: "The electronic sensor that watches the exhaust fan had failed.",
    what: "Gauge is right, the control says otherwise.",
  },
  "high-stage-switch-open": {
    name: "High-stage switch stays open",
    plain: "The furnace could only run on low heat.",
    what: "High switch does not close on high with suction there.",
  },
  "collector-gasket-leak": {
    name: "Collector gasket leaks",
    plain: "A worn seal let air in and weakened the exhaust draft.",
    what: "Low suction at port and switch alike; smoke drawn in.",
  },
  "trap-plugged": {
    name: "Condensate trap plugged",
    plain: "The drain trap was clogged, so water backed up and stopped the furnace.",
    what: "Sludge in the trap: water holds the pressure switch open.",
    caution: "Acid water.",
  },
  "drain-frozen": {
    name: "Condensate drain frozen",
    plain: "The furnace's water drain had frozen.",
    what: "Ice in the line: water backs up as with a plugged trap.",
  },
  "trap-dry": {
    name: "Trap dry",
    plain: "The drain trap was empty and let air in.",
    what: "Trap not primed: the switch flutters on the first start.",
    caution: "CO can leave at the drain.",
  },
  "condensate-pump-failed": {
    name: "Condensate pump failed",
    plain: "The pump that carries away the furnace's water had stopped.",
    what: "Reservoir full: float opens W, or water backs up.",
  },
  "secondary-hx-plugged": {
    name: "Secondary exchanger plugged",
    plain: "The part of the furnace that cools the exhaust was clogged.",
    what: "Soot, scale or rust: abnormal suction at the cold header.",
    caution: "CO.",
  },
  "centrifugal-stuck-open": {
    name: "Centrifugal switch stays open",
    plain: "The switch that proves the exhaust fan's speed did not close.",
    what: "Full speed, 24 V in, none out.",
  },
  "centrifugal-stuck-closed": {
    name: "Centrifugal switch stuck closed",
    plain: "The switch that proves the exhaust fan's speed was stuck.",
    what: "Closed with the shaft still.",
    caution: "Rollout, CO. Prove the new one opens.",
  },
} as const satisfies Partial<Record<FaultId, FaultWords>>;
