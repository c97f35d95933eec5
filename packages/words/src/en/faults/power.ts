import type { FaultId } from "@emberladder/furnace";
import type { FaultWords } from "./fault-words.ts";

export const power = {
  "no-line-power-breaker": {
    name: "Breaker or fuse open",
    plain: "The circuit breaker for your heating had switched off, so the unit had no power.",
    what: "Branch circuit open: no volts on the load side of the breaker.",
    caution: "Find why it tripped first. Reset once, never twice on a short.",
  },
  "gfci-tripped": {
    name: "GFCI tripped",
    plain: "A safety outlet that feeds the unit had switched it off.",
    what: "Tripped or failed GFCI: volts to it, none past it.",
    caution: "Find the leak to ground. Reset once only.",
  },
  "service-switch-off": {
    name: "Service switch off",
    plain: "The power switch at the unit was off.",
    what: "Switched off by mistake: volts in, none out.",
    caution: "Ask who and why before you switch on.",
  },
  "disconnect-off": {
    name: "Disconnect out or fuse blown",
    plain: "The main switch beside the rooftop unit was out, or one of its fuses had blown.",
    what: "Disconnect pulled, or a fuse open on one leg or more.",
    caution: "Live parts at 208 to 480 V behind the cover.",
  },
  "phase-loss": {
    name: "One supply leg lost",
    plain: "One of the three power lines to the unit was missing.",
    what: "One leg of the supply lost: monitor holds off, or motors hum.",
    caution: "Motors burn out on two legs. Keep them off.",
  },
  "low-line-voltage": {
    name: "Low line voltage",
    plain: "The electrical supply to the unit was too weak for it to run properly.",
    what: "Supply sags under load: relays chatter, weak inducer, weak glow.",
  },
  "door-switch-open": {
    name: "Door panel not pressing its switch",
    plain: "The furnace door was not fully on, so its safety switch kept the furnace off.",
    what: "Panel missing, bent or not seated: the switch works by hand.",
    caution: "Never tape a door switch.",
  },
  "door-switch-failed": {
    name: "Door switch failed",
    plain: "The safety switch behind the furnace door had worn out.",
    what: "Contact open with the plunger fully in.",
    caution: "Never tape a door switch.",
  },
  "transformer-failed": {
    name: "Transformer failed",
    plain: "The small transformer that powers the furnace's controls had burned out.",
    what: "Winding open: line volts in, nothing out.",
    caution: "Look for a short before the new one goes in.",
  },
  "transformer-reset-tripped": {
    name: "Transformer button popped",
    plain: "The controls' transformer had tripped its own reset button.",
    what: "Its breaker has opened: line volts in, none out.",
    caution: "Find the short first. Press once.",
  },
  "transformer-wrong-tap": {
    name: "Transformer on the wrong tap",
    plain: "The controls' transformer was connected for a different supply voltage.",
    what: "Primary tap does not match the line: low or high 24 V.",
  },
  "transformer-overloaded": {
    name: "Transformer overloaded",
    plain: "More was connected to the control transformer than it can supply.",
    what: "Load above its rating: 24 V sags when something pulls in.",
  },
  "lv-fuse-blown": {
    name: "Control fuse blown",
    plain: "The small fuse that protects the furnace's controls had blown.",
    what: "Board fuse open: 24 V in, none out.",
    caution: "Never fit a bigger fuse.",
  },
  "tstat-wire-short": {
    name: "Thermostat cable shorted",
    plain: "The thermostat's cable was damaged and its wires were touching.",
    what: "R touches another conductor or the chassis.",
  },
  "tstat-wire-open": {
    name: "Thermostat wire open",
    plain: "A wire between your thermostat and the heating unit was broken.",
    what: "R or W broken or loose between thermostat and unit.",
  },
  "common-wire-open": {
    name: "Common wire open",
    plain: "The wire that powers your thermostat was broken.",
    what: "C lost between unit and thermostat: blank screen, R live at the unit.",
  },
  "tstat-dead-batteries": {
    name: "Thermostat batteries dead",
    plain: "The batteries in your thermostat were empty, so it could not ask for heat.",
    what: "Screen blank or low-battery icon: no call for heat.",
  },
  "tstat-wrong-setting": {
    name: "Thermostat set wrong",
    plain: "The thermostat was set so that it did not call for heat.",
    what: "Mode, hold, schedule or system type keeps W off.",
  },
  "tstat-failed": {
    name: "Thermostat failed",
    plain: "The thermostat no longer switched the heating on.",
    what: "R is there, it shows a call, and W stays dead.",
  },
  "tstat-power-steal": {
    name: "Thermostat short of power",
    plain: "The thermostat had too few wires and switched the heating on and off by itself.",
    what: "No common wire: the call comes and goes as it steals power.",
  },
  "tstat-anticipator-misset": {
    name: "Anticipator set wrong",
    plain: "An adjustment inside the thermostat made the heating stop too early.",
    what: "Dial does not match W current, or the resistor is open.",
  },
  "overflow-switch-open": {
    name: "Overflow switch open",
    plain: "Water had collected in the drain pan, so a safety float switched the unit off.",
    what: "Float open in R or W: pan or drain is full.",
    caution: "Water near live parts.",
  },
  "bas-heat-lockout": {
    name: "Heat locked out by building control",
    plain: "The building's control system was not letting the unit heat.",
    what: "Schedule, outdoor lockout or mode holds heat off.",
    caution: "Change nothing without the owner's leave.",
  },
  "zone-panel-no-w": {
    name: "Zone panel passes no call",
    plain: "The zone control panel did not pass the call for heat on to the unit.",
    what: "Zone calls, W comes in and does not go out.",
  },
  "smoke-interlock-open": {
    name: "Smoke contact open",
    plain: "The smoke detector's contact was holding the unit off.",
    what: "Detector tripped or faulted: control circuit open.",
    caution: "Never jumper it. Only an authorised person resets it.",
  },
  "ignition-lockout-latched": {
    name: "Control in lockout",
    plain: "The furnace's control had shut itself down after failed tries to light.",
    what: "Locked out by earlier failed tries; the cause may still be there.",
    caution: "Repeated resets can fill the exchanger with gas.",
  },
  "melted-wire": {
    name: "Wire melted",
    plain: "Heat had melted a wire inside the unit.",
    what: "Insulation melted on burner, flue or limit: open or short.",
    caution: "It may hide a rollout. Find where the heat came from.",
  },
  "rodent-wire": {
    name: "Wire chewed",
    plain: "Animals had chewed through a wire.",
    what: "Chewed conductor: what it feeds is dead.",
  },
  "reversed-polarity": {
    name: "Line and neutral swapped",
    plain: "The power supply to the unit was connected the wrong way round.",
    what: "L and N swapped: flame is not accepted, or the control waits.",
    caution: "Shock hazard.",
  },
  "poor-ground": {
    name: "Poor ground",
    plain: "The unit's ground connection was poor, so it could not sense its own flame.",
    what: "Ground wire loose, rusted or on paint: weak flame signal.",
  },
  "board-dead": {
    name: "Board dead",
    plain: "The furnace's control board had failed.",
    what: "24 V in, fuse sound, no response.",
    caution: "Check for a short before the new one goes in.",
  },
  "board-relay-inducer": {
    name: "Board inducer relay failed",
    plain: "A switch on the control board no longer started the exhaust fan.",
    what: "Call there, safeties closed, no volts to the inducer.",
  },
  "inducer-relay-failed": {
    name: "Inducer relay failed",
    plain: "The relay that starts the exhaust fan had failed.",
    what: "Coil has 24 V, nothing out to the inducer.",
    caution: "Line voltage at the contacts.",
  },
  "board-relay-igniter": {
    name: "Board igniter relay failed",
    plain: "A switch on the control board no longer powered the igniter.",
    what: "No volts from the board in the igniter's window.",
  },
  "board-relay-gas": {
    name: "Board gas relay failed",
    plain: "A switch on the control board no longer opened the gas valve.",
    what: "Igniter glows, no 24 V to the valve.",
  },
  "board-relay-blower": {
    name: "Board blower relay failed",
    plain: "A switch on the control board no longer started the main fan.",
    what: "Burner lights, no volts to the blower, limit opens.",
  },
  "blower-contactor-failed": {
    name: "Blower contactor failed",
    plain: "The switch that starts the rooftop unit's main fan had failed.",
    what: "Coil has 24 V, nothing out to the motor.",
    caution: "208 to 480 V on the contacts.",
  },
  "board-solder-crack": {
    name: "Cracked joint on the board",
    plain: "The control board had a cracked connection that came and went.",
    what: "Works when tapped or cold: a cracked joint.",
  },
  "board-connector-corroded": {
    name: "Plug corroded",
    plain: "A plug on the control board had corroded and lost contact.",
    what: "Loose or oxidised pin: volts drop across it.",
  },
  "board-water": {
    name: "Water on the board",
    plain: "Water had got onto the control board.",
    what: "Wet board: several faults at once.",
    caution: "Wet and live: power off first.",
  },
  "lost-communication": {
    name: "Data link lost",
    plain: "Parts of the system could no longer talk to each other over their data wires.",
    what: "Board has lost thermostat, blower or gas control on its wires.",
  },
  "setup-plug-missing": {
    name: "Set-up plug missing",
    plain: "A small plug that tells the control board which furnace it is in was missing.",
    what: "Model plug missing, loose or of another unit.",
    caution: "The wrong plug means wrong input and CO.",
  },
  "module-failed": {
    name: "Ignition module failed",
    plain: "The ignition control had failed.",
    what: "24 V in, good ground, no spark and no pilot volts.",
  },
  "valve-mount-control-failed": {
    name: "Gas control electronics dead",
    plain: "The electronics on the gas control had failed.",
    what: "24 V in, no igniter output, no click.",
    caution: "Gas joints open: leak check after.",
  },
} as const satisfies Partial<Record<FaultId, FaultWords>>;
