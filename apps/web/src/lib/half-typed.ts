import { useSyncExternalStore } from "react";

const forms = new Set<string>();
const listeners = new Set<() => void>();

/** Says of a form on screen whether something is typed into it that is not sent. */
export function markHalfTyped(formId: string, isHalfTyped: boolean): void {
  if (isHalfTyped === forms.has(formId)) return;
  if (isHalfTyped) forms.add(formId);
  else forms.delete(formId);
  listeners.forEach((listener) => listener());
}

/** Gives up what is typed everywhere, at a sign-out that was asked for. */
export function forgetHalfTyped(): void {
  forms.clear();
  listeners.forEach((listener) => listener());
}

/** Whether any form on screen holds something that would be lost with it, following changes. */
export function useHalfTyped(): boolean {
  return useSyncExternalStore(
    (listener) => {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
    () => forms.size > 0,
  );
}
