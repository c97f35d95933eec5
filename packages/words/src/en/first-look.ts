import type { FirstLookId } from "@emberladder/furnace";

/** Words of a first-look item: what to look at, what is right, and the hits beside the check's own findings. */
export interface FirstLookWords {
  readonly title: string;
  readonly look: string;
  readonly right: string;
  readonly hits: Readonly<Record<string, string>>;
}

/** Words of the first look. */
export const firstLook: Readonly<Record<FirstLookId, FirstLookWords>> = {
  thermostat: {
    title: "Thermostat",
    look: "Screen alive, no battery icon, HEAT, set above the room, nothing on hold.",
    right: "Calls for heat",
    hits: {
      blank: "Blank, has batteries",
      "low-icon": "Low-battery icon",
      "blank-no-batteries": "Blank, no batteries",
      mode: "Mode is not HEAT",
      "schedule-hold": "Schedule or hold",
      "system-type": "System type wrong",
    },
  },
  "switch-breaker": {
    title: "Switch and breaker",
    look: "Service switch, breaker, disconnect, GFCI, transformer button.",
    right: "All on",
    hits: {
      "switch-off": "Service switch off",
      "breaker-tripped": "Breaker tripped",
      "disconnect-off": "Disconnect out",
      "gfci-tripped": "GFCI tripped",
      "transformer-button-out": "Transformer button out",
    },
  },
  door: {
    title: "Door",
    look: "Panel seated, plunger in.",
    right: "Seated",
    hits: { misfit: "Does not seat", "tab-bent": "Tab bent", missing: "Panel missing" },
  },
  filter: {
    title: "Filter",
    look: "Slide it out and hold it to the light.",
    right: "Light comes through",
    hits: { loaded: "Loaded", "wrong-type": "Wrong type", missing: "Missing" },
  },
  shutoff: {
    title: "Shutoff",
    look: "Every handle, knob and tag. Propane: tank gauge. Another burner lit.",
    right: "All in line, knob ON",
    hits: {
      "appliance-valve": "Unit's valve shut",
      "branch-off-season": "Branch shut, season tag",
      meter: "Shut at the meter",
      "control-switch-off": "Knob not at ON",
      "tank-empty": "Tank empty",
      "others-dead": "Other burners dead",
      "others-dead-gas": "Other burners dead",
    },
  },
  "status-light": {
    title: "Status light",
    look: "Through the sight glass, before the door is pulled. Write its text.",
    right: "Normal",
    hits: {
      dark: "Dark",
      internal: "Board's own fault",
      "ignition-failed": "Ignition failed",
      "flame-not-proved": "Flame not proved",
      "limit-open": "Limit open",
      "rollout-open": "Rollout open",
      "draft-open": "Draft switch open",
      "draft-closed-at-rest": "Draft switch closed at rest",
      "flame-without-call": "Flame without a call",
      polarity: "Polarity or ground",
      "communication-lost": "Communication lost",
      "setup-plug": "Set-up plug",
      "sensor-range": "Sensor out of range",
    },
  },
  water: {
    title: "Water",
    look: "Pan, float, drain, puddle.",
    right: "Dry",
    hits: {
      "float-open-wet": "Pan wet, float open",
      "reservoir-full": "Pump reservoir full",
      "drain-backs-up": "Drain backs up",
      "drain-frozen": "Drain frozen",
      "pump-off": "Pump off",
    },
  },
};
