import { liveQuery } from "dexie";
import { useEffect, useState } from "react";
import { groupBy } from "#lib/group-by.ts";
import { localStore } from "#lib/store/database.ts";
import type { OutboxRow } from "#lib/store/database.ts";

/** What waits of one diagnosis, by one person on this phone. */
export interface Waiting {
  diagnosisId: string;
  authorId: string;
  count: number;
  /** UTC milliseconds of the oldest. */
  since: number;
  /** Where the call is, as far as this phone knows. */
  place?: { unitName: string; address: string };
  /** The refusals, one a kind. */
  problems: NonNullable<OutboxRow["problem"]>[];
}

/** What waits on this phone, by diagnosis, following changes; undefined until it is read. */
export function useWaiting(): Waiting[] | undefined {
  const [waiting, setWaiting] = useState<Waiting[]>();
  useEffect(() => {
    const subscription = liveQuery(readWaiting).subscribe(setWaiting);
    return () => subscription.unsubscribe();
  }, []);
  return waiting;
}

async function readWaiting(): Promise<Waiting[]> {
  const rows = await localStore.outbox.toArray();
  const groups = groupBy(rows, (row) => `${row.diagnosisId} ${row.authorId}`);
  return Promise.all([...groups.values()].map(describeGroup));
}

async function describeGroup(rows: OutboxRow[]): Promise<Waiting> {
  const { diagnosisId, authorId } = rows[0] ?? { diagnosisId: "", authorId: "" };
  const problems = new Map(rows.flatMap((row) => (row.problem ? [[row.problem.code, row.problem]] : [])));
  return {
    diagnosisId,
    authorId,
    count: rows.length,
    since: Math.min(...rows.map((row) => row.addedAt)),
    place: await placeOf(diagnosisId),
    problems: [...problems.values()],
  };
}

async function placeOf(diagnosisId: string): Promise<Waiting["place"]> {
  const events = await localStore.events.where("diagnosisId").equals(diagnosisId).toArray();
  const callId = events.find((event) => event.type === "diagnosis.opened")?.body["callId"];
  if (typeof callId !== "string") return undefined;
  const call = (await localStore.documents.get(`call:${callId}`))?.value as
    { unit?: { name?: string }; site?: { address?: string } } | undefined;
  return call?.unit?.name && call.site?.address
    ? { unitName: call.unit.name, address: call.site.address }
    : undefined;
}
