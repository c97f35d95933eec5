import { parseBody } from "@emberladder/diagnosis";
import type { EventBody } from "@emberladder/diagnosis";
import { format } from "date-fns";

export type StepMark =
  | "door"
  | "look"
  | "watch"
  | "reading"
  | "left-tree"
  | "conclusion"
  | "repair"
  | "put-back"
  | "proof"
  | "stop"
  | "other";

/** A record as the server sends it or as this phone keeps it; who made an event is known once it was received. */
export interface RecordOfSteps {
  events: readonly {
    id: string;
    type: string;
    schemaVersion: number;
    body: Record<string, unknown>;
    occurredAt: number;
    serverOffsetMs: number | null;
    deviceId: string;
    actorId?: string;
  }[];
  people: readonly { id: string; name: string }[];
}

/** One event of a record as it is shown. */
export interface Step {
  number: number;
  id: string;
  type: string;
  event: EventBody | null;
  /** UTC milliseconds on the device. */
  at: number;
  time: string;
  mark: StepMark;
  actorName: string;
  deviceId: string;
  /** The event that took this one back, if one did. */
  undone: boolean;
  /** The device clock was more than five minutes off by the server's. */
  clockOff: boolean;
}

const MARKS: Record<string, StepMark> = {
  "door.answered": "door",
  "stop.raised": "stop",
  "stop.act-recorded": "stop",
  "unit.confirmed": "door",
  "look.answered": "look",
  "watch.started": "watch",
  "watch.seen": "watch",
  "watch.ended": "watch",
  "check.answered": "reading",
  "check.declined": "left-tree",
  "tree.left": "left-tree",
  "cause.concluded": "conclusion",
  "repair.recorded": "repair",
  "put-back.opened": "put-back",
  "put-back.restored": "put-back",
  "check.started": "put-back",
  "proof.recorded": "proof",
  "diagnosis.closed": "conclusion",
};

const FIVE_MINUTES = 300_000;

/** The events of a record in their order, ready to be shown. */
export function stepsOf(record: RecordOfSteps): Step[] {
  const names = new Map(record.people.map((person) => [person.id, person.name]));
  const undone = new Set(
    record.events.flatMap((event) =>
      event.type === "event.undone" && typeof event.body["of"] === "string" ? [event.body["of"]] : [],
    ),
  );
  return record.events.map((event, index) => {
    const parsed = parseBody(event.type, event.schemaVersion, event.body);
    return {
      number: index + 1,
      id: event.id,
      type: event.type,
      event: parsed.ok && parsed.known ? parsed.event : null,
      at: event.occurredAt,
      time: format(event.occurredAt, "HH:mm:ss"),
      mark: MARKS[event.type] ?? "other",
      actorName: names.get(event.actorId ?? "") ?? "",
      deviceId: event.deviceId,
      undone: undone.has(event.id),
      clockOff: event.serverOffsetMs !== null && Math.abs(event.serverOffsetMs) > FIVE_MINUTES,
    };
  });
}
