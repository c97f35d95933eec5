import type { JobKind } from "@emberladder/contract";
import { inTransaction, jobs } from "@emberladder/db";
import type { Database, Queryable } from "@emberladder/db";
import { and, asc, count, desc, eq, inArray, lt, lte, or } from "drizzle-orm";
import type { SQL } from "drizzle-orm";

export type JobRow = typeof jobs.$inferSelect;
export type JobState = JobRow["state"];

/** A job as it is asked for. */
export interface NewJob {
  id: string;
  companyId: string | null;
  kind: JobKind;
  payload: Record<string, string>;
  now: Date;
}

/** Adds work for the worker; in a transaction it stands or falls with what asked for it. */
export async function enqueueJob(db: Queryable, job: NewJob): Promise<void> {
  await db.execute(toEnqueueJob(db, job));
}

/** The statement that adds work for the worker. */
export function toEnqueueJob(db: Queryable, job: NewJob): SQL {
  return db
    .insert(jobs)
    .values({
      id: job.id,
      companyId: job.companyId,
      kind: job.kind,
      payload: job.payload,
      state: "waiting",
      attempts: 0,
      progress: 0,
      runAfter: job.now,
      createdAt: job.now,
    })
    .getSQL();
}

/**
 * Claims the next job that is due, or one whose worker died, under a lease. Workers side by side never get the
 * same one and never wait for each other.
 */
export async function claimNextJob(
  database: Database,
  now: Date,
  leaseMs: number,
): Promise<JobRow | undefined> {
  return inTransaction(database, async (tx) => {
    const [job] = await tx
      .select()
      .from(jobs)
      .where(
        or(
          and(eq(jobs.state, "waiting"), lte(jobs.runAfter, now)),
          and(eq(jobs.state, "running"), lt(jobs.leaseUntil, now)),
        ),
      )
      .orderBy(asc(jobs.runAfter))
      .limit(1)
      .for("update", { skipLocked: true });
    if (!job) return undefined;
    const claim = {
      state: "running" as const,
      attempts: job.attempts + 1,
      leaseUntil: new Date(now.getTime() + leaseMs),
    };
    await tx.update(jobs).set(claim).where(eq(jobs.id, job.id));
    return { ...job, ...claim };
  });
}

/** Changes a job that is still held by the attempt that claimed it; false when it was taken away meanwhile. */
export async function updateClaimedJob(
  db: Queryable,
  { id, attempts }: Pick<JobRow, "id" | "attempts">,
  change: Partial<typeof jobs.$inferInsert>,
): Promise<boolean> {
  const [result] = await db
    .update(jobs)
    .set(change)
    .where(and(eq(jobs.id, id), eq(jobs.attempts, attempts), eq(jobs.state, "running")));
  return result.affectedRows === 1;
}

export async function listJobs(
  db: Queryable,
  {
    companyId,
    state,
    page,
    pageSize,
  }: { companyId: string; state?: JobState | undefined; page: number; pageSize: number },
) {
  const where = and(eq(jobs.companyId, companyId), state === undefined ? undefined : eq(jobs.state, state));
  const [rows, [total]] = await Promise.all([
    db
      .select()
      .from(jobs)
      .where(where)
      .orderBy(desc(jobs.createdAt))
      .limit(pageSize)
      .offset((page - 1) * pageSize),
    db.select({ count: count() }).from(jobs).where(where),
  ]);
  return { rows, total: total?.count ?? 0 };
}

export async function findJob(db: Queryable, companyId: string, jobId: string): Promise<JobRow | undefined> {
  const [row] = await db
    .select()
    .from(jobs)
    .where(and(eq(jobs.companyId, companyId), eq(jobs.id, jobId)));
  return row;
}

/** Moves a job from one of some states to another; false when it was in none of them. */
export async function moveJob(
  db: Queryable,
  jobId: string,
  from: JobState[],
  change: Partial<typeof jobs.$inferInsert>,
): Promise<boolean> {
  const [result] = await db
    .update(jobs)
    .set(change)
    .where(and(eq(jobs.id, jobId), inArray(jobs.state, from)));
  return result.affectedRows === 1;
}
