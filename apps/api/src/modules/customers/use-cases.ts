import type { createCustomer, createSite, InputOf, updateCustomer, updateSite } from "@emberladder/contract";
import { inTransaction } from "@emberladder/db";
import type { Actor } from "#http/actor.ts";
import { found } from "#http/api-error.ts";
import type { RequestContext } from "#http/route.ts";
import { writeAudit } from "#modules/audit/repository.ts";
import { presentCustomer, presentSite, presentUnit } from "./present-place.ts";
import {
  findCustomer,
  findSite,
  insertCustomer,
  insertSite,
  listCustomerRows,
  listSitesOf,
  listUnitsOfSites,
  updateCustomerRow,
  updateSiteRow,
} from "./repository.ts";

type Context = RequestContext<Actor>;

/** One page of the company's customers. */
export async function listCompanyCustomers(
  { database, actor }: Context,
  query: { search?: string | undefined; page: number; pageSize: number },
) {
  const { rows, total } = await listCustomerRows(database, { companyId: actor.companyId, ...query });
  const items = rows.map(({ customer, siteCount }) => ({ ...presentCustomer(customer), siteCount }));
  return { items, total, page: query.page, pageSize: query.pageSize };
}

/** One customer with sites and units. @throws ApiError `not-found`. */
export async function readCustomerDetail({ database, actor }: Context, customerId: string) {
  const customer = found(await findCustomer(database, actor.companyId, customerId));
  const sites = await listSitesOf(database, actor.companyId, customerId);
  const units = await listUnitsOfSites(
    database,
    actor.companyId,
    sites.map(({ id }) => id),
  );
  return {
    ...presentCustomer(customer),
    sites: sites.map((site) => ({
      ...presentSite(site),
      units: units.filter((unit) => unit.siteId === site.id).map(presentUnit),
    })),
  };
}

/** Adds a customer, with a first site where it is given. */
export async function addCustomer(context: Context, body: InputOf<typeof createCustomer>["body"]) {
  const { database, actor, now, newId } = context;
  const { site, ...fields } = body;
  const customerId = newId();
  const owner = { companyId: actor.companyId, createdAt: now };
  await inTransaction(database, async (tx) => {
    await insertCustomer(tx, { id: customerId, ...owner, ...fields });
    if (site) await insertSite(tx, { id: newId(), customerId, ...owner, ...site });
    await audit(tx, context, "customer.created", customerId);
  });
  return readCustomerDetail(context, customerId);
}

/** Changes a customer. @throws ApiError `not-found`. */
export async function changeCustomer(
  context: Context,
  customerId: string,
  change: InputOf<typeof updateCustomer>["body"],
) {
  const { database, actor } = context;
  found(await findCustomer(database, actor.companyId, customerId));
  await inTransaction(database, async (tx) => {
    await updateCustomerRow(tx, actor.companyId, customerId, change);
    await audit(tx, context, "customer.updated", customerId);
  });
  return readCustomerDetail(context, customerId);
}

/** Adds a site to a customer. @throws ApiError `not-found`. */
export async function addSite(
  context: Context,
  customerId: string,
  body: InputOf<typeof createSite>["body"],
) {
  const { database, actor, now, newId } = context;
  found(await findCustomer(database, actor.companyId, customerId));
  const siteId = newId();
  await insertSite(database, { id: siteId, customerId, companyId: actor.companyId, createdAt: now, ...body });
  return presentSite(found(await findSite(database, actor.companyId, siteId)));
}

/** Changes a site. @throws ApiError `not-found`. */
export async function changeSite(
  context: Context,
  siteId: string,
  change: InputOf<typeof updateSite>["body"],
) {
  const { database, actor } = context;
  found(await findSite(database, actor.companyId, siteId));
  await updateSiteRow(database, actor.companyId, siteId, change);
  return presentSite(found(await findSite(database, actor.companyId, siteId)));
}

async function audit(
  db: Parameters<typeof writeAudit>[0],
  context: Context,
  action: string,
  subjectId: string,
) {
  const { companyId, personId: actorId } = context.actor;
  await writeAudit(db, context, { action, companyId, actorId, subjectId });
}
