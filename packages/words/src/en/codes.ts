import type { Control, Draft, Fuel, Ignition, Location, Staging } from "@emberladder/furnace";

/** Names of the six codes of a unit, and what each axis is called. */
export const codes: {
  readonly axes: Readonly<Record<"ignition" | "draft" | "staging" | "location" | "control" | "fuel", string>>;
  readonly ignition: Readonly<Record<Ignition, string>>;
  readonly draft: Readonly<Record<Draft, string>>;
  readonly staging: Readonly<Record<Staging, string>>;
  readonly location: Readonly<Record<Location, string>>;
  readonly control: Readonly<Record<Control, string>>;
  readonly fuel: Readonly<Record<Fuel, string>>;
} = {
  axes: {
    ignition: "Ignition",
    draft: "Draft",
    staging: "Stages",
    location: "Location",
    control: "Control",
    fuel: "Gas",
  },
  ignition: {
    SP: "Standing pilot",
    IPS: "Pilot lit by spark",
    IPH: "Pilot lit by hot surface",
    HSI: "Hot surface",
    DSI: "Direct spark",
  },
  draft: {
    ND: "Natural draft",
    IDP: "Induced, pressure switch",
    IDC: "Induced, centrifugal switch",
    CON: "Condensing",
  },
  staging: { "1S": "One stage", "2S": "Two stages", MOD: "Modulating" },
  location: { IND: "Indoors", ATT: "Attic or crawl space", RTU: "Rooftop" },
  control: {
    IFC: "Integrated board",
    "MOD-S": "Separate module",
    VMC: "Control on the gas valve",
    CV: "Conventional valve",
  },
  fuel: { NG: "Natural gas", LP: "Propane" },
};
