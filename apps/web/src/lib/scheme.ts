import { useSyncExternalStore } from "react";

/** Daylight and attic follow the system; full sun is chosen by a tap and stays until changed. */
export const SCHEMES = ["system", "daylight", "attic", "full-sun"] as const;
export type Scheme = (typeof SCHEMES)[number];

const KEY = "emberladder.scheme";
const listeners = new Set<() => void>();

/** The scheme this person chose on this device. */
export function readScheme(): Scheme {
  const stored = localStorage.getItem(KEY);
  return SCHEMES.find((scheme) => scheme === stored) ?? "system";
}

/** Puts a scheme on the page and remembers it. */
export function chooseScheme(scheme: Scheme): void {
  localStorage.setItem(KEY, scheme);
  applyScheme(scheme);
  listeners.forEach((listener) => listener());
}

/** Puts the remembered scheme on the page; called once before the first paint. */
export function applyScheme(scheme: Scheme = readScheme()): void {
  if (scheme === "system") delete document.documentElement.dataset["scheme"];
  else document.documentElement.dataset["scheme"] = scheme;
}

/** The chosen scheme, following changes. */
export function useScheme(): Scheme {
  return useSyncExternalStore((listener) => {
    listeners.add(listener);
    return () => listeners.delete(listener);
  }, readScheme);
}
