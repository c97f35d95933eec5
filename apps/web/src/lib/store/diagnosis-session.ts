import { decide, evolve, fold } from "@emberladder/diagnosis";
import type { Command, DiagnosisState, NoteText, Refusal } from "@emberladder/diagnosis";
import { appendEvents } from "./append-event.ts";
import { localStore } from "./database.ts";
import type { LocalEvent } from "./database.ts";
import { requestSend } from "./sender.ts";

export type RecordResult = { ok: true; state: DiagnosisState } | { ok: false; refusal: Refusal };

const channel =
  typeof BroadcastChannel === "undefined" ? undefined : new BroadcastChannel("emberladder-diagnoses");

/**
 * One diagnosis as this phone knows it: the folded state, and the only way to add to it. `record` decides,
 * writes durably, folds and then tells the screens, in this order, so that a screen never shows an answer that
 * a switched-off phone would lose.
 */
export class DiagnosisSession {
  readonly diagnosisId: string;
  readonly authorId: string;
  private state: DiagnosisState;
  private readonly listeners = new Set<() => void>();
  private writing: Promise<unknown> = Promise.resolve();

  private constructor(diagnosisId: string, authorId: string, state: DiagnosisState) {
    this.diagnosisId = diagnosisId;
    this.authorId = authorId;
    this.state = state;
    channel?.addEventListener("message", (message: MessageEvent<string>) => {
      if (message.data === diagnosisId) void this.reload();
    });
  }

  /** Opens a diagnosis from the local store. */
  static async open(diagnosisId: string, authorId: string): Promise<DiagnosisSession> {
    return new DiagnosisSession(diagnosisId, authorId, await readState(diagnosisId));
  }

  getState = (): DiagnosisState => this.state;

  subscribe = (listener: () => void): (() => void) => {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  };

  /**
   * Records commands as one durable step. Taps that come while a step is being written wait for it, and are
   * decided on the state after it, so that a double tap records once.
   */
  record(commands: readonly Command[], notes: readonly NoteText[] = []): Promise<RecordResult> {
    const step = this.writing.then(() => this.write(commands, notes));
    this.writing = step.catch(() => undefined);
    return step;
  }

  private async write(commands: readonly Command[], notes: readonly NoteText[]): Promise<RecordResult> {
    const decision = decide(this.state, commands, { now: Date.now() });
    if (!decision.ok) return decision;
    const added = await appendEvents({
      diagnosisId: this.diagnosisId,
      authorId: this.authorId,
      events: decision.events,
      notes,
    });
    this.state = added.reduce((state, event) => evolve(state, event), this.state);
    this.tell();
    channel?.postMessage(this.diagnosisId);
    requestSend();
    return { ok: true, state: this.state };
  }

  private async reload(): Promise<void> {
    this.state = await readState(this.diagnosisId);
    this.tell();
  }

  private tell(): void {
    this.listeners.forEach((listener) => listener());
  }
}

async function readState(diagnosisId: string): Promise<DiagnosisState> {
  const events = await localStore.events.where("diagnosisId").equals(diagnosisId).toArray();
  return fold(events.toSorted(byPlace));
}

/** Events the server has placed come first, in its order; the rest follow in the order they were made here. */
export function byPlace(a: LocalEvent, b: LocalEvent): number {
  if (a.serverSeq !== undefined && b.serverSeq !== undefined) return a.serverSeq - b.serverSeq;
  if (a.serverSeq !== undefined) return -1;
  if (b.serverSeq !== undefined) return 1;
  return a.deviceSeq - b.deviceSeq;
}
