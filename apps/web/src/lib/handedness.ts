import { useSyncExternalStore } from "react";

/** Side of the screen on which the ladder strip stands; the right is for people who hold the phone left. */
export const HANDS = ["left", "right"] as const;
export type Handedness = (typeof HANDS)[number];

const KEY = "emberladder.strip-side";
const listeners = new Set<() => void>();

/** The side this person chose on this device; left until chosen. */
export function readHandedness(): Handedness {
  return localStorage.getItem(KEY) === "right" ? "right" : "left";
}

/** Chooses the side and remembers it on this device. */
export function chooseHandedness(side: Handedness): void {
  localStorage.setItem(KEY, side);
  listeners.forEach((listener) => listener());
}

/** The chosen side, following changes. */
export function useHandedness(): Handedness {
  return useSyncExternalStore((listener) => {
    listeners.add(listener);
    return () => listeners.delete(listener);
  }, readHandedness);
}
