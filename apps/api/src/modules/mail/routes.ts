import { defineRoute } from "#http/route.ts";
import type { Route } from "#http/route.ts";
import { renderInbox, renderMessage } from "./inbox.ts";

/** The demo's inbox. Not served in mode live. */
export const mailRoutes: Route[] = [
  defineRoute("readMailBox", async (_input, { environment }) => ({
    content: await renderInbox(environment.mailDir),
  })),
  defineRoute("readMailMessage", async ({ params }, { environment }) => ({
    content: await renderMessage(environment.mailDir, params.messageId),
  })),
];
