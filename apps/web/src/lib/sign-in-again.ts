import { useSyncExternalStore } from "react";

type Answer = (isSignedIn: boolean) => void;

let waiting: Answer[] = [];
let servers = 0;
const listeners = new Set<() => void>();
const tell = () => listeners.forEach((listener) => listener());

/**
 * Asks the person on screen to sign in again, over the page that is open, because the server took an act for that
 * of nobody. True once they are signed in; false where they do not, or where no page can ask.
 */
export function askToSignIn(): Promise<boolean> {
  if (servers === 0) return Promise.resolve(false);
  return new Promise((answer) => {
    waiting = [...waiting, answer];
    tell();
  });
}

/** Answers everybody who asked. */
export function answerSignIn(isSignedIn: boolean): void {
  const answered = waiting;
  waiting = [];
  answered.forEach((answer) => answer(isSignedIn));
  tell();
}

/** Says that there is a place on screen that asks; the function given back takes that away. */
export function serveSignIn(): () => void {
  servers += 1;
  return () => {
    servers -= 1;
    if (servers === 0) answerSignIn(false);
  };
}

/** Whether somebody waits for a sign-in, following changes. */
export function useSignInAsked(): boolean {
  return useSyncExternalStore(
    (listener) => {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
    () => waiting.length > 0,
  );
}
