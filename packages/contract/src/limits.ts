/**
 * Every limit of the product that both sides know, with what it protects. A request over a limit is refused
 * with `too-large` or `invalid-input`; nothing is cut silently.
 */

/** Events in one batch. A phone that was offline for days sends several batches. */
export const MAX_BATCH_EVENTS = 100;
/** Bytes of one batch as sent, before any compression. */
export const MAX_BATCH_BYTES = 256 * 1024;
/** Free texts that may travel with one batch. */
export const MAX_BATCH_NOTES = 100;
/** Diagnoses whose heads may be named in one pull. */
export const MAX_PULL_HEADS = 200;
/** Events that one pull returns at most; `more` says that there is more. */
export const MAX_PULL_EVENTS = 500;
/** Bytes of any other request body. */
export const MAX_BODY_BYTES = 64 * 1024;
/** How deep a JSON body may nest. No form of the product goes beyond eight. */
export const MAX_BODY_DEPTH = 24;
/** Bytes of a request address with its query. */
export const MAX_ADDRESS_LENGTH = 2048;

/** Least characters of a password where it is the only factor (NIST SP 800-63B-4, from memory). */
export const MIN_PASSWORD_ALONE = 15;
/** Least characters of a password beside a two-step code (the same source). */
export const MIN_PASSWORD_WITH_TWO_STEP = 8;
/** Most characters of a password: hashing cost is bounded, a pass phrase fits. */
export const MAX_PASSWORD = 200;
/** Digits of a two-step code (RFC 6238 as authenticators use it). */
export const TWO_STEP_DIGITS = 6;
/** Recovery codes made in one go. */
export const RECOVERY_CODES = 10;

export const MAX_NAME = 120;
export const MAX_EMAIL = 254;
export const MAX_PHONE = 40;
export const MAX_ADDRESS = 200;
export const MAX_COMPLAINT = 500;
export const MAX_REASON = 500;
export const MAX_DEVICE_NAME = 80;

/** Rows of one page where the request names no size, and the most it may name. */
export const DEFAULT_PAGE_SIZE = 50;
export const MAX_PAGE_SIZE = 200;

/** Days for which an invitation, a password reset (hours) and a report link hold. */
export const INVITE_DAYS = 7;
export const RESET_HOURS = 1;
export const REPORT_LINK_DAYS = 90;

/** Minutes by which a phone's clock may differ before its events are flagged; never a reason to refuse. */
export const CLOCK_TOLERANCE_MINUTES = 5;

/**
 * Rate limits by name. `by` says whose budget is spent; `shared` budgets are counted in the database, so
 * that several API processes behave as one, the others in the process, where they only guard against floods.
 */
export const RATE_LIMITS = {
  /** Everything: a flood from one address. */
  address: { requests: 3000, seconds: 60, by: "address", shared: false },
  /** Signed-in requests of one session, about ten a second. */
  session: { requests: 600, seconds: 60, by: "session", shared: false },
  /** Open doors without a session: resets, invitations, first run, report links. */
  door: { requests: 30, seconds: 60, by: "address", shared: true },
  /** Attempts of one person at a second factor or at the present password. */
  factor: { requests: 10, seconds: 300, by: "person", shared: true },
  /** Mail that one person can cause. */
  mail: { requests: 60, seconds: 3600, by: "person", shared: true },
} as const satisfies Record<string, RateLimit>;

export interface RateLimit {
  requests: number;
  seconds: number;
  by: "address" | "session" | "person";
  shared: boolean;
}
export type RateLimitName = keyof typeof RATE_LIMITS;
