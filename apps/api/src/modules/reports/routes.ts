import { defineRoute } from "#http/route.ts";
import type { Route } from "#http/route.ts";
import { readLinkedPdf, readLinkedReport } from "./use-cases.ts";

/** The customer's report by its private link. */
export const reportRoutes: Route[] = [
  defineRoute("readReport", async ({ params }, context) => readLinkedReport(context, params.token)),
  defineRoute("readReportPdf", async ({ params }, context) => readLinkedPdf(context, params.token)),
];
