import { inTransaction } from "@emberladder/db";
import type { Actor } from "#http/actor.ts";
import { ApiError, found, notFound } from "#http/api-error.ts";
import type { RequestContext } from "#http/route.ts";
import { writeAudit } from "#modules/audit/repository.ts";
import { bindDevice } from "./devices.ts";
import { hashPassword, requireStrongPassword, verifyPassword } from "./passwords.ts";
import {
  deleteOwnSession,
  deleteSession,
  deleteSessionsOf,
  findAccount,
  listDevicesOf,
  listSessionsOf,
  setSessionDevice,
  updateAccount,
} from "./repository.ts";
import { createSessionKeeper } from "./sessions.ts";
import { renewSession } from "./two-step.ts";

type Context = RequestContext<Actor>;

/** Ends this session and removes its cookie. */
export async function signOutPerson(context: Context): Promise<void> {
  await deleteSession(context.database, context.actor.sessionHash);
  context.setCookie(createSessionKeeper(context).blankCookie());
}

/** The person's own sessions. */
export async function listOwnSessions({ database, actor, now }: Context) {
  const rows = await listSessionsOf(database, actor.personId, now);
  return rows.map(({ hash, id, deviceName, startedAt, lastUsedAt, endsAt }) => ({
    id,
    deviceName,
    startedAt: startedAt.toISOString(),
    lastUsedAt: lastUsedAt.toISOString(),
    endsAt: endsAt.toISOString(),
    isThis: hash === actor.sessionHash,
  }));
}

/** Ends one own session. @throws ApiError `not-found`. */
export async function endOwnSession(context: Context, publicId: string): Promise<void> {
  const { database, actor } = context;
  if ((await deleteOwnSession(database, actor.personId, publicId)) === 0) throw notFound();
  await writeAudit(database, context, {
    action: "session.ended",
    companyId: actor.companyId,
    actorId: actor.personId,
  });
}

/** Ends all own sessions but this one. */
export async function endOtherOwnSessions(context: Context): Promise<void> {
  const { database, actor } = context;
  await deleteSessionsOf(database, actor.personId, actor.sessionHash);
  await writeAudit(database, context, {
    action: "session.others-ended",
    companyId: actor.companyId,
    actorId: actor.personId,
  });
}

/** Devices of a person as clients see them. */
export async function presentDevicesOf({ database, actor }: Context, personId: string) {
  const rows = await listDevicesOf(database, actor.companyId, personId);
  return rows.map((row) => ({
    id: row.id,
    name: row.name,
    registeredAt: row.registeredAt.toISOString(),
    lastSeenAt: row.lastSeenAt.toISOString(),
    revokedAt: row.revokedAt?.toISOString() ?? null,
    lastSeq: row.lastSeq ?? 0,
  }));
}

/** Binds this browser to the session. */
export async function registerOwnDevice(
  context: Context,
  { id, name }: { id?: string | undefined; name: string },
) {
  const { database, actor, now, newId } = context;
  const deviceId = await bindDevice(database, {
    wanted: id,
    name,
    personId: actor.personId,
    companyId: actor.companyId,
    now,
    newId,
  });
  await setSessionDevice(database, actor.sessionHash, deviceId);
  return { deviceId };
}

/** Changes the password; all sessions end and this one begins anew. @throws ApiError `wrong-password`, `weak-password`. */
export async function changeOwnPassword(
  context: Context,
  { current, next }: { current: string; next: string },
) {
  const { database, actor } = context;
  const account = found(await findAccount(database, actor.personId));
  if (!(await verifyPassword(account.passwordHash, current))) throw new ApiError("wrong-password");
  requireStrongPassword(next, { hasTwoStep: actor.hasTwoStep, known: [account.name, account.email] });
  const passwordHash = await hashPassword(next);
  await inTransaction(database, async (tx) => {
    await updateAccount(tx, actor.personId, { passwordHash });
    await deleteSessionsOf(tx, actor.personId);
    await writeAudit(tx, context, {
      action: "password.changed",
      companyId: actor.companyId,
      actorId: actor.personId,
    });
  });
  return renewSession(context, { hasTwoStep: actor.hasTwoStep });
}
