import { authRoutes } from "#modules/auth/routes.ts";
import { callRoutes } from "#modules/calls/routes.ts";
import { companyRoutes } from "#modules/company/routes.ts";
import { customerRoutes } from "#modules/customers/routes.ts";
import { diagnosisRoutes } from "#modules/diagnoses/routes.ts";
import { jobRoutes } from "#modules/jobs/routes.ts";
import { mailRoutes } from "#modules/mail/routes.ts";
import { peopleRoutes } from "#modules/people/routes.ts";
import { reportRoutes } from "#modules/reports/routes.ts";
import { syncRoutes } from "#modules/sync/routes.ts";
import { systemRoutes } from "#modules/system/routes.ts";
import { treeRoutes } from "#modules/trees/routes.ts";
import { unitRoutes } from "#modules/units/routes.ts";
import type { Route } from "./http/route.ts";

/** Every route of the server with its handler. */
export const routes: readonly Route[] = [
  ...systemRoutes,
  ...authRoutes,
  ...companyRoutes,
  ...peopleRoutes,
  ...customerRoutes,
  ...unitRoutes,
  ...callRoutes,
  ...syncRoutes,
  ...diagnosisRoutes,
  ...treeRoutes,
  ...reportRoutes,
  ...jobRoutes,
  ...mailRoutes,
];
