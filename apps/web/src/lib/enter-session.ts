import type { Me } from "@emberladder/contract";
import type { QueryClient } from "@tanstack/react-query";
import { rememberLastDeviceId } from "./device-name.ts";
import { forgetHalfTyped } from "./half-typed.ts";
import { answerSignIn } from "./sign-in-again.ts";

/**
 * Takes over the answer of a sign-in: forgets what was read for whoever was here before, remembers the device,
 * and tells the session. What waits in the outbox stays.
 */
export function enterSession(client: QueryClient, me: Me): void {
  if (me.deviceId) rememberLastDeviceId(me.deviceId);
  forgetAnswers(client);
  client.setQueryData(["me"], me);
}

/** Forgets what was read, what was half typed and that anybody is signed in, at a sign-out that was asked for. */
export function leaveSession(client: QueryClient): void {
  forgetHalfTyped();
  answerSignIn(false);
  forgetAnswers(client);
  client.setQueryData(["me"], null);
}

function forgetAnswers(client: QueryClient): void {
  client.removeQueries({ predicate: (query) => query.queryKey[0] !== "me" });
}
