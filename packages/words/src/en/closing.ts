import type { ClosingCheckId, ClosingNotice, ColdItem, TouchRow } from "@emberladder/furnace";

/** Words of a closing check: what to do, and what is right. */
export interface ClosingWords {
  readonly title: string;
  readonly do: string;
  readonly right: string;
}

/** Words of the closing checks. */
export const closing: Readonly<Record<ClosingCheckId, ClosingWords>> = {
  "close-cycles": {
    title: "Light it again",
    do: "Call for heat and count lights at the first try. Watch one full call.",
    right: "Lit every time at the first try",
  },
  "close-flame": {
    title: "Look at the flame",
    do: "Through the sight glass, before and after the blower starts.",
    right: "Blue, steady, unchanged by the blower",
  },
  "close-cycle-end": {
    title: "Watch the call end",
    do: "Thermostat satisfied. Time until the flame is out.",
    right: "Flame out in 2 s, purge and blower finish",
  },
  "close-room-co": {
    title: "Read room CO after the burn",
    do: "In the room and in the supply air.",
    right: "9 ppm or less, and no rise",
  },
  "close-panels": {
    title: "Panels back on",
    do: "Panels, screws, sight glass, gaskets, filter, drain.",
    right: "All on",
  },
  "close-tstat": {
    title: "Thermostat back",
    do: "Back at the customer's setting, batteries and date right.",
    right: "Back at the setting",
  },
  "close-jumpers": {
    title: "Put-back list",
    do: "Everything lifted, fitted or opened is back.",
    right: "Nothing outstanding",
  },
  "close-docs": {
    title: "Record",
    do: "Cause, readings, parts and advice, from the record.",
    right: "Complete",
  },
  "close-leak-up": {
    title: "Leak test before the valve",
    do: "Gas on. Soap 60 s and detector at each opened joint.",
    right: "No bubble, 0 % LEL",
  },
  "close-leak-down": {
    title: "Leak test after the valve",
    do: "Burner or pilot lit. Soap each opened joint 60 s.",
    right: "No bubble",
  },
  "close-restore": {
    title: "System leak test",
    do: "Dial or gauge on the whole system. Then relight every pilot.",
    right: "No movement, every pilot seen or tagged",
  },
  "close-inlet-static": { title: "Inlet pressure, unit off", do: "Hose on the inlet tap.", right: "In band" },
  "close-inlet-run": {
    title: "Inlet pressure, running",
    do: "Other gas appliances running where you can.",
    right: "In band, drop 1.0 in. or less",
  },
  "close-manifold": {
    title: "Manifold pressure",
    do: "Running, both stages.",
    right: "In the good band, or the plate's",
  },
  "close-input": {
    title: "Clock the input",
    do: "Meter, this appliance alone. Propane without a meter: computed.",
    right: "95 to 100 % of the plate, derated",
  },
  "close-rise": {
    title: "Temperature rise",
    do: "Supply less return, ten minutes in. Airflow work: fifteen.",
    right: "Within the plate, no trip",
  },
  "close-sensor": {
    title: "Flame proof",
    do: "Flame signal in the burn. Standing pilot: millivolts and drop-out.",
    right: "1.0 µA or more, and twice the drop-out",
  },
  "close-co": {
    title: "Flue CO",
    do: "Air-free, steady, after five minutes.",
    right: "100 ppm or less, not rising",
  },
  "close-draft": {
    title: "Draft proof",
    do: "Suction at each switch, or draft and spillage at the hood.",
    right: "Closes-at plus 0.10 in., or no spill by 5 min",
  },
  "close-draft-opens": {
    title: "Draft switch opens",
    do: "Power off, inducer unplugged, gas shut, power on. Call for 60 s.",
    right: "Nothing starts for 60 s",
  },
  "close-safeties": {
    title: "Safeties act",
    do: "Each one replaced or rewired is seen to act.",
    right: "Acts, wires back",
  },
  "close-cold": {
    title: "People in the cold",
    do: "Ask and tell, every item.",
    right: "Every item answered",
  },
};

/** What is asked of the people where a unit is left without heat. */
export const coldItems: Readonly<Record<ColdItem, string>> = {
  "vulnerable-people": "Anyone old, ill or an infant is known",
  "safe-heat": "Safe heat is arranged",
  "no-oven-or-grill": "No oven or grill for heat",
  "no-unvented-heater": "No unvented heater",
  "freeze-warning": "Freeze warning is given",
  "co-alarm": "CO alarm works",
};

/** What a closing check may ask for besides pass or fail. */
export const closingNotices: Readonly<Record<ClosingNotice, string>> = {
  "action-required": "Find the source and tell the occupant.",
  "stop-rule-co-30": "30 ppm or more: the CO rule starts.",
  "supervisor-sees": "Above 100 ppm: the supervisor sees it.",
  "cannot-close-as-fixed": "Above 200 ppm: it cannot close as fixed.",
  "shut-off": "Above 400 ppm or rising: shut it off.",
};

/** What was touched, and so why a closing check is asked for. */
export const touched: Readonly<Record<TouchRow | "always" | "left-off", string>> = {
  always: "Left in service",
  setting: "Setting or switch touched",
  airflow: "Airflow touched",
  flame: "Flame or ignition touched",
  draft: "Draft touched",
  control: "Control touched",
  "gas-joint": "Gas joint opened",
  "gas-train": "Gas train touched",
  safety: "Safety touched",
  restored: "Gas restored",
  "left-off": "Left without heat",
};
