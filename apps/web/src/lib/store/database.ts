import type { Envelope, NoteText } from "@emberladder/diagnosis";
import { Dexie } from "dexie";
import type { EntityTable } from "dexie";

/** An event on this phone: made here, or pulled from the server. */
export interface LocalEvent extends Envelope {
  /** Place on the server, once it is known. */
  serverSeq?: number;
  actorId?: string;
}

/** An event that waits to be sent, bound to the person who made it. */
export interface OutboxRow {
  id: string;
  diagnosisId: string;
  deviceSeq: number;
  authorId: string;
  addedAt: number;
  /** Why the server did not take it, in the contract's words; kept until it is solved. */
  problem?: { code: string; detail?: string; at: number };
}

/** A free text of a diagnosis beside its events. */
export interface LocalNote extends NoteText {
  diagnosisId: string;
}

/** Something read from the server that the field flow needs when there is no signal. */
export interface CachedDocument {
  key: string;
  value: unknown;
  storedAt: number;
}

interface MetaRow {
  key: string;
  value: unknown;
}

/**
 * The store of the field flow on this phone. Event and outbox row are written in one transaction with
 * strict durability: when a screen says "saved", the phone may be switched off.
 */
export class LocalStore extends Dexie {
  declare events: EntityTable<LocalEvent, "id">;
  declare outbox: EntityTable<OutboxRow, "id">;
  declare notes: EntityTable<LocalNote, "hash">;
  declare documents: EntityTable<CachedDocument, "key">;
  declare meta: EntityTable<MetaRow, "key">;

  constructor(name = "emberladder") {
    super(name, { chromeTransactionDurability: "strict" });
    this.version(1).stores({
      events: "id, diagnosisId, [diagnosisId+deviceId]",
      outbox: "id, diagnosisId, deviceSeq, authorId",
      notes: "hash, diagnosisId",
      documents: "key",
      meta: "key",
    });
  }
}

export const localStore = new LocalStore();
