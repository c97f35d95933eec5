import { judgeSession, sessionLimitsOf } from "@emberladder/api/src/modules/auth/session-limits.ts";
import { judgeTry } from "@emberladder/api/src/modules/auth/throttle/throttle-policy.ts";
import { ROLES } from "@emberladder/contract";
import type { Role } from "@emberladder/contract";
import { describe, expect, it } from "vitest";

const MINUTE = 60_000;
const HOUR = 60 * MINUTE;
const DAY = 24 * HOUR;
const start = new Date("2026-01-12T15:00:00Z");
const after = (ms: number) => new Date(start.getTime() + ms);

// The figures of the decision on sessions: field 14 days unused and 30 in all, supervisor 30 minutes and 12 hours.
const LIMITS: Record<Role, [idle: number, absolute: number]> = {
  trainee: [14 * DAY, 30 * DAY],
  technician: [14 * DAY, 30 * DAY],
  senior: [14 * DAY, 30 * DAY],
  supervisor: [30 * MINUTE, 12 * HOUR],
};

// SEC-02: idle and absolute limits.
describe("a session", () => {
  for (const role of ROLES) {
    const [idle, absolute] = LIMITS[role];

    it(`of a ${role} is good until one millisecond before its idle limit and over at it`, () => {
      const session = { createdAt: start, lastUsedAt: start, role };
      expect(judgeSession(session, after(idle - 1)).isOver).toBe(false);
      expect(judgeSession(session, after(idle)).isOver).toBe(true);
    });

    it(`of a ${role} is over at its absolute limit however recently it was used`, () => {
      const session = { createdAt: start, lastUsedAt: after(absolute - 2), role };
      expect(judgeSession(session, after(absolute - 1)).isOver).toBe(false);
      expect(judgeSession(session, after(absolute)).isOver).toBe(true);
      expect(sessionLimitsOf(role).absoluteMs).toBe(absolute);
    });

    it(`of a ${role} writes its use down at most thirty times within the idle limit`, () => {
      const session = { createdAt: start, lastUsedAt: start, role };
      expect(judgeSession(session, after(idle / 30 - 1)).shouldTouch).toBe(false);
      expect(judgeSession(session, after(idle / 30)).shouldTouch).toBe(true);
    });
  }
});

// SEC-08: delays.
describe("tries to sign in", () => {
  const run = (count: number) => {
    let row: Parameters<typeof judgeTry>[0];
    let now = start;
    const delays: number[] = [];
    for (let i = 0; i < count; i += 1) {
      const verdict = judgeTry(row, now, 5);
      if (!("next" in verdict)) throw new Error("refused although the delay was waited for");
      row = verdict.next;
      const delay = (row.blockedUntil?.getTime() ?? now.getTime()) - now.getTime();
      delays.push(delay / MINUTE);
      now = new Date(now.getTime() + delay + 1);
    }
    return delays;
  };

  it("are free four times, then wait one, two, four minutes, and never more than fifteen", () => {
    expect(run(11)).toEqual([0, 0, 0, 0, 1, 2, 4, 8, 15, 15, 15]);
  });

  it("are refused during the delay, and forgotten after an hour without any", () => {
    const row = { attempts: 9, lastAttemptAt: start, blockedUntil: after(15 * MINUTE) };
    expect(judgeTry(row, after(15 * MINUTE - 1), 5)).toEqual({ refusedUntil: after(15 * MINUTE) });
    expect(judgeTry(row, after(HOUR + 1), 5)).toMatchObject({ next: { attempts: 1, blockedUntil: null } });
  });
});
