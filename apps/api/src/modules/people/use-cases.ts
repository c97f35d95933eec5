import type { Person, Role } from "@emberladder/contract";
import { inTransaction, readDuplicateKey } from "@emberladder/db";
import type { Transaction } from "@emberladder/db";
import type { Actor } from "#http/actor.ts";
import { ApiError, found } from "#http/api-error.ts";
import type { RequestContext } from "#http/route.ts";
import { writeAudit } from "#modules/audit/repository.ts";
import { presentDevicesOf } from "#modules/auth/account.ts";
import { spendLinksOf } from "#modules/auth/links/repository.ts";
import { deleteSessionsOf, deleteSessionsOfDevice, updateDevice } from "#modules/auth/repository.ts";
import { clearAuthenticator } from "#modules/auth/two-step.ts";
import { insertPerson } from "#modules/company/repository.ts";
import { enqueueJob } from "#modules/jobs/repository.ts";
import {
  findCompanyDevice,
  findPerson,
  listPeopleOf,
  lockActiveSupervisors,
  updatePersonRow,
} from "./repository.ts";
import type { PersonRow } from "./repository.ts";

type Context = RequestContext<Actor>;

function presentPerson(row: PersonRow): Person {
  const accepted = row.passwordHash === null ? "invited" : "active";
  return {
    id: row.id,
    name: row.name,
    email: row.email,
    role: row.role,
    state: row.disabledAt === null ? accepted : "disabled",
    hasTwoStep: row.totpConfirmedAt !== null,
    invitedAt: row.createdAt.toISOString(),
    lastSeenAt: row.lastSeenAt?.toISOString() ?? null,
  };
}

/** The company's people by name. */
export async function listCompanyPeople({ database, actor }: Context): Promise<Person[]> {
  return (await listPeopleOf(database, actor.companyId)).map(presentPerson);
}

async function readPerson({ database, actor }: Context, personId: string): Promise<Person> {
  return presentPerson(found(await findPerson(database, actor.companyId, personId)));
}

/** Invites somebody by e-mail. @throws ApiError `email-taken`. */
export async function inviteNewPerson(
  context: Context,
  body: { name: string; email: string; role: Role },
): Promise<Person> {
  const { database, actor, now, newId } = context;
  const personId = newId();
  try {
    await inTransaction(database, async (tx) => {
      await insertPerson(tx, { id: personId, companyId: actor.companyId, ...body, createdAt: now });
      await mailInvite(tx, context, personId);
      await audit(tx, context, "person.invited", personId, { role: body.role });
    });
  } catch (error) {
    if (readDuplicateKey(error) === "people_email") throw new ApiError("email-taken");
    throw error;
  }
  return readPerson(context, personId);
}

/** Sends an invitation again. @throws ApiError `not-found`, `wrong-state`. */
export async function inviteAgain(context: Context, personId: string): Promise<void> {
  const person = found(await findPerson(context.database, context.actor.companyId, personId));
  if (person.passwordHash !== null || person.disabledAt !== null)
    throw new ApiError("wrong-state", {
      detail: "Only somebody who has not accepted yet can be invited again.",
    });
  await inTransaction(context.database, async (tx) => {
    await mailInvite(tx, context, personId);
    await audit(tx, context, "person.invited-again", personId);
  });
}

async function mailInvite(tx: Transaction, { actor, now, newId }: Context, personId: string): Promise<void> {
  await enqueueJob(tx, {
    id: newId(),
    companyId: actor.companyId,
    kind: "mail.send",
    payload: { template: "invite", personId },
    now,
  });
}

/** Changes a name or a role; a changed role ends the sessions. @throws ApiError `not-found`, `last-supervisor`. */
export async function changePerson(
  context: Context,
  personId: string,
  change: { name?: string | undefined; role?: Role | undefined },
): Promise<Person> {
  const { database, actor } = context;
  await inTransaction(database, async (tx) => {
    const person = found(await findPerson(tx, actor.companyId, personId));
    const hasNewRole = change.role !== undefined && change.role !== person.role;
    if (hasNewRole && person.role === "supervisor") await keepOneSupervisor(tx, context, personId);
    await updatePersonRow(tx, actor.companyId, personId, change);
    if (hasNewRole) await deleteSessionsOf(tx, personId);
    await audit(
      tx,
      context,
      "person.updated",
      personId,
      hasNewRole ? { role: change.role ?? person.role } : {},
    );
  });
  return readPerson(context, personId);
}

