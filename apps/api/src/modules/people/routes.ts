import { defineRoute } from "#http/route.ts";
import type { Route } from "#http/route.ts";
import {
  changePerson,
  endSessionsOfPerson,
  inviteAgain,
  inviteNewPerson,
  letPersonIn,
  listCompanyPeople,
  listDevicesOfPerson,
  removeTwoStepOfPerson,
  revokeLostDevice,
  shutOutPerson,
} from "./use-cases.ts";

/** People of the company, their sessions, second factors and devices. */
export const peopleRoutes: Route[] = [
  defineRoute("listPeople", async (_input, context) => ({ items: await listCompanyPeople(context) })),
  defineRoute("invitePerson", async ({ body }, context) => inviteNewPerson(context, body)),
  defineRoute("resendInvite", async ({ params }, context) => inviteAgain(context, params.personId)),
  defineRoute("updatePerson", async ({ params, body }, context) =>
    changePerson(context, params.personId, body),
  ),
  defineRoute("disablePerson", async ({ params }, context) => shutOutPerson(context, params.personId)),
  defineRoute("enablePerson", async ({ params }, context) => letPersonIn(context, params.personId)),
  defineRoute("endPersonSessions", async ({ params }, context) =>
    endSessionsOfPerson(context, params.personId),
  ),
  defineRoute("removePersonTwoStep", async ({ params }, context) =>
    removeTwoStepOfPerson(context, params.personId),
  ),
  defineRoute("listPersonDevices", async ({ params }, context) => ({
    items: await listDevicesOfPerson(context, params.personId),
  })),
  defineRoute("revokeDevice", async ({ params }, context) => revokeLostDevice(context, params.deviceId)),
];
