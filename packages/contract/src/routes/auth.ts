import { z } from "zod";
import { ALTITUDE_RULES } from "@emberladder/furnace";
import { MAX_DEVICE_NAME } from "../limits.ts";
import { PERMISSIONS } from "../roles.ts";
import type { Permission } from "../roles.ts";
import { defineContract } from "../route-contract.ts";
import {
  emailField,
  idField,
  lineOf,
  momentField,
  newPasswordField,
  passwordField,
  personNameField,
  recoveryCodeField,
  roleField,
  timeZoneField,
  tokenField,
  twoStepCodeField,
} from "../schemas/fields.ts";

const tag = "Account";

export const MODES = ["demo", "live"] as const;
export const UNITS_SHOWN = ["inch-pound", "si"] as const;

export const companySchema = z
  .strictObject({
    id: idField,
    name: z.string(),
    timeZone: timeZoneField,
    altitudeRule: z.enum(ALTITUDE_RULES),
    unitsShown: z.enum(UNITS_SHOWN),
    mode: z.enum(MODES),
  })
  .meta({ id: "Company" });
export type Company = z.infer<typeof companySchema>;

/** How far the two-step codes of a session and its person are. */
export const TWO_STEP_STATES = ["off", "passed", "needed", "set-up-needed"] as const;

export const meSchema = z
  .strictObject({
    person: z.strictObject({ id: idField, name: z.string(), email: z.string(), role: roleField }),
    company: companySchema,
    /** `needed` and `set-up-needed` limit the session to the two-step routes. */
    twoStep: z.enum(TWO_STEP_STATES),
    permissions: z.array(z.enum(Object.keys(PERMISSIONS) as [Permission, ...Permission[]])),
    deviceId: idField.nullable(),
    /** Server clock, UTC milliseconds: a sample for the offset of the device clock. */
    serverTime: z.number().int(),
  })
  .meta({ id: "Me" });
export type Me = z.infer<typeof meSchema>;

const meAnswer = { kind: "json", status: 200, schema: meSchema } as const;
const deviceNameField = lineOf(MAX_DEVICE_NAME, "a name for the device");

export const signIn = defineContract({
  method: "post",
  path: "/api/auth/sign-in",
  access: "public",
  tag,
  summary:
    "Sign in. `device.id` is the id this browser was given before; a new one comes back where it has none, or where it belongs to somebody else.",
  body: z.strictObject({
    email: emailField,
    password: passwordField,
    device: z.strictObject({ id: idField.optional(), name: deviceNameField }).optional(),
  }),
  answer: meAnswer,
  errors: ["sign-in-failed", "too-many-requests"],
});

export const signOut = defineContract({
  method: "post",
  path: "/api/auth/sign-out",
  access: "session",
  tag,
  summary: "End this session.",
  answer: { kind: "empty", status: 204 },
});

export const readMe = defineContract({
  method: "get",
  path: "/api/auth/me",
  access: "session",
  tag,
  summary: "Who is signed in, what they may do, and how far the two-step code is.",
  answer: meAnswer,
});

export const setUpTwoStep = defineContract({
  method: "post",
  path: "/api/auth/two-step/set-up",
  access: "session",
  tag,
  summary:
    "A new secret for an authenticator. It counts only once confirmed with a code. The password is asked for where codes are on already.",
  body: z.strictObject({ password: passwordField.optional() }),
  answer: {
    kind: "json",
    status: 200,
    schema: z.strictObject({ secret: z.string(), uri: z.string() }),
  },
  errors: ["wrong-state", "wrong-password"],
  limit: "factor",
});

export const recoveryCodesSchema = z.strictObject({ recoveryCodes: z.array(z.string()), me: meSchema });

export const confirmTwoStep = defineContract({
  method: "post",
  path: "/api/auth/two-step/confirm",
  access: "session",
  tag,
  summary: "Turn two-step codes on with a first code. Other sessions end; recovery codes are shown once.",
  body: z.strictObject({ code: twoStepCodeField }),
  answer: { kind: "json", status: 200, schema: recoveryCodesSchema },
  errors: ["wrong-code", "wrong-state"],
  limit: "factor",
});

export const verifyTwoStep = defineContract({
  method: "post",
  path: "/api/auth/two-step/verify",
  access: "session",
  tag,
  summary: "Pass the two-step code of this sign-in, or spend a recovery code.",
  body: z.union([
    z.strictObject({ code: twoStepCodeField }),
    z.strictObject({ recoveryCode: recoveryCodeField }),
  ]),
  answer: meAnswer,
  errors: ["wrong-code", "wrong-state"],
  limit: "factor",
});

