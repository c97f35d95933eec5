import type { JobKind } from "@emberladder/contract";
import { sendJobMail } from "#modules/mail/send-job-mail.ts";
import { renderReport } from "#modules/reports/render-report.ts";
import type { JobContext } from "./job-context.ts";
import type { JobRow } from "./repository.ts";

export type JobHandler = (
  payload: Readonly<Record<string, string>>,
  job: JobRow,
  context: JobContext,
) => Promise<void>;

/** What each kind of job does. Each may be run again after it failed half way. */
export const jobHandlers: Readonly<Record<JobKind, JobHandler>> = {
  "mail.send": async (payload, _job, context) => sendJobMail(payload, context),
  "report.render": async (payload, _job, context) => renderReport(payload, context),
};