/** Shuts somebody out at once. @throws ApiError `not-found`, `last-supervisor`. */
export async function shutOutPerson(context: Context, personId: string): Promise<Person> {
  const { database, actor, now } = context;
  await inTransaction(database, async (tx) => {
    const person = found(await findPerson(tx, actor.companyId, personId));
    if (person.disabledAt !== null) return;
    if (person.role === "supervisor") await keepOneSupervisor(tx, context, personId);
    await updatePersonRow(tx, actor.companyId, personId, { disabledAt: now });
    await deleteSessionsOf(tx, personId);
    await spendLinksOf(tx, "invite", personId, now);
    await spendLinksOf(tx, "reset", personId, now);
    await audit(tx, context, "person.disabled", personId);
  });
  return readPerson(context, personId);
}

/** Lets somebody in again. @throws ApiError `not-found`. */
export async function letPersonIn(context: Context, personId: string): Promise<Person> {
  const { database, actor } = context;
  await inTransaction(database, async (tx) => {
    found(await findPerson(tx, actor.companyId, personId));
    await updatePersonRow(tx, actor.companyId, personId, { disabledAt: null });
    await audit(tx, context, "person.enabled", personId);
  });
  return readPerson(context, personId);
}

/** Ends all sessions of a person. @throws ApiError `not-found`. */
export async function endSessionsOfPerson(context: Context, personId: string): Promise<void> {
  const { database, actor } = context;
  found(await findPerson(database, actor.companyId, personId));
  await deleteSessionsOf(database, personId);
  await audit(database, context, "person.sessions-ended", personId);
}

/** Removes a lost authenticator. @throws ApiError `not-found`. */
export async function removeTwoStepOfPerson(context: Context, personId: string): Promise<Person> {
  const { database, actor, now } = context;
  await inTransaction(database, async (tx) => {
    found(await findPerson(tx, actor.companyId, personId));
    await clearAuthenticator(tx, personId, now);
    await deleteSessionsOf(tx, personId);
    await audit(tx, context, "two-step.removed-by-supervisor", personId);
  });
  return readPerson(context, personId);
}

/** The devices of a person. @throws ApiError `not-found`. */
export async function listDevicesOfPerson(context: Context, personId: string) {
  found(await findPerson(context.database, context.actor.companyId, personId));
  return presentDevicesOf(context, personId);
}

/** Revokes a device: its sessions end and its events are refused. @throws ApiError `not-found`. */
export async function revokeLostDevice(context: Context, deviceId: string) {
  const { database, actor, now } = context;
  const device = found(await findCompanyDevice(database, actor.companyId, deviceId));
  await inTransaction(database, async (tx) => {
    await updateDevice(tx, deviceId, { revokedAt: device.revokedAt ?? now });
    await deleteSessionsOfDevice(tx, deviceId);
    await audit(tx, context, "device.revoked", deviceId);
  });
  const devices = await presentDevicesOf(context, device.personId);
  return found(devices.find(({ id }) => id === deviceId));
}

async function keepOneSupervisor(tx: Transaction, { actor }: Context, leaving: string): Promise<void> {
  const supervisors = await lockActiveSupervisors(tx, actor.companyId);
  if (supervisors.every((id) => id === leaving)) throw new ApiError("last-supervisor");
}

async function audit(
  db: Parameters<typeof writeAudit>[0],
  context: Context,
  action: string,
  subjectId: string,
  details: Record<string, string> = {},
): Promise<void> {
  const { companyId, personId: actorId } = context.actor;
  await writeAudit(db, context, { action, companyId, actorId, subjectId, details });
}
