import type { RejectionCode } from "@emberladder/contract";
import { canonicalText, envelopeSchema } from "@emberladder/diagnosis";
import type { Envelope } from "@emberladder/diagnosis";
import { hashText } from "./hash-text.ts";
import { readEventBody } from "./judge.ts";
import type { ReadBody } from "./judge.ts";

/** One event of a batch that has its shape and its hash. */
export interface GoodItem {
  index: number;
  envelope: Envelope;
  /** The text that was hashed: what is stored. */
  text: string;
  read: ReadBody;
}

/** One event that cannot be taken, with what can be told of it. */
export interface BadItem {
  index: number;
  id: string | null;
  diagnosisId: string | null;
  code: RejectionCode;
  detail?: string;
}

export type Item = GoodItem | BadItem;

/** Whether an item was read well. */
export const isGood = (item: Item): item is GoodItem => "envelope" in item;

/** Reads one event of a batch by itself: envelope, hash, body. It never throws. */
export function readItem(raw: unknown, index: number): Item {
  const parsed = envelopeSchema.safeParse(raw);
  if (!parsed.success) {
    const [issue] = parsed.error.issues;
    return bad(raw, index, "malformed", `${issue?.path.join(".") ?? ""}: ${issue?.message ?? ""}`);
  }
  const envelope = parsed.data;
  let text: string;
  try {
    text = canonicalText(envelope);
  } catch {
    return bad(raw, index, "malformed", "The body holds something that JSON cannot carry.");
  }
  if (hashText(text) !== envelope.hash) return bad(raw, index, "wrong-hash");
  const read = readEventBody(envelope);
  if (read.kind === "malformed") return bad(raw, index, "malformed", read.detail);
  return { index, envelope, text, read };
}

function bad(raw: unknown, index: number, code: RejectionCode, detail?: string): BadItem {
  const { id, diagnosisId } = (raw ?? {}) as { id?: unknown; diagnosisId?: unknown };
  const asId = (value: unknown) => (typeof value === "string" ? value.slice(0, 64) : null);
  return {
    index,
    id: asId(id),
    diagnosisId: asId(diagnosisId),
    code,
    ...(detail ? { detail: detail.slice(0, 200) } : {}),
  };
}

/** The items of a batch by diagnosis, in the order in which they came. Those of no readable diagnosis stand alone. */
export function groupItems(items: readonly Item[]): Item[][] {
  const groups = new Map<string, Item[]>();
  for (const item of items) {
    const key = (isGood(item) ? item.envelope.diagnosisId : item.diagnosisId) ?? `none ${item.index}`;
    const group = groups.get(key);
    if (group) group.push(item);
    else groups.set(key, [item]);
  }
  return [...groups.values()];
}
