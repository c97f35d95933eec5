import type { Dependencies } from "#http/dependencies.ts";
import { removeOldWindows } from "#http/rate-windows/repository.ts";
import { deleteOverSessions } from "./repository.ts";
import { removeOldThrottles } from "./throttle/repository.ts";

const DAY_MS = 86_400_000;

/** Removes what has served its time: ended sessions, old counts. */
export async function tidyUp({ database, clock }: Dependencies): Promise<void> {
  const now = clock();
  await deleteOverSessions(database, new Date(now));
  await removeOldWindows(database, new Date(now - DAY_MS));
  await removeOldThrottles(database, new Date(now - DAY_MS));
}
