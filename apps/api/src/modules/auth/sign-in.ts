import { createHash } from "node:crypto";
import { TWO_STEP_ROLES } from "@emberladder/contract";
import type { InputOf, Me, signIn } from "@emberladder/contract";
import { ApiError } from "#http/api-error.ts";
import type { RequestContext } from "#http/route.ts";
import { writeAudit } from "#modules/audit/repository.ts";
import { bindDevice } from "./devices.ts";
import { verifyPassword } from "./passwords.ts";
import { presentMe } from "./present-me.ts";
import { findAccountByEmail } from "./repository.ts";
import { createSessionKeeper } from "./sessions.ts";
import { forgetTries, takeTry } from "./throttle/repository.ts";
import { FREE_TRIES, FREE_TRIES_PER_ACCOUNT } from "./throttle/throttle-policy.ts";

/**
 * Signs somebody in. Unknown, disabled, not yet accepted and wrong password all get the same answer in the
 * same time. Where a two-step code is on or required, the session is limited until the code is passed.
 */
export async function signInPerson(
  { email, password, device }: InputOf<typeof signIn>["body"],
  context: RequestContext,
): Promise<Me> {
  const { database, now, address, newId } = context;
  const keys = throttleKeys(email, address);
  const waitUntil = await takeTry(database, keys, now);
  if (waitUntil)
    throw new ApiError("too-many-requests", {
      retryAfterSeconds: Math.ceil((waitUntil.getTime() - now.getTime()) / 1000),
    });

  const account = await findAccountByEmail(database, email);
  const isRight = await verifyPassword(account?.passwordHash ?? null, password);
  if (!account || !isRight || account.disabledAt !== null) {
    await writeAudit(database, context, {
      action: "sign-in.failed",
      companyId: account?.companyId ?? null,
      subjectId: account?.id ?? null,
    });
    throw new ApiError("sign-in-failed");
  }
  await forgetTries(
    database,
    keys.map(({ hash }) => hash),
  );

  const { id: personId, companyId, role, name } = account;
  const deviceId = device
    ? await bindDevice(database, { wanted: device.id, name: device.name, personId, companyId, now, newId })
    : null;
  const hasTwoStep = account.totpConfirmedAt !== null;
  const twoStepPassed = !hasTwoStep && !TWO_STEP_ROLES.includes(role);
  const { cookie } = await createSessionKeeper(context).begin({
    personId,
    role,
    deviceId,
    twoStepPassed,
    now,
  });
  await writeAudit(database, context, {
    action: "sign-in.done",
    companyId,
    actorId: personId,
    subjectId: deviceId,
  });
  context.setCookie(cookie);
  return presentMe(context, {
    personId,
    companyId,
    role,
    name,
    email: account.email,
    deviceId,
    twoStepPassed,
    hasTwoStep,
  });
}

function throttleKeys(email: string, address: string) {
  const hash = (text: string) => createHash("sha256").update(text).digest("hex");
  return [
    { hash: hash(`account ${email}\naddress ${address}`), freeTries: FREE_TRIES },
    { hash: hash(`account ${email}`), freeTries: FREE_TRIES_PER_ACCOUNT },
  ];
}
