import type { createCall, InputOf, listCalls } from "@emberladder/contract";
import { inTransaction } from "@emberladder/db";
import type { Transaction } from "@emberladder/db";
import { requirePermission } from "#http/actor.ts";
import type { Actor } from "#http/actor.ts";
import { ApiError, found } from "#http/api-error.ts";
import type { RequestContext } from "#http/route.ts";
import { writeAudit } from "#modules/audit/repository.ts";
import { findCompany } from "#modules/auth/repository.ts";
import { enqueueJob } from "#modules/jobs/repository.ts";
import { findPerson } from "#modules/people/repository.ts";
import { findUnitPlace } from "#modules/units/repository.ts";
import { endOfDay, startOfDay } from "./day-range.ts";
import { presentCallDetail, presentCalls } from "./present-call.ts";
import { findCallRow, insertCall, listCallRows, takeCallNumber, updateCallRow } from "./repository.ts";

type Context = RequestContext<Actor>;

/** One page of calls. Days are days of the company's time zone. */
export async function listCompanyCalls(
  { database, actor }: Context,
  query: InputOf<typeof listCalls>["query"],
) {
  const { companyId } = actor;
  const { timeZone } = found(await findCompany(database, companyId));
  const { scope, date, page, pageSize, status, assignedTo, unitId } = query;
  const from = date ?? query.from;
  const to = date ?? query.to;
  const { rows, total } = await listCallRows(
    database,
    {
      companyId,
      mineOf: scope === "mine" ? actor.personId : undefined,
      from: from === undefined ? undefined : startOfDay(from, timeZone),
      to: to === undefined ? undefined : endOfDay(to, timeZone),
      status,
      assignedTo,
      unitId,
    },
    page,
    pageSize,
  );
  return { items: await presentCalls(database, companyId, rows), total, page, pageSize };
}

/** One call. @throws ApiError `not-found`. */
export async function readCallDetail({ database, actor }: Context, callId: string) {
  const row = found(await findCallRow(database, actor.companyId, callId));
  return presentCallDetail(database, actor.companyId, row);
}

/**
 * Opens a call on a unit. Somebody without the right to assign may take it themselves or leave it open.
 * @throws ApiError `not-found`, `not-allowed`.
 */
export async function openCall(context: Context, body: InputOf<typeof createCall>["body"]) {
  const { database, actor, now, newId } = context;
  const { companyId } = actor;
  const { unitId, complaint, scheduledFor, assignedTo } = body;
  if (assignedTo !== null && assignedTo !== actor.personId) requirePermission(actor, "call:assign");
  found(await findUnitPlace(database, companyId, unitId));
  if (assignedTo !== null) await requireAssignable(context, assignedTo);
  const callId = newId();
  await inTransaction(database, async (tx) => {
    await insertCall(tx, {
      id: callId,
      companyId,
      number: await takeCallNumber(tx, companyId),
      unitId,
      assignedTo,
      status: "open",
      complaint,
      scheduledFor: new Date(scheduledFor),
      createdBy: actor.personId,
      createdAt: now,
    });
    await tellAssigned(tx, context, callId, assignedTo);
    await audit(tx, context, "call.created", callId);
  });
  return readCallDetail(context, callId);
}

/** Assigns a call, or frees it. @throws ApiError `not-found`, `wrong-state`, `changed-meanwhile`. */
export async function assignCallTo(
  context: Context,
  callId: string,
  { personId, version }: { personId: string | null; version: number },
) {
  const { database, actor } = context;
  const { call } = found(await findCallRow(database, actor.companyId, callId));
  if (call.status === "done" || call.status === "cancelled")
    throw new ApiError("wrong-state", { detail: "This call is finished." });
  if (personId !== null) await requireAssignable(context, personId);
  await inTransaction(database, async (tx) => {
    const key = { companyId: actor.companyId, callId, version };
    if (!(await updateCallRow(tx, key, { assignedTo: personId }))) throw new ApiError("changed-meanwhile");
    if (personId !== call.assignedTo) await tellAssigned(tx, context, callId, personId);
    await audit(tx, context, "call.assigned", callId);
  });
  return readCallDetail(context, callId);
}

/** Cancels a call on which nobody has begun. @throws ApiError `not-found`, `wrong-state`, `changed-meanwhile`. */
export async function cancelOpenCall(context: Context, callId: string, version: number) {
  const { database, actor } = context;
  const { call } = found(await findCallRow(database, actor.companyId, callId));
  if (call.status !== "open")
    throw new ApiError("wrong-state", { detail: "Only a call that nobody has begun can be cancelled." });
  await inTransaction(database, async (tx) => {
    const key = { companyId: actor.companyId, callId, version };
    if (!(await updateCallRow(tx, key, { status: "cancelled" }))) throw new ApiError("changed-meanwhile");
    await audit(tx, context, "call.cancelled", callId);
  });
  return readCallDetail(context, callId);
}

async function requireAssignable({ database, actor }: Context, personId: string): Promise<void> {
  const person = found(await findPerson(database, actor.companyId, personId));
  if (person.disabledAt !== null)
    throw new ApiError("wrong-state", { detail: "That person cannot sign in any more." });
}

async function tellAssigned(
  tx: Transaction,
  { actor, now, newId }: Context,
  callId: string,
  personId: string | null,
) {
  if (personId === null || personId === actor.personId) return;
  await enqueueJob(tx, {
    id: newId(),
    companyId: actor.companyId,
    kind: "mail.send",
    payload: { template: "call-assigned", callId, personId },
    now,
  });
}

async function audit(tx: Transaction, context: Context, action: string, subjectId: string): Promise<void> {
  const { companyId, personId: actorId } = context.actor;
  await writeAudit(tx, context, { action, companyId, actorId, subjectId });
}
