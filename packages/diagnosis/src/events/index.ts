import type { z } from "zod";
import { checkEvents } from "./check-events.ts";
import { closingEvents } from "./closing-events.ts";
import { visitEvents } from "./visit-events.ts";

/** Every event type of a diagnosis with the schema of its body, at the newest schema version. */
export const eventBodySchemas = { ...visitEvents, ...checkEvents, ...closingEvents };

export type EventType = keyof typeof eventBodySchemas;
export type BodyOf<T extends EventType> = z.infer<(typeof eventBodySchemas)[T]>;
export type EventBody = { [T in EventType]: { type: T; body: BodyOf<T> } }[EventType];

/** The newest schema version of event bodies. A stored body is never rewritten; `upcast` reads older ones. */
export const BODY_SCHEMA_VERSION = 1;

export type ParsedBody =
  | { ok: true; known: true; event: EventBody }
  | { ok: true; known: false }
  | { ok: false; issues: { path: string; message: string }[] };

/** Whether this build knows an event type. */
export function isKnownType(type: string): type is EventType {
  return Object.hasOwn(eventBodySchemas, type);
}

/**
 * Reads the body of an event. A type or a schema version this build does not know is not an error: it is
 * kept as it is and shown as an unknown step, so that an older server or phone loses nothing.
 */
export function parseBody(type: string, schemaVersion: number, body: unknown): ParsedBody {
  if (!isKnownType(type) || schemaVersion > BODY_SCHEMA_VERSION) return { ok: true, known: false };
  const parsed = eventBodySchemas[type].safeParse(upcastBody(type, schemaVersion, body));
  if (parsed.success) return { ok: true, known: true, event: { type, body: parsed.data } as EventBody };
  return {
    ok: false,
    issues: parsed.error.issues.map((issue) => ({ path: issue.path.join("."), message: issue.message })),
  };
}

/**
 * Brings a stored body of an older schema version to the newest one, on read. Version 1 is the first, so
 * there is nothing to bring up yet; golden events of every released version are a test.
 */
export function upcastBody(_type: EventType, _schemaVersion: number, body: unknown): unknown {
  return body;
}
