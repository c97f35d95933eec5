import { defineRoute } from "#http/route.ts";
import type { Route } from "#http/route.ts";
import {
  changeOwnPassword,
  endOtherOwnSessions,
  endOwnSession,
  listOwnSessions,
  presentDevicesOf,
  registerOwnDevice,
  signOutPerson,
} from "./account.ts";
import { acceptInvitation, askForReset, readInvitation, resetByLink } from "./account-links.ts";
import { presentMe } from "./present-me.ts";
import { signInPerson } from "./sign-in.ts";
import {
  confirmAuthenticator,
  makeNewRecoveryCodes,
  passTwoStep,
  removeAuthenticator,
  setUpAuthenticator,
} from "./two-step.ts";

/** Sign-in, two-step codes, sessions, devices, passwords and their links. */
export const authRoutes: Route[] = [
  defineRoute("signIn", async ({ body }, context) => signInPerson(body, context)),
  defineRoute("signOut", async (_input, context) => signOutPerson(context)),
  defineRoute("readMe", async (_input, context) => presentMe(context, context.actor)),
  defineRoute("setUpTwoStep", async ({ body }, context) => setUpAuthenticator(context, body.password)),
  defineRoute("confirmTwoStep", async ({ body }, context) => confirmAuthenticator(context, body.code)),
  defineRoute("verifyTwoStep", async ({ body }, context) => passTwoStep(context, body)),
  defineRoute("renewRecoveryCodes", async ({ body }, context) => makeNewRecoveryCodes(context, body.code)),
  defineRoute("turnOffTwoStep", async ({ body }, context) => removeAuthenticator(context, body)),
  defineRoute("listSessions", async (_input, context) => ({ items: await listOwnSessions(context) })),
  defineRoute("endSession", async ({ params }, context) => endOwnSession(context, params.sessionId)),
  defineRoute("endOtherSessions", async (_input, context) => endOtherOwnSessions(context)),
  defineRoute("listOwnDevices", async (_input, context) => ({
    items: await presentDevicesOf(context, context.actor.personId),
  })),
  defineRoute("registerDevice", async ({ body }, context) => registerOwnDevice(context, body)),
  defineRoute("changePassword", async ({ body }, context) => changeOwnPassword(context, body)),
  defineRoute("requestReset", async ({ body }, context) => {
    await askForReset(context, body.email);
    return { accepted: true as const };
  }),
  defineRoute("resetPassword", async ({ body }, context) => resetByLink(context, body)),
  defineRoute("readInvite", async ({ body }, context) => readInvitation(context, body.token)),
  defineRoute("acceptInvite", async ({ body }, context) => acceptInvitation(context, body)),
];
