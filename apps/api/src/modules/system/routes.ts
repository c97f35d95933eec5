import { buildOpenApi } from "@emberladder/contract/openapi";
import type { OpenApiDocument } from "@emberladder/contract/openapi";
import { defineRoute } from "#http/route.ts";
import type { Route } from "#http/route.ts";
import { renderApiPage } from "./api-page.ts";
import { pageStyle } from "./page.ts";
import { touchDatabase } from "./repository.ts";

const documents = new Map<string, OpenApiDocument>();

function openApiOf(mode: "demo" | "live"): OpenApiDocument {
  const document = documents.get(mode) ?? buildOpenApi({ demo: mode === "demo" });
  documents.set(mode, document);
  return document;
}

/** Health, clock, and the API's own description. */
export const systemRoutes: Route[] = [
  defineRoute("readLive", () => ({ up: true as const })),
  defineRoute("readReady", async (_input, { database }) => {
    await touchDatabase(database);
    return { up: true as const };
  }),
  defineRoute("ping", (_input, { environment, now }) => ({
    product: "emberladder" as const,
    mode: environment.mode,
    serverTime: now.getTime(),
  })),
  defineRoute("readOpenApi", (_input, { environment }) => ({ ...openApiOf(environment.mode) })),
  defineRoute("readApiPage", (_input, { environment }) => ({
    content: renderApiPage(openApiOf(environment.mode)),
  })),
  defineRoute("readApiPageStyle", () => ({ content: pageStyle })),
];
