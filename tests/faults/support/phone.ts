import { setTimeout as sleep } from "node:timers/promises";
import type { Role, Verdicts } from "@emberladder/contract";
import type { Envelope } from "@emberladder/diagnosis";
import { startRecord } from "../../api/support/record.ts";
import type { TestCompany } from "../../api/support/company.ts";

/** A phone with an outbox, which sends until everything is acknowledged, whatever happens to the other side. */
export interface Phone {
  deviceId: string;
  /** Every event it made, in order. */
  made: Envelope[];
  /** Events that the server said it has. */
  acknowledged: Set<string>;
  /** Answers that were no verdicts: their status and what they said about coming back. */
  refusals: { status: number; retryAfter: string | null; code: string | undefined }[];
  /** Sends what is in the outbox, batch by batch, until nothing is left or `stop` is called. */
  run: () => Promise<void>;
  stop: () => void;
  outbox: () => number;
}

const EVENTS_OF_A_DIAGNOSIS = 12;
const BATCH = 7;

/** A phone of somebody in a company, with so many events to send, spread over several diagnoses. */
export async function takePhone(company: TestCompany, role: Role, count: number): Promise<Phone> {
  const client = await company.clientOf(role);
  const { deviceId } = company.people[role];
  const made: Envelope[] = [];
  while (made.length < count) {
    const record = startRecord(company, { deviceId });
    made.push(record.open());
    for (let index = 1; index < EVENTS_OF_A_DIAGNOSIS; index += 1)
      made.push(record.next("unit-state.set", { calling: index % 2 === 0 }));
  }
  const waiting = [...made];
  const acknowledged = new Set<string>();
  const refusals: Phone["refusals"] = [];
  const sending = { isStopped: false };
  const sendOnce = async () => {
    const events = waiting.slice(0, BATCH);
    const answer = await client.call("sendBatch", { body: { events } });
    if (answer.status !== 200) {
      refusals.push({
        status: answer.status,
        retryAfter: answer.headers.get("retry-after"),
        code: answer.code,
      });
      await sleep(20);
      return;
    }
    const { accepted, duplicate, rejected } = answer.json<Verdicts>();
    const [refused] = rejected;
    if (refused) throw new Error(`An event was refused: ${refused.code}.`);
    for (const { id } of [...accepted, ...duplicate]) acknowledged.add(id);
    while (waiting[0] && acknowledged.has(waiting[0].id)) waiting.shift();
  };
  return {
    deviceId,
    made,
    acknowledged,
    refusals,
    outbox: () => waiting.length,
    stop: () => {
      sending.isStopped = true;
    },
    run: async () => {
      sending.isStopped = false;
      while (waiting.length > 0 && !sending.isStopped) {
        try {
          await sendOnce();
        } catch (error) {
          // The connection broke: whether the batch was taken is not known, so it is sent again.
          if (!(error instanceof TypeError)) throw error;
          await sleep(5);
        }
      }
    },
  };
}
