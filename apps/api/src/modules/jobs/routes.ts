import { defineRoute } from "#http/route.ts";
import type { Route } from "#http/route.ts";
import { cancelWaitingJob, listCompanyJobs, retryFailedJob } from "./use-cases.ts";

/** Background work, for supervisors. */
export const jobRoutes: Route[] = [
  defineRoute("listJobs", async ({ query }, context) => listCompanyJobs(context, query)),
  defineRoute("retryJob", async ({ params }, context) => retryFailedJob(context, params.jobId)),
  defineRoute("cancelJob", async ({ params }, context) => cancelWaitingJob(context, params.jobId)),
];
