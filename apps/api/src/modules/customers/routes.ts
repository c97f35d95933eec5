import { defineRoute } from "#http/route.ts";
import type { Route } from "#http/route.ts";
import {
  addCustomer,
  addSite,
  changeCustomer,
  changeSite,
  listCompanyCustomers,
  readCustomerDetail,
} from "./use-cases.ts";

/** Customers and their sites. */
export const customerRoutes: Route[] = [
  defineRoute("listCustomers", async ({ query }, context) => listCompanyCustomers(context, query)),
  defineRoute("createCustomer", async ({ body }, context) => addCustomer(context, body)),
  defineRoute("readCustomer", async ({ params }, context) => readCustomerDetail(context, params.customerId)),
  defineRoute("updateCustomer", async ({ params, body }, context) =>
    changeCustomer(context, params.customerId, body),
  ),
  defineRoute("createSite", async ({ params, body }, context) => addSite(context, params.customerId, body)),
  defineRoute("updateSite", async ({ params, body }, context) => changeSite(context, params.siteId, body)),
];
