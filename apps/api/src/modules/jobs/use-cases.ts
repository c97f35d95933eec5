import type { Actor } from "#http/actor.ts";
import { ApiError, found } from "#http/api-error.ts";
import type { RequestContext } from "#http/route.ts";
import { writeAudit } from "#modules/audit/repository.ts";
import { findJob, listJobs, moveJob } from "./repository.ts";
import type { JobRow, JobState } from "./repository.ts";

type Context = RequestContext<Actor>;

/** A job as supervisors see it; its payload stays inside. */
export function presentJob(row: JobRow) {
  return {
    id: row.id,
    kind: row.kind,
    state: row.state,
    attempts: row.attempts,
    progress: row.progress,
    createdAt: row.createdAt.toISOString(),
    runAfter: row.runAfter.toISOString(),
    lastError: row.lastError,
  };
}

/** One page of the company's jobs, newest first. */
export async function listCompanyJobs(
  { database, actor }: Context,
  query: { state?: JobState | undefined; page: number; pageSize: number },
) {
  const { rows, total } = await listJobs(database, { companyId: actor.companyId, ...query });
  return { items: rows.map(presentJob), total, page: query.page, pageSize: query.pageSize };
}

/** Puts a failed job back in the queue. @throws ApiError `not-found`, `wrong-state`. */
export async function retryFailedJob(context: Context, jobId: string) {
  return moveOwnJob(context, jobId, "job.retried", ["dead", "cancelled"], {
    state: "waiting",
    attempts: 0,
    runAfter: context.now,
    finishedAt: null,
  });
}

/** Gives a job up. @throws ApiError `not-found`, `wrong-state`. */
export async function cancelWaitingJob(context: Context, jobId: string) {
  return moveOwnJob(context, jobId, "job.cancelled", ["waiting", "running", "dead"], {
    state: "cancelled",
    finishedAt: context.now,
  });
}

async function moveOwnJob(
  context: Context,
  jobId: string,
  action: string,
  from: JobState[],
  change: Parameters<typeof moveJob>[3],
) {
  const { database, actor } = context;
  found(await findJob(database, actor.companyId, jobId));
  if (!(await moveJob(database, jobId, from, change))) throw new ApiError("wrong-state");
  await writeAudit(database, context, {
    action,
    companyId: actor.companyId,
    actorId: actor.personId,
    subjectId: jobId,
  });
  return presentJob(found(await findJob(database, actor.companyId, jobId)));
}
