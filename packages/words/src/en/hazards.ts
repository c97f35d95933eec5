import type { Hazard } from "@emberladder/furnace";

/** The line shown above a check for each hazard. */
export const hazards: Readonly<Record<Hazard, string>> = {
  LV: "24 V live. One slip blows the fuse.",
  HVAC: "Line voltage live. Insulated probes, one hand.",
  GAS: "Gas. No flame, know the shutoff.",
  HOT: "Hot parts. Wait, or gloves.",
  FALL: "Fall. Look at the edge, hatch and ladder.",
  CO: "Carbon monoxide. Meter on you.",
  ROT: "Turning parts. Sleeves and fingers clear.",
  "HV-SPK": "High voltage at the spark. Hands off the lead.",
  CAP: "Stored charge. Discharge through a resistor.",
  CUT: "Sharp metal. Gloves on.",
  WATER: "Water near live parts.",
};
