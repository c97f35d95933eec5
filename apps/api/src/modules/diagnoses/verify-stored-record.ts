import { envelopeSchema, hashMatches, verifyRecord } from "@emberladder/diagnosis";
import type { ChainBreak, StoredEvent } from "@emberladder/diagnosis";

/**
 * Verifies a record as it was stored. The hash of an event covers its envelope alone, so each is judged
 * without what the server added; order and both chains are judged with it.
 */
export function verifyStoredRecord(events: readonly StoredEvent[]): ChainBreak[] {
  const chain = verifyRecord(events).filter(({ reason }) => reason !== "hash");
  const hashes = events
    .filter(({ serverSeq: _s, companyId: _c, actorId: _a, receivedAt: _r, chainHash: _h, ...envelope }) => {
      const parsed = envelopeSchema.safeParse(envelope);
      return !parsed.success || !hashMatches(parsed.data);
    })
    .map(({ serverSeq }): ChainBreak => ({ serverSeq, reason: "hash" }));
  return [...hashes, ...chain].toSorted((a, b) => a.serverSeq - b.serverSeq);
}
