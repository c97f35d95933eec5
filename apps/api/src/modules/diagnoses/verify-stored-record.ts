import { verifyRecord } from "@emberladder/diagnosis";
import type { ChainBreak, StoredEvent } from "@emberladder/diagnosis";
import { hashText } from "#modules/sync/hash-text.ts";
import type { EventRow } from "#modules/sync/repository.ts";
import { readStoredEvent } from "#modules/sync/repository.ts";

/**
 * Verifies a record as it lies in the database: the events by their own hashes and both chains, the text of
 * each against its hash and against the columns that lists read, and the end of the record against the head
 * of the diagnosis, so that an event cut off at the end is missed too.
 *
 * @returns the breaks in order of place; none when the record is as it was received
 */
export function verifyStoredRecord(
  rows: readonly EventRow[],
  head: { serverSeq: number; chainHash: string },
): ChainBreak[] {
  const events = rows.map(readStoredEvent);
  const breaks = verifyRecord(events);
  const isKnown = (wanted: ChainBreak) =>
    breaks.some(({ serverSeq, reason }) => serverSeq === wanted.serverSeq && reason === wanted.reason);
  const report = (found: ChainBreak) => {
    if (!isKnown(found)) breaks.push(found);
  };
  rows.forEach((row, index) => {
    const event = events[index];
    if (!event || hashText(row.canonicalText) !== row.hash || !isSame(row, event))
      report({ serverSeq: row.serverSeq, reason: "hash" });
  });
  const last = rows.at(-1);
  if (last?.serverSeq !== head.serverSeq)
    report({ serverSeq: (last?.serverSeq ?? 0) + 1, reason: "server-order" });
  else if (last.chainHash !== head.chainHash) report({ serverSeq: last.serverSeq, reason: "server-chain" });
  return breaks.toSorted((a, b) => a.serverSeq - b.serverSeq);
}

/** Whether the columns beside a text say the same as the text. */
function isSame(row: EventRow, event: StoredEvent): boolean {
  return (
    row.id === event.id &&
    row.diagnosisId === event.diagnosisId &&
    row.deviceId === event.deviceId &&
    row.deviceSeq === event.deviceSeq &&
    row.type === event.type &&
    row.schemaVersion === event.schemaVersion &&
    row.prevHash === event.prevHash
  );
}
