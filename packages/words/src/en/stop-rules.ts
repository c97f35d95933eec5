import type { StopRuleId } from "@emberladder/furnace";

/** Words of a stop rule: its title, the one line read first, and its acts in order. */
export interface StopRuleWords {
  readonly title: string;
  readonly line: string;
  readonly acts: Readonly<Record<string, string>>;
}

/** Words of the stop rules. */
export const stopRules: Readonly<Record<StopRuleId, StopRuleWords>> = {
  co: {
    title: "Someone is unwell, or CO at 70 or more",
    line: "Everyone out now. Call 911. Do not check anything first.",
    acts: {
      "everyone-out": "Everyone is out",
      "called-emergency": "911 is called",
      "cleared-by": "Who cleared the building, and when",
    },
  },
  "co-alarm": {
    title: "A CO alarm is sounding",
    line: "Everyone out. Go in only with your meter on.",
    acts: {
      "everyone-out": "Everyone is out",
      "meter-on": "My CO meter is on",
      "read-room": "CO in the room",
      "alarm-explained": "What set the alarm off",
    },
  },
  "co-30": {
    title: "CO at 30 to 69",
    line: "Appliances off, people out, air it, read again from outside in.",
    acts: {
      "appliances-off": "Appliances are off",
      "people-out": "People are out",
      aired: "Building is aired",
      "read-again": "CO, read again from outside in",
      "source-found": "Where the CO came from",
      "read-before-run": "CO before the one supervised run, below 10",
    },
  },
  "gas-odor": {
    title: "Gas smell",
    line: "Leave now. Touch no switch. The rest is done outside.",
    acts: {
      outside: "I am outside",
      "everyone-out": "Everyone is out",
      "called-gas-supplier": "911 or the gas supplier is called, from outside",
      "cleared-by": "Who cleared the building, and when",
    },
  },
  "lel-1": {
    title: "Gas reads 1 % LEL or more",
    line: "No call for heat until it is found, cured and reads zero.",
    acts: {
      "no-call": "Thermostat is down, no call",
      "found-and-cured": "Where it leaked, and what was done",
      "reads-zero": "% LEL again, zero",
    },
  },
  "raw-gas": {
    title: "Gas flows and nothing lights it",
    line: "End the call. Shut the gas. Five minutes, then 0 % LEL.",
    acts: {
      "call-ended": "Call is ended",
      "gas-shut": "Gas is shut",
      "wait-5-min": "Wait five minutes",
      "lel-burner-box": "% LEL in the burner box, zero",
      "lel-vent": "% LEL in the vent, zero",
      "ignition-seen-gas-shut": "Spark or glow seen with the gas shut",
    },
  },
  access: {
    title: "No safe way in",
    line: "Stop. Make it safe, come back, or refer it.",
    acts: { "what-is-unsafe": "What is not safe", "made-safe": "How it was made safe" },
  },
  "found-off": {
    title: "Found off",
    line: "Find out who shut it and why, before it goes on.",
    acts: {
      "tags-and-history-read": "Tags and this unit's history are read",
      "who-and-why": "Who shut it, and why",
      "not-locked-or-authorised": "Not tagged or locked, or I may restore it",
    },
  },
  "lp-empty": {
    title: "Propane is out",
    line: "No call for heat. Shut, tag, tell the supplier.",
    acts: {
      "gas-shut": "Gas is shut",
      tagged: "Valve is tagged",
      "supplier-told": "Supplier is told",
      "tank-filled": "Tank, after filling",
    },
  },
  "lp-low": {
    title: "Propane gathers low",
    line: "Read pit and basement at the floor before any try.",
    acts: { "floor-reads-zero": "% LEL at the floor, zero" },
  },
  rollout: {
    title: "A rollout switch has tripped",
    line: "Flame was outside the box. Gas shut first, then find out why.",
    acts: {
      "gas-shut": "Gas is shut",
      "vent-looked-at": "Vent looked at, end to end",
      "exchanger-looked-at": "Exchanger looked at",
      "burners-looked-at": "Burners looked at",
      "wiring-looked-at": "Wiring looked at",
      "air-supply-looked-at": "Air supply looked at",
      "cause-or-all-clean": "The cause and its cure, or: all clean",
      "reset-once": "Reset once",
      "supervised-run": "One run, at the shutoff, ten minutes",
      "run-co": "Flue CO in the run",
      "no-flame-outside": "No flame outside the box",
    },
  },
  spill: {
    title: "Exhaust spills into the room",
    line: "Appliance off. Read CO in the room at once.",
    acts: {
      "appliance-off": "Appliance is off",
      "room-co": "CO in the room",
      "vent-looked-at": "Draft and vent looked at",
      "air-supply-looked-at": "Air supply and fans looked at",
      "cause-or-all-clean": "The cause and its cure, or: all clean",
      "reset-once": "Reset once",
      "supervised-run": "One run, fans on, at the shutoff, ten minutes",
      "spill-stops": "Seconds until it draws",
    },
  },
  "flue-400": {
    title: "Flue CO above 400, or rising",
    line: "Shut it down and tag it.",
    acts: {
      "shut-down": "Unit is shut down",
      tagged: "Unit is tagged",
      "cause-cured": "The cause and its cure",
      "flue-co-again": "Flue CO again, air-free",
    },
  },
  exchanger: {
    title: "The heat exchanger is open",
    line: "Gas and power off, tag it. Only a new exchanger or unit cures it.",
    acts: {
      "gas-shut": "Gas is shut",
      "power-off": "Power is off",
      tagged: "Both are tagged",
      "owner-told-in-writing": "Owner is told in writing",
      "exchanger-or-unit-replaced": "What was replaced",
    },
  },
  "leak-by": {
    title: "The gas valve passes when off",
    line: "Shut the manual valve and tag it.",
    acts: {
      "gas-shut": "Manual valve is shut",
      tagged: "Valve is tagged",
      "valve-replaced": "What was replaced",
    },
  },
  soot: {
    title: "Soot, scorch or melted parts",
    line: "No firing until the cause is known.",
    acts: { "no-firing": "Gas stays shut", "cause-found": "Where the heat or soot came from" },
  },
  "live-cabinet": {
    title: "The cabinet is live",
    line: "Hands off. Kill it at the breaker, prove it dead.",
    acts: {
      "hands-off": "Nobody touches it",
      "breaker-off": "Breaker is off and locked",
      "proved-dead": "Proved dead",
      "fault-found": "Where it was live from",
      "cabinet-again": "Cabinet to earth, again",
    },
  },
  flood: {
    title: "Controls have been under water",
    line: "Do not run it. All gas controls are replaced.",
    acts: {
      "not-operated": "Not operated",
      tagged: "Unit is tagged",
      "gas-controls-replaced": "What was replaced",
    },
  },
  "water-wet": {
    title: "Wet control near live parts",
    line: "Power off first.",
    acts: {
      "de-energised": "Power is off and locked",
      "dried-and-cause": "Where the water came from, and the cure",
    },
  },
  asbestos: {
    title: "Old wrap or vermiculite",
    line: "Stop. Do not disturb it.",
    acts: {
      "stopped-not-disturbed": "Stopped, not disturbed",
      "owner-told": "Owner is told",
      "work-does-not-touch-it": "Why the work does not touch it",
    },
  },
};

/** What is left open once the acts of a rule are recorded. */
export const afterwards = {
  "may-go-on": "Go on, or close as shut off or referred.",
  "one-supervised-run": "One supervised run, at the shutoff. No repeat.",
  "only-shut-off-or-refer": "Close as shut off or referred.",
} as const;
