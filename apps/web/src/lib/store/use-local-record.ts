import { liveQuery } from "dexie";
import { useEffect, useState } from "react";
import { localStore } from "./database.ts";
import type { LocalEvent, LocalNote } from "./database.ts";
import { byPlace } from "./diagnosis-session.ts";

/** A diagnosis as this phone keeps it, event by event with its texts; undefined until it was read. */
export function useLocalRecord(
  diagnosisId: string,
): { events: readonly LocalEvent[]; notes: readonly LocalNote[] } | undefined {
  const [record, setRecord] = useState<{ events: LocalEvent[]; notes: LocalNote[] }>();
  useEffect(() => {
    const subscription = liveQuery(async () => ({
      events: (await localStore.events.where("diagnosisId").equals(diagnosisId).toArray()).toSorted(byPlace),
      notes: await localStore.notes.where("diagnosisId").equals(diagnosisId).toArray(),
    })).subscribe(setRecord);
    return () => subscription.unsubscribe();
  }, [diagnosisId]);
  return record;
}