export const renewRecoveryCodes = defineContract({
  method: "post",
  path: "/api/auth/two-step/recovery-codes",
  access: "signed-in",
  tag,
  summary: "New recovery codes; the old ones stop working.",
  body: z.strictObject({ code: twoStepCodeField }),
  answer: { kind: "json", status: 200, schema: recoveryCodesSchema },
  errors: ["wrong-code", "wrong-state"],
  limit: "factor",
});

export const turnOffTwoStep = defineContract({
  method: "post",
  path: "/api/auth/two-step/turn-off",
  access: "signed-in",
  tag,
  summary: "Turn two-step codes off. Refused where the role needs them.",
  body: z.strictObject({ password: passwordField, code: twoStepCodeField }),
  answer: meAnswer,
  errors: ["wrong-code", "wrong-password", "wrong-state"],
  limit: "factor",
});

export const sessionSchema = z
  .strictObject({
    id: idField,
    deviceName: z.string().nullable(),
    startedAt: momentField,
    lastUsedAt: momentField,
    endsAt: momentField,
    isThis: z.boolean(),
  })
  .meta({ id: "Session" });

export const listSessions = defineContract({
  method: "get",
  path: "/api/auth/sessions",
  access: "signed-in",
  tag,
  summary: "The person's own sessions.",
  answer: { kind: "json", status: 200, schema: z.strictObject({ items: z.array(sessionSchema) }) },
});

export const endSession = defineContract({
  method: "delete",
  path: "/api/auth/sessions/{sessionId}",
  access: "signed-in",
  tag,
  summary: "End one of the person's own sessions.",
  params: z.strictObject({ sessionId: idField }),
  answer: { kind: "empty", status: 204 },
  errors: ["not-found"],
});

export const endOtherSessions = defineContract({
  method: "post",
  path: "/api/auth/sessions/end-others",
  access: "signed-in",
  tag,
  summary: "End all of the person's sessions but this one.",
  answer: { kind: "empty", status: 204 },
});

export const deviceSchema = z
  .strictObject({
    id: idField,
    name: z.string(),
    registeredAt: momentField,
    lastSeenAt: momentField,
    revokedAt: momentField.nullable(),
    /** Highest number this device has used in the record; 0 before the first. */
    lastSeq: z.number().int(),
  })
  .meta({ id: "Device" });

export const listOwnDevices = defineContract({
  method: "get",
  path: "/api/auth/devices",
  access: "signed-in",
  tag,
  summary: "The person's own devices.",
  answer: { kind: "json", status: 200, schema: z.strictObject({ items: z.array(deviceSchema) }) },
});

export const registerDevice = defineContract({
  method: "post",
  path: "/api/auth/devices",
  access: "signed-in",
  tag,
  summary: "Bind this browser to the session as a device, where sign-in did not.",
  body: z.strictObject({ id: idField.optional(), name: deviceNameField }),
  answer: { kind: "json", status: 200, schema: z.strictObject({ deviceId: idField }) },
});

export const changePassword = defineContract({
  method: "post",
  path: "/api/auth/password",
  access: "signed-in",
  tag,
  summary: "Change the password. Other sessions end.",
  body: z.strictObject({ current: passwordField, next: newPasswordField }),
  answer: meAnswer,
  errors: ["wrong-password", "weak-password"],
  limit: "factor",
});

export const requestReset = defineContract({
  method: "post",
  path: "/api/auth/reset-requests",
  access: "public",
  tag,
  summary: "Ask for a link to choose a new password. The answer never says whether the e-mail is known.",
  body: z.strictObject({ email: emailField }),
  answer: { kind: "json", status: 202, schema: z.strictObject({ accepted: z.literal(true) }) },
  limit: "door",
});

export const resetPassword = defineContract({
  method: "post",
  path: "/api/auth/resets",
  access: "public",
  tag,
  summary: "Choose a new password by a link. All sessions end; two-step codes stay on.",
  body: z.strictObject({ token: tokenField, password: newPasswordField }),
  answer: { kind: "empty", status: 204 },
  errors: ["link-expired", "weak-password"],
  limit: "door",
});

export const readInvite = defineContract({
  method: "post",
  path: "/api/auth/invites/read",
  access: "public",
  tag,
  summary: "What an invitation link is for. A post, so that its secret stays out of addresses.",
  body: z.strictObject({ token: tokenField }),
  answer: {
    kind: "json",
    status: 200,
    schema: z.strictObject({
      companyName: z.string(),
      name: z.string(),
      email: z.string(),
      role: roleField,
    }),
  },
  errors: ["link-expired"],
  limit: "door",
});

export const acceptInvite = defineContract({
  method: "post",
  path: "/api/auth/invites/accept",
  access: "public",
  tag,
  summary: "Accept an invitation by choosing a password; then sign in.",
  body: z.strictObject({ token: tokenField, name: personNameField, password: newPasswordField }),
  answer: { kind: "empty", status: 204 },
  errors: ["link-expired", "weak-password"],
  limit: "door",
});
