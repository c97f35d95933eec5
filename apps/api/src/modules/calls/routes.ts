import { defineRoute } from "#http/route.ts";
import type { Route } from "#http/route.ts";
import { assignCallTo, cancelOpenCall, listCompanyCalls, openCall, readCallDetail } from "./use-cases.ts";

/** Calls: list, open, assign, cancel. What happens on one is in its diagnoses. */
export const callRoutes: Route[] = [
  defineRoute("listCalls", async ({ query }, context) => listCompanyCalls(context, query)),
  defineRoute("createCall", async ({ body }, context) => openCall(context, body)),
  defineRoute("readCall", async ({ params }, context) => readCallDetail(context, params.callId)),
  defineRoute("assignCall", async ({ params, body }, context) => assignCallTo(context, params.callId, body)),
  defineRoute("cancelCall", async ({ params, body }, context) =>
    cancelOpenCall(context, params.callId, body.version),
  ),
];
