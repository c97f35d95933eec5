import { UNIT_SYSTEMS } from "@emberladder/field-math";
import type { UnitSystem } from "@emberladder/field-math";
import { useSyncExternalStore } from "react";
import { useSession } from "./session.tsx";

const KEY = "emberladder.units";
const listeners = new Set<() => void>();

/** What this person chose on this device; undefined where the company's setting holds. */
export function readUnitChoice(): UnitSystem | undefined {
  const stored = localStorage.getItem(KEY);
  return UNIT_SYSTEMS.find((system) => system === stored);
}

/** Chooses the units of this device; undefined goes back to the company's setting. */
export function chooseUnits(system: UnitSystem | undefined): void {
  if (system) localStorage.setItem(KEY, system);
  else localStorage.removeItem(KEY);
  listeners.forEach((listener) => listener());
}

/** The person's own choice, following changes. */
export function useUnitChoice(): UnitSystem | undefined {
  return useSyncExternalStore((listener) => {
    listeners.add(listener);
    return () => listeners.delete(listener);
  }, readUnitChoice);
}

/** The units to show: the person's choice on this device, else the company's setting. */
export function useUnitsShown(): UnitSystem {
  const { me } = useSession();
  return useUnitChoice() ?? me?.company.unitsShown ?? "inch-pound";
}
