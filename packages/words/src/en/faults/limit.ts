import type { FaultId } from "@emberladder/furnace";
import type { FaultWords } from "./fault-words.ts";

export const limit = {
  "limit-open-filter": {
    name: "Dirty filter opens the limit",
    plain: "The air filter was so dirty that the furnace overheated and shut itself off.",
    what: "Air starved by the filter: rise too high, limit opens.",
  },
  "limit-open-dampers": {
    name: "Closed registers open the limit",
    plain: "Too many registers or dampers were closed, so the furnace overheated.",
    what: "Registers or zone dampers shut: high static, limit opens.",
  },
  "limit-open-coil-plugged": {
    name: "Plugged cooling coil opens the limit",
    plain: "The cooling coil above the furnace was clogged, so too little air got through.",
    what: "Coil dirty or iced: high drop across it, limit opens.",
  },
  "limit-open-overfire": {
    name: "Overfiring opens the limit",
    plain: "The burner was set too strong, so the furnace overheated.",
    what: "Input above the plate: rise too high, limit opens.",
    caution: "High CO is likely.",
  },
  "limit-failed-open": {
    name: "Limit failed open",
    plain: "The overheat safety switch had failed and kept the furnace off.",
    what: "Open cold with airflow right.",
    caution: "Never jumper a limit.",
  },
  "aux-limit-tripped": {
    name: "Auxiliary limit tripped",
    plain: "A second overheat safety switch had tripped.",
    what: "Reverse heat after a blower stop, or a blocked return.",
  },
  "rollout-blocked-flue": {
    name: "Rollout: blocked flue",
    plain: "The flue was blocked and pushed flame out of the burner box. A safety switch shut the unit down.",
    what: "Blocked vent or exchanger pushes flame out.",
    caution: "CO. Rollout rule before any reset.",
  },
  "rollout-cracked-exchanger": {
    name: "Rollout: cracked heat exchanger",
    plain:
      "The metal that keeps flame and house air apart has opened, and the fan blew flame out of the box.",
    what: "Blower air through a breach blows flame out.",
    caution: "Shut off and tag.",
  },
  "rollout-dirty-burners": {
    name: "Rollout: dirty burners",
    plain: "Dirty burners made the flame lick out of the burner box, and a safety switch shut the unit down.",
    what: "Lint or rust chokes the burners: lazy flame rolls out.",
  },
  "rollout-low-inlet": {
    name: "Rollout: low gas pressure",
    plain: "Gas pressure was too low, the flame lit late and licked out of the burner box.",
    what: "Low inlet or late light: flame rolls out.",
  },
  "rollout-failed-open": {
    name: "Rollout switch failed",
    plain: "A flame safety switch had failed without any flame outside the box.",
    what: "Open cold with the button in; every cause disproved.",
    caution: "Only after the full search for a cause.",
  },
  "spill-tripped": {
    name: "Spill switch tripped",
    plain: "Exhaust gas was coming back into the room, and a safety switch shut the unit down.",
    what: "Hot products spilled at the draft hood.",
    caution: "CO. Spill rule before any reset.",
  },
  "vent-damper-stuck": {
    name: "Vent damper stuck",
    plain: "A flap in the vent did not open, so the burner was not allowed to start.",
    what: "Damper shut, or its end switch open.",
    caution: "Never force it open. No jumper.",
  },
  "fusible-link-open": {
    name: "Thermal link open",
    plain: "A one-time heat safety near the burner had opened.",
    what: "Link open near the burner box: it got hot there.",
    caution: "Find the heat before the new link.",
  },
} as const satisfies Partial<Record<FaultId, FaultWords>>;
