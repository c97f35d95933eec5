import type { UnitProfile } from "@emberladder/furnace";

/** Customers, units and calls of the demo. All invented: nothing here was measured on a real unit. */

export interface DemoCall {
  /** Names the rows of this call for ever; ids follow from it. */
  slug: string;
  company: "tamarack-pike" | "bluestem";
  customer: { firstName: string; lastName: string | null; email: string; phone: string };
  site: { address: string; town: string; accessNote: string | null };
  unitName: string;
  profile: UnitProfile;
  complaint: string;
  /** Who has it, by the start of an e-mail; null: nobody yet. */
  assignedTo: string | null;
  /** Hours after midnight, company time, on the day of seeding. */
  hour: number;
}

const boardUnit = (
  profile: Pick<UnitProfile, "codes"> & Partial<Omit<UnitProfile, "codes">>,
): UnitProfile => ({
  altitudeFt: 4300,
  chain: {
    arrangement: "board-loops",
    order: ["fuse", "thermostat", "limit", "rollout", "pressure-switch"],
  },
  bands: [],
  options: {},
  timings: {},
  plate: {},
  ...profile,
});

const TIMINGS = {
  prepurgeS: 20,
  trialS: 5,
  blowerOnDelayS: 30,
  blowerOffDelayS: 120,
  postPurgeS: 10,
  tries: 3,
};
const PLATE = {
  riseMinF: 35,
  riseMaxF: 65,
  staticMaxInwc: 0.5,
  ratedVolts: 120,
  phase: 1 as const,
  transformerVa: 40,
  fuseA: 3,
  igniterVolts: 120 as const,
  goodUa: 2,
  dropOutUa: 0.4,
  heatingValueBtuPerFt3: 900,
};

const upflow = boardUnit({
  codes: { ignition: "HSI", draft: "IDP", staging: "1S", location: "IND", control: "IFC", fuel: "NG" },
  options: { "psc-blower": true, "lv-fuse": true, "multi-burner": true, "gas-meter": true, altitude: true },
  plate: {
    ...PLATE,
    inputBtuh: 80_000,
    outputBtuh: 64_000,
    efficiencyPct: 80,
    manifoldHighInwc: 3.5,
    inletMinInwc: 4.5,
    inletMaxInwc: 10.5,
    switchMakeInwc: 0.52,
    igniterKind: "SiN",
    igniterOhmMin: 44,
    igniterOhmMax: 66,
    blowerFlaA: 7.6,
  },
  timings: { ...TIMINGS, warmUpS: 20 },
});

