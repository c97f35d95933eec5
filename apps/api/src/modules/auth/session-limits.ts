import type { Role } from "@emberladder/contract";

const MINUTE = 60_000;
const HOUR = 60 * MINUTE;
const DAY = 24 * HOUR;

/** How long a session lasts unused, and at most, in milliseconds. */
export interface SessionLimits {
  idleMs: number;
  absoluteMs: number;
}

/**
 * People in the field work for days without signal, so their sessions last; a supervisor's session can change
 * people and release reports, so it is short. Figures after NIST SP 800-63B (from memory), the long field
 * session being a decision of the product.
 */
const FIELD: SessionLimits = { idleMs: 14 * DAY, absoluteMs: 30 * DAY };
const SUPERVISOR: SessionLimits = { idleMs: 30 * MINUTE, absoluteMs: 12 * HOUR };

/** The limits of a role's sessions. */
export function sessionLimitsOf(role: Role): SessionLimits {
  return role === "supervisor" ? SUPERVISOR : FIELD;
}

/**
 * Judges a session at a moment: over, or good; and whether its last use is worth writing down. That is done at
 * most thirty times within the idle limit (each minute for a supervisor), so that reading costs no write and
 * the idle limit is still kept to within a thirtieth.
 */
export function judgeSession(
  session: { createdAt: Date; lastUsedAt: Date; role: Role },
  now: Date,
): { isOver: boolean; shouldTouch: boolean } {
  const { idleMs, absoluteMs } = sessionLimitsOf(session.role);
  const idle = now.getTime() - session.lastUsedAt.getTime();
  const age = now.getTime() - session.createdAt.getTime();
  return { isOver: idle >= idleMs || age >= absoluteMs, shouldTouch: idle >= idleMs / 30 };
}
