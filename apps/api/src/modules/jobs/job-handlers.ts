import type { JobKind } from "@emberladder/contract";
import type { Dependencies } from "#http/dependencies.ts";
import { sendJobMail } from "#modules/mail/send-job-mail.ts";
import type { Mailer } from "#modules/mail/mailer.ts";
import { renderReport } from "#modules/reports/render-report.ts";
import type { JobRow } from "./repository.ts";

/** What a job may use while it runs. */
export interface JobContext extends Dependencies {
  mailer: Mailer;
  /** Tells how far the job is, in percent. @throws when the job was cancelled meanwhile. */
  report: (percent: number) => Promise<void>;
}

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
