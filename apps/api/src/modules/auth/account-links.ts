import { INVITE_DAYS, RESET_HOURS } from "@emberladder/contract";
import { inTransaction } from "@emberladder/db";
import { ApiError } from "#http/api-error.ts";
import type { RequestContext } from "#http/route.ts";
import { writeAudit } from "#modules/audit/repository.ts";
import { enqueueJob } from "#modules/jobs/repository.ts";
import { findLinkedPerson, spendLink, spendLinksOf } from "./links/repository.ts";
import { hashPassword, requireStrongPassword } from "./passwords.ts";
import { deleteSessionsOf, findAccountByEmail, updateAccount } from "./repository.ts";
import { hashSecret } from "./secrets.ts";

/** How long each kind of link holds, in milliseconds. */
export const LINK_LIFE_MS = {
  invite: INVITE_DAYS * 24 * 3_600_000,
  reset: RESET_HOURS * 3_600_000,
  "first-run": 24 * 3_600_000,
} as const;

/** Asks for a reset link. The answer is the same whether or not the e-mail is known. */
export async function askForReset(context: RequestContext, email: string): Promise<void> {
  const { database, now, newId } = context;
  const account = await findAccountByEmail(database, email);
  const mayReset = account !== undefined && account.disabledAt === null && account.passwordHash !== null;
  await writeAudit(database, context, {
    action: mayReset ? "reset.asked" : "reset.asked-in-vain",
    companyId: account?.companyId ?? null,
    subjectId: account?.id ?? null,
  });
  if (mayReset)
    await enqueueJob(database, {
      id: newId(),
      companyId: account.companyId,
      kind: "mail.send",
      payload: { template: "reset", personId: account.id },
      now,
    });
}

/** Chooses a new password by a link; every session ends. @throws ApiError `link-expired`, `weak-password`. */
export async function resetByLink(
  context: RequestContext,
  body: { token: string; password: string },
): Promise<void> {
  await choosePassword(context, "reset", body);
}

/** What an invitation is for. @throws ApiError `link-expired`. */
export async function readInvitation(context: RequestContext, token: string) {
  const person = await findLinkedPerson(context.database, "invite", hashSecret(token), context.now);
  if (!person || person.disabledAt !== null) throw new ApiError("link-expired");
  const { companyName, name, email, role } = person;
  return { companyName, name, email, role };
}

/** Accepts an invitation. @throws ApiError `link-expired`, `weak-password`. */
export async function acceptInvitation(
  context: RequestContext,
  body: { token: string; password: string; name: string },
): Promise<void> {
  await choosePassword(context, "invite", body);
}

async function choosePassword(
  context: RequestContext,
  kind: "invite" | "reset",
  { token, password, name }: { token: string; password: string; name?: string },
): Promise<void> {
  const { database, now } = context;
  const tokenHash = hashSecret(token);
  const person = await findLinkedPerson(database, kind, tokenHash, now);
  if (!person || person.disabledAt !== null) throw new ApiError("link-expired");
  requireStrongPassword(password, {
    hasTwoStep: person.totpConfirmedAt !== null,
    known: [person.name, person.email, person.companyName],
  });
  const passwordHash = await hashPassword(password);
  await inTransaction(database, async (tx) => {
    if (!(await spendLink(tx, kind, tokenHash, now))) throw new ApiError("link-expired");
    await spendLinksOf(tx, kind, person.personId, now);
    await updateAccount(tx, person.personId, { passwordHash, ...(name === undefined ? {} : { name }) });
    await deleteSessionsOf(tx, person.personId);
    await writeAudit(tx, context, {
      action: kind === "invite" ? "invite.accepted" : "reset.done",
      companyId: person.companyId,
      actorId: person.personId,
      subjectId: person.personId,
    });
  });
}
