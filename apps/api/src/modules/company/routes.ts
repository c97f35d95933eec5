import { defineRoute } from "#http/route.ts";
import type { Route } from "#http/route.ts";
import { checkFirstRunLink, setUpInstallation } from "./first-run.ts";
import { changeCompany, readOwnCompany } from "./use-cases.ts";

/** The company's settings, and the first run of an empty installation. */
export const companyRoutes: Route[] = [
  defineRoute("readCompany", async (_input, context) => readOwnCompany(context)),
  defineRoute("updateCompany", async ({ body }, context) => changeCompany(context, body)),
  defineRoute("checkFirstRun", async ({ body }, context) => checkFirstRunLink(context, body.token)),
  defineRoute("finishFirstRun", async ({ body }, context) => setUpInstallation(context, body)),
];
