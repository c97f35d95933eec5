import type { Customer, Site, UnitSummary } from "@emberladder/contract";
import type { CustomerRow, SiteRow, UnitRow } from "./repository.ts";

/** A customer as those at the desk see it. */
export function presentCustomer({ id, firstName, lastName, email, phone }: CustomerRow): Customer {
  return { id, firstName, lastName, email, phone };
}

/** A site, without its company. */
export function presentSite({ companyId: _company, createdAt: _created, ...site }: SiteRow): Site {
  return site;
}

/** A unit with its profile. */
export function presentUnit({ id, siteId, name, profile, version }: UnitRow): UnitSummary {
  return { id, siteId, name, profile, version };
}
