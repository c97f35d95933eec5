import type { Rung } from "@emberladder/diagnosis";
import type { ChainDevice, Stage, UnitProfile } from "@emberladder/furnace";

/** What stands at the right end of a rung. */
export type LoadMark = "motor" | "coil" | "heater" | "valve" | "rings";

/** One rung with its circuit: the contacts in the unit's own order and the load. */
export interface CircuitRung {
  rung: Rung;
  contacts: { name: string; normallyClosed: boolean }[];
  load: { mark: LoadMark; name: string };
}

const LINE: Partial<Record<Stage, Omit<CircuitRung, "rung">>> = {
  power: {
    contacts: [{ name: "doorSwitch", normallyClosed: false }],
    load: { mark: "rings", name: "primary" },
  },
  inducer: {
    contacts: [{ name: "inducerRelay", normallyClosed: false }],
    load: { mark: "motor", name: "inducer" },
  },
  "ignition-source": {
    contacts: [{ name: "igniterRelay", normallyClosed: false }],
    load: { mark: "heater", name: "igniter" },
  },
  "blower-on": {
    contacts: [{ name: "blowerRelay", normallyClosed: false }],
    load: { mark: "motor", name: "blower" },
  },
};

const CONTROL: Partial<Record<Stage, Omit<CircuitRung, "rung">>> = {
  call: { contacts: [{ name: "thermostat", normallyClosed: false }], load: { mark: "coil", name: "boardW" } },
  "draft-rest": {
    contacts: [{ name: "pressureSwitch", normallyClosed: false }],
    load: { mark: "coil", name: "board" },
  },
  "draft-proved": {
    contacts: [{ name: "pressureSwitch", normallyClosed: false }],
    load: { mark: "coil", name: "board" },
  },
  gas: { contacts: [{ name: "gasRelay", normallyClosed: false }], load: { mark: "valve", name: "gasValve" } },
  "flame-proved": { contacts: [], load: { mark: "coil", name: "flameSensor" } },
};

const SAFETY: ChainDevice[] = ["limit", "aux-limit", "rollout", "rollout-2", "fusible-link", "spill-switch"];

/** The safety chain in the unit's order; a limit and one rollout where the unit does not state it. */
function safetyContacts(profile: UnitProfile): CircuitRung["contacts"] {
  const stated = profile.chain?.order.filter((device) => SAFETY.includes(device));
  const devices = stated && stated.length > 0 ? stated : (["limit", "rollout"] as ChainDevice[]);
  return devices
    .slice(0, 3)
    .map((device) => ({ name: device.startsWith("rollout") ? "rollout" : "limit", normallyClosed: true }));
}

/** The rungs of a unit parted by circuit: on line voltage, on 24 V, and those that are only seen or timed. */
export function circuitsOf(
  rungs: readonly Rung[],
  profile: UnitProfile,
): { line: CircuitRung[]; control: CircuitRung[]; seenOnly: Rung[] } {
  const line: CircuitRung[] = [];
  const control: CircuitRung[] = [];
  const seenOnly: Rung[] = [];
  for (const rung of rungs) {
    const onLine = LINE[rung.stage];
    const onControl =
      rung.stage === "safeties"
        ? { contacts: safetyContacts(profile), load: { mark: "coil" as const, name: "board" } }
        : CONTROL[rung.stage];
    if (onLine) line.push({ rung, ...onLine });
    else if (onControl) control.push({ rung, ...onControl });
    else seenOnly.push(rung);
  }
  return { line, control, seenOnly };
}
