import type { finishFirstRun, InputOf } from "@emberladder/contract";
import { inTransaction, installShippedTrees } from "@emberladder/db";
import { ApiError } from "#http/api-error.ts";
import type { Dependencies } from "#http/dependencies.ts";
import type { RequestContext } from "#http/route.ts";
import { writeAudit } from "#modules/audit/repository.ts";
import { LINK_LIFE_MS } from "#modules/auth/account-links.ts";
import { doesLinkHold, insertLink, spendLink, spendLinksOf } from "#modules/auth/links/repository.ts";
import { hashPassword, requireStrongPassword } from "#modules/auth/passwords.ts";
import { hashSecret, makeToken } from "#modules/auth/secrets.ts";
import { presentCompany } from "./present-company.ts";
import { countCompanies, countForeignCompanies, insertCompany, insertPerson } from "./repository.ts";

/**
 * Makes a new one-time link for the first run when the installation has no company yet; earlier ones end.
 * There is no default account: this link, printed where the server was started, is the only way in.
 * @returns the link, or undefined when the installation is set up already
 */
export async function openFirstRun(dependencies: Dependencies): Promise<string | undefined> {
  const { database, environment, clock, random } = dependencies;
  if ((await countCompanies(database)) > 0) return undefined;
  const token = makeToken(random);
  const now = new Date(clock());
  await inTransaction(database, async (tx) => {
    await spendLinksOf(tx, "first-run", null, now);
    await insertLink(tx, {
      tokenHash: hashSecret(token),
      kind: "first-run",
      personId: null,
      createdAt: now,
      expiresAt: new Date(now.getTime() + LINK_LIFE_MS["first-run"]),
    });
  });
  return `${environment.publicOrigin}/first-run/${token}`;
}

/** Whether the data belongs to the mode in which the server runs: demo rows never mix with live ones. */
export async function isDataOfMode({ database, environment }: Dependencies): Promise<boolean> {
  return (await countForeignCompanies(database, environment.mode)) === 0;
}

/** @throws ApiError `link-expired`. */
export async function checkFirstRunLink({ database, now }: RequestContext, token: string) {
  if (!(await doesLinkHold(database, "first-run", hashSecret(token), now)))
    throw new ApiError("link-expired");
  return { holds: true as const };
}

/**
 * Sets up an empty installation: its company and first supervisor, who signs in afterwards and sets up
 * two-step codes.
 * @throws ApiError `link-expired`, `already-set-up`, `weak-password`.
 */
export async function setUpInstallation(
  context: RequestContext,
  body: InputOf<typeof finishFirstRun>["body"],
) {
  const { database, environment, now, newId } = context;
  const tokenHash = hashSecret(body.token);
  if (!(await doesLinkHold(database, "first-run", tokenHash, now))) throw new ApiError("link-expired");
  const { name, email, password } = body.supervisor;
  requireStrongPassword(password, { hasTwoStep: false, known: [name, email, body.company.name] });
  const passwordHash = await hashPassword(password);
  const company = { id: newId(), ...body.company, mode: environment.mode, nextCallNumber: 1, createdAt: now };
  const personId = newId();
  await inTransaction(database, async (tx) => {
    if (!(await spendLink(tx, "first-run", tokenHash, now))) throw new ApiError("link-expired");
    if ((await countCompanies(tx)) > 0) throw new ApiError("already-set-up");
    await insertCompany(tx, company);
    await installShippedTrees(tx, company.id, now);
    await insertPerson(tx, {
      id: personId,
      companyId: company.id,
      name,
      email,
      role: "supervisor",
      passwordHash,
      createdAt: now,
    });
    await writeAudit(tx, context, { action: "first-run.done", companyId: company.id, actorId: personId });
  });
  return presentCompany(company);
}
