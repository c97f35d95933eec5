import { TWO_STEP_ROLES } from "@emberladder/contract";
import type { Me } from "@emberladder/contract";
import { inTransaction, openSecret, readDuplicateKey, sealSecret } from "@emberladder/db";
import type { Queryable } from "@emberladder/db";
import type { Actor } from "#http/actor.ts";
import { ApiError, found } from "#http/api-error.ts";
import type { RequestContext } from "#http/route.ts";
import { writeAudit } from "#modules/audit/repository.ts";
import { verifyPassword } from "./passwords.ts";
import { presentMe } from "./present-me.ts";
import {
  deleteSession,
  deleteSessionsOf,
  findAccount,
  insertUsedStep,
  lockAccount,
  replaceRecoveryCodes,
  spendRecoveryCode,
  updateAccount,
} from "./repository.ts";
import { hashRecoveryCode, makeRecoveryCodes } from "./secrets.ts";
import { createSessionKeeper } from "./sessions.ts";
import { describeTotpSecret, matchTotpStep, TOTP_SECRET_BYTES } from "./totp.ts";

type Context = RequestContext<Actor>;

/**
 * Makes a new authenticator secret that waits for its first code. Where one is in use already, only a session
 * that has passed it and names the password may replace it.
 * @throws ApiError `wrong-state`, `wrong-password`.
 */
export async function setUpAuthenticator(context: Context, password: string | undefined) {
  const { actor, database, environment, random } = context;
  const account = found(await findAccount(database, actor.personId));
  if (account.totpConfirmedAt !== null) {
    if (!actor.twoStepPassed)
      throw new ApiError("wrong-state", { detail: "Enter a code of your authenticator first." });
    if (password === undefined || !(await verifyPassword(account.passwordHash, password)))
      throw new ApiError("wrong-password");
  }
  const secret = random(TOTP_SECRET_BYTES);
  await updateAccount(database, actor.personId, {
    totpPending: sealSecret(secret, environment.sessionSecret),
  });
  return describeTotpSecret(secret, account.email);
}

/**
 * Turns the waiting authenticator on with its first code: a new session begins, all others end, and new
 * recovery codes are shown this once.
 * @throws ApiError `wrong-state`, `wrong-code`.
 */
export async function confirmAuthenticator(
  context: Context,
  code: string,
): Promise<{ recoveryCodes: string[]; me: Me }> {
  const { actor, database, environment, now, random } = context;
  const recoveryCodes = makeRecoveryCodes(random);
  await inTransaction(database, async (tx) => {
    const account = found(await lockAccount(tx, actor.personId));
    if (account.totpPending === null)
      throw new ApiError("wrong-state", { detail: "Start the set-up again for a new secret." });
    await useCode(tx, context, openSecret(account.totpPending, environment.sessionSecret), code);
    await updateAccount(tx, actor.personId, {
      totpSecret: account.totpPending,
      totpPending: null,
      totpConfirmedAt: now,
    });
    await replaceRecoveryCodes(tx, actor.personId, recoveryCodes.map(hashRecoveryCode), now);
    await deleteSessionsOf(tx, actor.personId);
    await writeAudit(tx, context, {
      action: "two-step.on",
      companyId: actor.companyId,
      actorId: actor.personId,
    });
  });
  return { recoveryCodes, me: await renewSession(context, { hasTwoStep: true }) };
}

/**
 * Passes the two-step code of this sign-in, or spends a recovery code; the session gets a new secret.
 * @throws ApiError `wrong-state`, `wrong-code`.
 */
export async function passTwoStep(
  context: Context,
  proof: { code: string } | { recoveryCode: string },
): Promise<Me> {
  const { actor, database, now } = context;
  const who = { companyId: actor.companyId, actorId: actor.personId };
  try {
    await inTransaction(database, async (tx) => {
      const secret = await readSecret(tx, context);
      if ("code" in proof) await useCode(tx, context, secret, proof.code);
      else if (!(await spendRecoveryCode(tx, actor.personId, hashRecoveryCode(proof.recoveryCode), now)))
        throw new ApiError("wrong-code");
      await deleteSession(tx, actor.sessionHash);
      const action = "code" in proof ? "two-step.passed" : "two-step.recovery-code-spent";
      await writeAudit(tx, context, { ...who, action });
    });
  } catch (error) {
    if (error instanceof ApiError && error.code === "wrong-code")
      await writeAudit(database, context, { ...who, action: "two-step.failed" });
    throw error;
  }
  return renewSession(context, { hasTwoStep: true });
}