export const demoCalls: readonly DemoCall[] = [
  {
    slug: "brennock",
    company: "tamarack-pike",
    customer: {
      firstName: "Odalys",
      lastName: "Brennock",
      email: "odalys@brennock.example",
      phone: "555-0101",
    },
    site: { address: "18 Kiln Row", town: "Harrow Falls", accessNote: "Basement door on the alley side." },
    unitName: "Basement furnace, upflow",
    profile: upflow,
    complaint:
      "Flames show for a moment and it shuts itself down, over and over since last night; then a blinking light.",
    assignedTo: "ibby",
    hour: 8.5,
  },
  {
    slug: "vantongeren",
    company: "tamarack-pike",
    customer: {
      firstName: "Bram",
      lastName: "Vantongeren",
      email: "bram@vantongeren.example",
      phone: "555-0121",
    },
    site: { address: "2 Cooper's Yard", town: "Harrow Falls", accessNote: null },
    unitName: "Furnace under the stairs",
    profile: { ...upflow, plate: { ...upflow.plate, inputBtuh: 60_000, outputBtuh: 48_000 } },
    complaint: "The little fan runs, then nothing. No flame at all since this morning.",
    assignedTo: "ibby",
    hour: 10.5,
  },
  {
    slug: "estcourt",
    company: "tamarack-pike",
    customer: {
      firstName: "Philippa",
      lastName: "Estcourt",
      email: "philippa@estcourt.example",
      phone: "555-0122",
    },
    site: { address: "77 Ropewalk", town: "Harrow Falls", accessNote: "Ring twice." },
    unitName: "Utility closet furnace",
    profile: {
      ...upflow,
      options: { ...upflow.options, "stat-battery": true },
    },
    complaint: "House is cold and the thermostat shows nothing.",
    assignedTo: "ibby",
    hour: 13,
  },
  {
    slug: "winslade",
    company: "tamarack-pike",
    customer: {
      firstName: "Thaddeus",
      lastName: "Winslade",
      email: "thaddeus@winslade.example",
      phone: "555-0106",
    },
    site: { address: "92 Orchard Bench Road", town: "Harrow Falls", accessNote: "Attic hatch in the hall." },
    unitName: "Attic furnace, horizontal",
    profile: boardUnit({
      codes: { ignition: "HSI", draft: "IDP", staging: "2S", location: "ATT", control: "IFC", fuel: "NG" },
      options: { "psc-blower": true, "lv-fuse": true, "multi-burner": true, altitude: true },
      chain: {
        arrangement: "board-loops",
        order: ["fuse", "thermostat", "limit", "rollout", "pressure-switch", "pressure-switch-2"],
      },
      plate: {
        ...PLATE,
        inputBtuh: 90_000,
        lowInputBtuh: 63_000,
        outputBtuh: 72_000,
        efficiencyPct: 80,
        manifoldHighInwc: 3.5,
        manifoldLowInwc: 1.7,
        inletMinInwc: 4.5,
        inletMaxInwc: 10.5,
        switchMakeInwc: 0.36,
        highSwitchMakeInwc: 0.64,
        igniterKind: "SiC",
        igniterOhmMin: 40,
        igniterOhmMax: 90,
        blowerFlaA: 9.2,
      },
      timings: { ...TIMINGS, warmUpS: 30 },
    }),
    complaint:
      "Upstairs furnace dead. Our handyman pushed a red reset in there ten days ago and it worked until this morning.",
    assignedTo: "ransom",
    hour: 14.5,
  },
  {
    slug: "quill",
    company: "tamarack-pike",
    customer: {
      firstName: "Dorothea",
      lastName: "Quill",
      email: "dorothea@quill.example",
      phone: "555-0123",
    },
    site: { address: "9 Tannery Steps", town: "Harrow Falls", accessNote: null },
    unitName: "Cellar furnace",
    profile: upflow,
    complaint: "No heat upstairs, and it clicks.",
    assignedTo: null,
    hour: 16,
  },
  {
    slug: "renfrew",
    company: "bluestem",
    customer: {
      firstName: "Isolde",
      lastName: "Renfrew",
      email: "isolde@renfrew.example",
      phone: "555-0110",
    },
    site: { address: "5 Saddle Creek Road, Dry Fork", town: "near Harrow Falls", accessNote: null },
    unitName: "Attic furnace, horizontal",
    profile: boardUnit({
      codes: { ignition: "HSI", draft: "IDP", staging: "1S", location: "ATT", control: "IFC", fuel: "LP" },
      options: { "psc-blower": true, "lv-fuse": true, "multi-burner": true, altitude: true },
      plate: {
        ...PLATE,
        inputBtuh: 70_000,
        outputBtuh: 56_000,
        efficiencyPct: 80,
        manifoldHighInwc: 10,
        inletMinInwc: 11,
        inletMaxInwc: 13,
        switchMakeInwc: 0.44,
        igniterKind: "SiC",
        igniterOhmMin: 40,
        igniterOhmMax: 90,
        blowerFlaA: 7.2,
        heatingValueBtuPerFt3: 2516,
      },
      timings: { ...TIMINGS, warmUpS: 17 },
    }),
    complaint:
      "Warms up, then blows lukewarm, then warms up again. The renters did not know there was a filter up there.",
    assignedTo: "sunniva",
    hour: 9,
  },
];
