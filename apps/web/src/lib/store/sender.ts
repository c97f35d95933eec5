import { MAX_BATCH_BYTES, MAX_BATCH_EVENTS, sendBatch } from "@emberladder/contract";
import { ApiProblem, callApi } from "#lib/api-client.ts";
import { localStore } from "./database.ts";
import type { LocalEvent, OutboxRow } from "./database.ts";

/** What the saved-state chip shows. */
export interface SendState {
  phase: "idle" | "sending" | "no-signal" | "needs-sign-in";
  /** When the server last took everything, UTC milliseconds. */
  onServerAt: number | null;
}

let state: SendState = { phase: "idle", onServerAt: null };
const listeners = new Set<() => void>();
let authorId: string | undefined;
let timer: ReturnType<typeof setTimeout> | undefined;
let failures = 0;

export const sendState = {
  get: (): SendState => state,
  subscribe(listener: () => void): () => void {
    listeners.add(listener);
    return () => listeners.delete(listener);
  },
};

function setState(change: Partial<SendState>): void {
  state = { ...state, ...change };
  listeners.forEach((listener) => listener());
}

/**
 * Starts sending for the person signed in. Items of another person on the same phone stay in the outbox,
 * bound to their author, until that person signs in again.
 */
export function startSender(personId: string): void {
  authorId = personId;
  addEventListener("online", requestSend);
  document.addEventListener("visibilitychange", requestSend);
  requestSend();
}

/** Stops sending at sign-out; what waits stays. */
export function stopSender(): void {
  authorId = undefined;
  removeEventListener("online", requestSend);
  document.removeEventListener("visibilitychange", requestSend);
  clearTimeout(timer);
}

/** Asks for the outbox to be sent soon; safe to call at any time and from any tab. */
export function requestSend(): void {
  clearTimeout(timer);
  timer = setTimeout(() => void send(), 0);
}

async function send(): Promise<void> {
  if (!authorId) return;
  await navigator.locks.request("emberladder-sender", { ifAvailable: true }, async (lock) => {
    if (!lock) return scheduleRetry();
    try {
      while (await sendOneBatch()) setState({ phase: "sending" });
      failures = 0;
      setState({ phase: "idle", onServerAt: Date.now() });
    } catch (problem) {
      failures++;
      const signedOut = problem instanceof ApiProblem && problem.status === 401;
      setState({ phase: signedOut ? "needs-sign-in" : "no-signal" });
      if (!signedOut) scheduleRetry();
    }
  });
}

/** Waits 2 s, then twice as long each time up to 5 min, with a little spread so that phones do not march. */
function scheduleRetry(): void {
  clearTimeout(timer);
  const wait = Math.min(300_000, 2000 * 2 ** Math.min(failures, 8));
  timer = setTimeout(() => void send(), wait * (0.8 + Math.random() * 0.4));
}

/** Sends the oldest items; returns whether there may be more. */
async function sendOneBatch(): Promise<boolean> {
  const waiting = await localStore.outbox
    .where("authorId")
    .equals(authorId ?? "")
    .sortBy("deviceSeq");
  const ready = waiting.filter((row) => row.problem === undefined);
  const blocked = new Set(waiting.filter((row) => row.problem).map((row) => row.diagnosisId));
  const rows = ready.filter((row) => !blocked.has(row.diagnosisId)).slice(0, MAX_BATCH_EVENTS);
  if (rows.length === 0) return false;
  const batch = await takeBatch(rows);
  const answer = await callApi(sendBatch, { body: batch });
  const placed = [...answer.accepted, ...answer.duplicate];
  const done = placed.map((item) => item.id);
  await localStore.transaction("rw", [localStore.events, localStore.outbox, localStore.meta], async () => {
    await localStore.outbox.bulkDelete(done);
    for (const item of placed) await localStore.events.update(item.id, { serverSeq: item.serverSeq });
    for (const item of answer.rejected) {
      if (!item.retryable && item.id) {
        await localStore.outbox.update(item.id, {
          problem: { code: item.code, detail: item.detail, at: Date.now() },
        });
      }
    }
    await localStore.meta.put({ key: "serverOffsetMs", value: Math.round(answer.serverTime - Date.now()) });
  });
  return done.length > 0;
}

async function takeBatch(rows: readonly OutboxRow[]) {
  const events: LocalEvent[] = [];
  let bytes = 2000;
  for (const row of rows) {
    const event = await localStore.events.get(row.id);
    if (!event) continue;
    bytes += JSON.stringify(event).length + 200;
    if (events.length > 0 && bytes > MAX_BATCH_BYTES * 0.8) break;
    events.push(event);
  }
  const notes = await localStore.notes
    .where("diagnosisId")
    .anyOf([...new Set(events.map((event) => event.diagnosisId))])
    .toArray();
  return {
    events: events.map(({ serverSeq: _place, actorId: _who, ...envelope }) => envelope),
    notes: notes
      .filter((note) => events.some((event) => JSON.stringify(event.body).includes(note.hash)))
      .map(({ diagnosisId, hash, salt, text }) => ({ diagnosisId, hash, salt, text })),
  };
}
