/** Attempts before a job is given up and shown to a supervisor. */
export const MOST_ATTEMPTS = 6;
/** How long a claim holds without a sign of life. */
export const LEASE_MS = 60_000;
const FIRST_PAUSE_MS = 2000;
const LONGEST_PAUSE_MS = 10 * 60_000;

/** The pause before the next attempt: doubling from two seconds to ten minutes, less up to a quarter at random. */
export function pauseAfter(attempts: number, random: () => number): number {
  const pause = Math.min(LONGEST_PAUSE_MS, FIRST_PAUSE_MS * 4 ** (attempts - 1));
  return Math.round(pause * (1 - random() / 4));
}
