import type { AtUnitFind, DoorField, DoorQuestionId } from "@emberladder/furnace";

/** Words of the door: its questions, their fields, and what may be found at the unit. */
export const door: {
  readonly questions: Readonly<Record<DoorQuestionId, string>>;
  readonly asks: Readonly<Record<DoorField, string>>;
  readonly finds: Readonly<Record<AtUnitFind, string>>;
  readonly allClear: string;
} = {
  questions: {
    people: "People",
    smell: "Gas",
    "way-in": "Way in",
    "at-unit": "At the unit",
  },
  asks: {
    unwell: "Anyone unwell?",
    alarm: "CO alarm sounding?",
    coPpm: "CO, meter zeroed outdoors",
    smell: "Smell of gas?",
    lelPct: "% LEL: floor for propane, ceiling for natural gas",
    safe: "Safe way in: ladder, edge, hatch, weather, light, footing?",
    edgeFt: "Feet from the edge where you will work",
    parapetIn: "Parapet height, inches",
    hatchGuarded: "Hatch guarded?",
    found: "Anything at the unit?",
    cabinetV: "Cabinet to earth, low impedance",
  },
  finds: {
    soot: "Soot, scorch or melted wiring",
    "under-water": "Controls have been under water",
    "wet-control": "Wet control near live parts",
    "old-wrap": "Old wrap or vermiculite",
    "cannot-lock": "Gas or power cannot be shut and locked",
  },
  allClear: "Nobody unwell, no alarm, no smell, safe way in",
};
