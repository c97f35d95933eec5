import type { BodyOf, updateCompany } from "@emberladder/contract";
import { inTransaction } from "@emberladder/db";
import type { Actor } from "#http/actor.ts";
import { found } from "#http/api-error.ts";
import type { RequestContext } from "#http/route.ts";
import { writeAudit } from "#modules/audit/repository.ts";
import { findCompany } from "#modules/auth/repository.ts";
import { presentCompany } from "./present-company.ts";
import { updateCompanyRow } from "./repository.ts";

/** The signed-in person's company. */
export async function readOwnCompany({ database, actor }: RequestContext<Actor>) {
  return presentCompany(found(await findCompany(database, actor.companyId)));
}

/** Changes the company's settings. */
export async function changeCompany(context: RequestContext<Actor>, change: BodyOf<typeof updateCompany>) {
  const { database, actor } = context;
  await inTransaction(database, async (tx) => {
    await updateCompanyRow(tx, actor.companyId, change);
    await writeAudit(tx, context, {
      action: "company.updated",
      companyId: actor.companyId,
      actorId: actor.personId,
      details: { fields: Object.keys(change).join(" ") },
    });
  });
  return readOwnCompany(context);
}
