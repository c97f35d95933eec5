import { JOB_KINDS } from "@emberladder/contract";
import type { JobKind } from "@emberladder/contract";
import { describeFault } from "#http/error-handler.ts";
import type { Dependencies } from "#http/dependencies.ts";
import type { Mailer } from "#modules/mail/mailer.ts";
import { jobHandlers } from "./job-handlers.ts";
import { claimNextJob, updateClaimedJob } from "./repository.ts";
import type { JobRow } from "./repository.ts";
import { LEASE_MS, MOST_ATTEMPTS, pauseAfter } from "./retry-policy.ts";

/** Thrown by a job that can never succeed, with words for the supervisor's list. */
export class JobImpossible extends Error {}

class JobTakenAway extends Error {}

type Worker = Dependencies & { mailer: Mailer };

/**
 * Claims and runs one job. A failure is tried again after a pause; past the last attempt, or where no attempt
 * can help, the job is dead and waits for a supervisor.
 * @returns false when nothing was due
 */
export async function runNextJob(worker: Worker): Promise<boolean> {
  const { database, clock } = worker;
  const job = await claimNextJob(database, new Date(clock()), LEASE_MS);
  if (!job) return false;
  // A lease that ran out so often means a job that kills its worker.
  if (job.attempts > MOST_ATTEMPTS) {
    await bury(worker, job, "The worker ended every time this was tried.");
    return true;
  }
  const renewal = setInterval(() => void renewLease(worker, job), LEASE_MS / 3);
  try {
    if (!isKnownKind(job.kind)) throw new JobImpossible("This version does not know this kind of work.");
    await jobHandlers[job.kind](job.payload, job, {
      ...worker,
      report: async (percent) => {
        if (!(await updateClaimedJob(database, job, { progress: percent }))) throw new JobTakenAway();
      },
    });
    await updateClaimedJob(database, job, {
      state: "done",
      progress: 100,
      lastError: null,
      leaseUntil: null,
      finishedAt: new Date(clock()),
    });
  } catch (error) {
    await handleFailure(worker, job, error);
  } finally {
    clearInterval(renewal);
  }
  return true;
}

function isKnownKind(kind: string): kind is JobKind {
  return (JOB_KINDS as readonly string[]).includes(kind);
}

async function renewLease({ database, clock, log }: Worker, job: JobRow): Promise<void> {
  try {
    await updateClaimedJob(database, job, { leaseUntil: new Date(clock() + LEASE_MS) });
  } catch {
    log.warn({ jobId: job.id }, "lease not renewed");
  }
}

async function handleFailure(worker: Worker, job: JobRow, error: unknown): Promise<void> {
  const { database, clock, log } = worker;
  if (error instanceof JobTakenAway) return;
  log.error(
    { jobId: job.id, kind: job.kind, attempt: job.attempts, fault: describeFault(error) },
    "job failed",
  );
  const words = describeFailure(error);
  if (error instanceof JobImpossible || job.attempts >= MOST_ATTEMPTS) {
    await bury(worker, job, words);
    return;
  }
  await updateClaimedJob(database, job, {
    state: "waiting",
    runAfter: new Date(clock() + pauseAfter(job.attempts, Math.random)),
    leaseUntil: null,
    lastError: words,
  });
}

async function bury({ database, clock }: Worker, job: JobRow, words: string): Promise<void> {
  await updateClaimedJob(database, job, {
    state: "dead",
    leaseUntil: null,
    lastError: words.slice(0, 200),
    finishedAt: new Date(clock()),
  });
}

/** Words for the list of failed work: what kind of failure, never an address or a value. */
function describeFailure(error: unknown): string {
  if (error instanceof JobImpossible) return error.message;
  const code = error instanceof Error ? (error as { code?: unknown }).code : undefined;
  if (typeof code === "string" && /^(E[A-Z]+)$/.test(code))
    return `The mail server could not be reached (${code}).`;
  return "It did not succeed; the log has the details.";
}