/** New recovery codes in place of the old ones. @throws ApiError `wrong-state`, `wrong-code`. */
export async function makeNewRecoveryCodes(
  context: Context,
  code: string,
): Promise<{ recoveryCodes: string[]; me: Me }> {
  const { actor, database, now, random } = context;
  const codes = makeRecoveryCodes(random);
  await inTransaction(database, async (tx) => {
    await useCode(tx, context, await readSecret(tx, context), code);
    await replaceRecoveryCodes(tx, actor.personId, codes.map(hashRecoveryCode), now);
    await writeAudit(tx, context, {
      action: "two-step.recovery-codes-renewed",
      companyId: actor.companyId,
      actorId: actor.personId,
    });
  });
  return { recoveryCodes: codes, me: await presentMe(context, actor) };
}

/** Turns two-step codes off. @throws ApiError `wrong-state` where the role needs them, `wrong-password`, `wrong-code`. */
export async function removeAuthenticator(
  context: Context,
  proof: { password: string; code: string },
): Promise<Me> {
  const { actor, database } = context;
  if (TWO_STEP_ROLES.includes(actor.role))
    throw new ApiError("wrong-state", { detail: "Your role needs two-step codes." });
  const account = found(await findAccount(database, actor.personId));
  if (!(await verifyPassword(account.passwordHash, proof.password))) throw new ApiError("wrong-password");
  await inTransaction(database, async (tx) => {
    await useCode(tx, context, await readSecret(tx, context), proof.code);
    await clearAuthenticator(tx, actor.personId, context.now);
    await deleteSessionsOf(tx, actor.personId);
    await writeAudit(tx, context, {
      action: "two-step.off",
      companyId: actor.companyId,
      actorId: actor.personId,
    });
  });
  return renewSession(context, { hasTwoStep: false });
}

/** Takes a person's authenticator and recovery codes away. */
export async function clearAuthenticator(db: Queryable, personId: string, now: Date): Promise<void> {
  await updateAccount(db, personId, { totpSecret: null, totpPending: null, totpConfirmedAt: null });
  await replaceRecoveryCodes(db, personId, [], now);
}

async function readSecret(db: Queryable, { actor, environment }: Context): Promise<Uint8Array> {
  const account = found(await lockAccount(db, actor.personId));
  if (account.totpSecret === null || account.totpConfirmedAt === null)
    throw new ApiError("wrong-state", { detail: "Two-step codes are not set up." });
  return openSecret(account.totpSecret, environment.sessionSecret);
}

async function useCode(
  db: Queryable,
  { actor, now, newId }: Context,
  secret: Uint8Array,
  code: string,
): Promise<void> {
  const step = await matchTotpStep(secret, code, now);
  if (step === undefined) throw new ApiError("wrong-code");
  try {
    await insertUsedStep(db, { id: newId(), personId: actor.personId, step });
  } catch (error) {
    // The same code again, perhaps by somebody who looked over a shoulder.
    if (readDuplicateKey(error) !== undefined) throw new ApiError("wrong-code");
    throw error;
  }
}

/** A new session for the same person and device, its two-step code passed. */
export async function renewSession(context: Context, { hasTwoStep }: { hasTwoStep: boolean }): Promise<Me> {
  const { actor, now } = context;
  const { cookie } = await createSessionKeeper(context).begin({
    personId: actor.personId,
    role: actor.role,
    deviceId: actor.deviceId,
    twoStepPassed: true,
    now,
  });
  context.setCookie(cookie);
  return presentMe(context, { ...actor, twoStepPassed: true, hasTwoStep });
}
