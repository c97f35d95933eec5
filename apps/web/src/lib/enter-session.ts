import type { Me } from "@emberladder/contract";
import type { QueryClient } from "@tanstack/react-query";
import { rememberLastDeviceId } from "./device-name.ts";

/**
 * Takes over the answer of a sign-in: forgets what was read for whoever was here before, remembers the device,
 * and tells the session. What waits in the outbox stays.
 */
export function enterSession(client: QueryClient, me: Me): void {
  if (me.deviceId) rememberLastDeviceId(me.deviceId);
  forgetAnswers(client);
  client.setQueryData(["me"], me);
}

/** Forgets what was read and that anybody is signed in, at sign-out. */
export function leaveSession(client: QueryClient): void {
  forgetAnswers(client);
  client.setQueryData(["me"], null);
}

function forgetAnswers(client: QueryClient): void {
  client.removeQueries({ predicate: (query) => query.queryKey[0] !== "me" });
}
