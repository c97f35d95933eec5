import { defineRoute } from "#http/route.ts";
import type { Route } from "#http/route.ts";
import { addUnit, correctUnit, readUnitDetail } from "./use-cases.ts";

/** Units. */
export const unitRoutes: Route[] = [
  defineRoute("createUnit", async ({ body }, context) => addUnit(context, body)),
  defineRoute("readUnit", async ({ params }, context) => readUnitDetail(context, params.unitId)),
  defineRoute("updateUnit", async ({ params, body }, context) => correctUnit(context, params.unitId, body)),
];
