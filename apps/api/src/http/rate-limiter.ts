import { RATE_LIMITS } from "@emberladder/contract";
import type { RateLimitName } from "@emberladder/contract";
import type { Database } from "@emberladder/db";
import { ApiError } from "./api-error.ts";
import { countShared } from "./rate-windows/repository.ts";
import type { RateWindow } from "./rate-windows/repository.ts";

/** Windows kept in the process at most; past this the oldest go, which only ever gives somebody more. */
const MOST_WINDOWS = 20_000;

/** Counts requests and refuses those over a limit. */
export interface RateLimiter {
  /** @throws ApiError `too-many-requests` with the seconds to wait. */
  take(name: RateLimitName, key: string, now: number): Promise<void>;
}

/**
 * Counts in the process where that is enough, and in the database where several processes share a budget.
 * @param scale factor on what is counted in the process
 */
export function createRateLimiter(database: Database, scale = 1): RateLimiter {
  const windows = new Map<string, RateWindow>();
  return {
    take: async (name, key, now) => {
      const { requests, seconds, shared } = RATE_LIMITS[name];
      const request = { key: `${name}\n${key}`, now, seconds };
      const window = shared ? await countShared(database, request) : countHere(windows, request);
      if (window.hits > (shared ? requests : requests * scale))
        throw new ApiError("too-many-requests", {
          retryAfterSeconds: Math.max(1, Math.ceil((window.resetsAt - now) / 1000)),
        });
    },
  };
}

function countHere(
  windows: Map<string, RateWindow>,
  { key, now, seconds }: { key: string; now: number; seconds: number },
): RateWindow {
  const current = windows.get(key);
  if (current && current.resetsAt > now) {
    current.hits += 1;
    return current;
  }
  windows.delete(key);
  const fresh = { hits: 1, resetsAt: now + seconds * 1000 };
  windows.set(key, fresh);
  const oldest = windows.size > MOST_WINDOWS ? windows.keys().next().value : undefined;
  if (oldest !== undefined) windows.delete(oldest);
  return fresh;
}
