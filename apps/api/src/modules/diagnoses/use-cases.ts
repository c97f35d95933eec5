import type { DiagnosisDetail, Flag, InputOf, listDiagnoses } from "@emberladder/contract";
import { inTransaction } from "@emberladder/db";

import type { Actor } from "#http/actor.ts";
import { ApiError, found } from "#http/api-error.ts";
import type { RequestContext } from "#http/route.ts";
import { writeAudit } from "#modules/audit/repository.ts";
import { findCompany } from "#modules/auth/repository.ts";
import { endOfDay, startOfDay } from "#modules/calls/day-range.ts";
import { enqueueJob } from "#modules/jobs/repository.ts";
import { listEventsOf, listNotesOf, readStoredEvent } from "#modules/sync/repository.ts";
import { eraseNoteText, findNote, listNames } from "./notes/repository.ts";
import { presentSummary } from "./present-diagnosis.ts";
import { presentNotes } from "./present-notes.ts";
import { endWaiting, findHead, listFlagsOf } from "./repository.ts";
import { verifyStoredRecord } from "./verify-stored-record.ts";
import { findSummary, listSummaries } from "./summaries/repository.ts";

type Context = RequestContext<Actor>;

/** One page of diagnoses for review. Days are days of the company's time zone. */
export async function listForReview(
  { database, actor }: Context,
  query: InputOf<typeof listDiagnoses>["query"],
) {
  const { companyId } = actor;
  const { timeZone } = found(await findCompany(database, companyId));
  const { page, pageSize, from, to, ...filter } = query;
  const { rows, total } = await listSummaries(
    database,
    {
      companyId,
      ...filter,
      from: from === undefined ? undefined : startOfDay(from, timeZone),
      to: to === undefined ? undefined : endOfDay(to, timeZone),
    },
    page,
    pageSize,
  );
  return { items: rows.map(presentSummary), total, page, pageSize };
}

/** One diagnosis with its whole record and whether it is as it was received. @throws ApiError `not-found`. */
export async function readDiagnosisDetail(
  { database, actor }: Context,
  diagnosisId: string,
): Promise<DiagnosisDetail> {
  const { companyId } = actor;
  const summary = found(await findSummary(database, companyId, diagnosisId));
  const [head, eventRows, noteRows, flagRows] = await Promise.all([
    findHead(database, companyId, diagnosisId),
    listEventsOf(database, diagnosisId),
    listNotesOf(database, companyId, [diagnosisId]),
    listFlagsOf(database, companyId, diagnosisId),
  ]);
  const events = eventRows.map(readStoredEvent);
  const breaks = verifyStoredRecord(eventRows, found(head));
  const names = await listNames(
    database,
    events.map(({ actorId }) => actorId),
  );
  return {
    ...presentSummary(summary),
    events,
    notes: await presentNotes(database, noteRows),
    flagList: flagRows.map(presentFlag),
    people: [...names].map(([id, name]) => ({ id, name })),
    verification: { intact: breaks.length === 0, breaks },
  };
}

function presentFlag({
  eventId,
  rule,
  params,
}: {
  eventId: string;
  rule: string;
  params: string | null;
}): Flag {
  return {
    eventId,
    rule,
    ...(params === null ? {} : { params: JSON.parse(params) as NonNullable<Flag["params"]> }),
  };
}

/** Lets the report of a flagged closing go out. @throws ApiError `not-found`, `wrong-state`. */
export async function releaseReport(context: Context, diagnosisId: string, comment: string) {
  const { database, actor, now, newId } = context;
  found(await findSummary(database, actor.companyId, diagnosisId));
  await inTransaction(database, async (tx) => {
    if (!(await endWaiting(tx, actor.companyId, diagnosisId)))
      throw new ApiError("wrong-state", { detail: "This diagnosis does not wait for anybody." });
    await enqueueJob(tx, {
      id: newId(),
      companyId: actor.companyId,
      kind: "report.render",
      payload: { diagnosisId },
      now,
    });
    await writeAudit(tx, context, {
      action: "diagnosis.released",
      companyId: actor.companyId,
      actorId: actor.personId,
      subjectId: diagnosisId,
      details: { comment },
    });
  });
  return presentSummary(found(await findSummary(database, actor.companyId, diagnosisId)));
}

/** Erases a free text with a reason. @throws ApiError `not-found`, `wrong-state`. */
export async function eraseNoteOf(
  context: Context,
  { diagnosisId, hash }: { diagnosisId: string; hash: string },
  reason: string,
) {
  const { database, actor, now } = context;
  const note = found(await findNote(database, actor.companyId, diagnosisId, hash));
  await inTransaction(database, async (tx) => {
    const erasure = { erasedAt: now, erasedBy: actor.personId, eraseReason: reason };
    if (!(await eraseNoteText(tx, note.id, erasure)))
      throw new ApiError("wrong-state", { detail: "This text was erased before." });
    await writeAudit(tx, context, {
      action: "note.erased",
      companyId: actor.companyId,
      actorId: actor.personId,
      subjectId: diagnosisId,
      details: { hash },
    });
  });
  const [presented] = await presentNotes(database, [
    found(await findNote(database, actor.companyId, diagnosisId, hash)),
  ]);
  return found(presented);
}
