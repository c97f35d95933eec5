import type { Dependencies } from "#http/dependencies.ts";
import type { Mailer } from "#modules/mail/mailer.ts";

/** What a job may use while it runs. */
export interface JobContext extends Dependencies {
  mailer: Mailer;
  /** Tells how far the job is, in percent. @throws when the job was cancelled meanwhile. */
  report: (percent: number) => Promise<void>;
}
