/** Tries that are judged at once before delays begin, by one account from one address. */
export const FREE_TRIES = 5;
/** The same for one account from any address: high, so that a stranger cannot lock somebody out cheaply. */
export const FREE_TRIES_PER_ACCOUNT = 40;
const FIRST_DELAY_MS = 60_000;
const LONGEST_DELAY_MS = 15 * 60_000;
/** After this long without a try, counting starts again. */
const FORGET_AFTER_MS = 60 * 60_000;

export interface ThrottleRow {
  attempts: number;
  lastAttemptAt: Date;
  blockedUntil: Date | null;
}

/**
 * Judges one more try: refused with the moment to wait for, or counted. The count goes up before the password
 * is looked at, so that tries side by side are counted too. Delays double from one minute to a quarter of an
 * hour; nothing ever locks for good.
 */
export function judgeTry(
  row: ThrottleRow | undefined,
  now: Date,
  freeTries: number,
): { refusedUntil: Date } | { next: ThrottleRow } {
  if (row?.blockedUntil && row.blockedUntil > now) return { refusedUntil: row.blockedUntil };
  const isStale = !row || now.getTime() - row.lastAttemptAt.getTime() > FORGET_AFTER_MS;
  const attempts = isStale ? 1 : row.attempts + 1;
  const delay =
    attempts < freeTries ? 0 : Math.min(LONGEST_DELAY_MS, FIRST_DELAY_MS * 2 ** (attempts - freeTries));
  return {
    next: {
      attempts,
      lastAttemptAt: now,
      blockedUntil: delay > 0 ? new Date(now.getTime() + delay) : null,
    },
  };
}
