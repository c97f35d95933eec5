import { defineRoute } from "#http/route.ts";
import type { Route } from "#http/route.ts";
import { pullAfterHeads, takeBatch } from "./use-cases.ts";

/** Sending and fetching the events of diagnoses. */
export const syncRoutes: Route[] = [
  defineRoute("sendBatch", async ({ body }, context) => takeBatch(context, body)),
  defineRoute("pullEvents", async ({ body }, context) => pullAfterHeads(context, body.heads)),
];
