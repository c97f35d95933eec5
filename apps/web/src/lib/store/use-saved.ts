import { liveQuery } from "dexie";
import { useEffect, useState, useSyncExternalStore } from "react";
import { localStore } from "./database.ts";
import { sendState } from "./sender.ts";

export type SavedKind = "on-phone" | "waiting" | "sending" | "on-server" | "needs-sign-in" | "problem";

/** What is saved where, for the chip and the sync screen. */
export function useSaved(): {
  kind: SavedKind;
  waiting: number;
  problems: number;
  onServerAt: number | null;
} {
  const sending = useSyncExternalStore(sendState.subscribe, sendState.get);
  const [counts, setCounts] = useState({ waiting: 0, problems: 0, events: 0 });
  useEffect(() => {
    const subscription = liveQuery(async () => {
      const rows = await localStore.outbox.toArray();
      return {
        waiting: rows.length,
        problems: rows.filter((row) => row.problem).length,
        events: await localStore.events.count(),
      };
    }).subscribe(setCounts);
    return () => subscription.unsubscribe();
  }, []);
  const kind: SavedKind =
    counts.problems > 0
      ? "problem"
      : sending.phase === "needs-sign-in"
        ? "needs-sign-in"
        : counts.waiting === 0
          ? sending.onServerAt
            ? "on-server"
            : "on-phone"
          : sending.phase === "sending"
            ? "sending"
            : "waiting";
  return { kind, ...counts, onServerAt: sending.onServerAt };
}
