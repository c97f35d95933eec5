import { defineRoute } from "#http/route.ts";
import type { Route } from "#http/route.ts";
import { listCompanyTrees, readTreeDocument } from "./use-cases.ts";

/** Published decision trees. */
export const treeRoutes: Route[] = [
  defineRoute("listTrees", async (_input, context) => ({ items: await listCompanyTrees(context) })),
  defineRoute("readTreeVersion", async ({ params }, context) =>
    readTreeDocument(context, params.treeId, params.version),
  ),
];
