import type { SymptomId } from "@emberladder/furnace";

/** Words of the symptoms: what is seen, and why it is not a cause. */
export const symptoms: Readonly<Record<SymptomId, { readonly name: string; readonly what: string }>> = {
  "limit-open-blower-failed": {
    name: "Limit opens, blower not running",
    what: "Name what stops the blower: motor, capacitor, module, belt, relay or control.",
  },
  "spark-continues-flame-unsensed": {
    name: "Spark goes on with the pilot lit",
    what: "Name why the pilot is not sensed: pilot, sensor, ground, polarity or control.",
  },
  "delayed-ignition": {
    name: "Late, banging light-off",
    what: "Name why it lights late: igniter, gap, pressure, carry-over or burners.",
  },
};
