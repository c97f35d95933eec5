import { z } from "zod";
import { defineContract } from "../route-contract.ts";
import { emailField, idField, momentField, personNameField, roleField } from "../schemas/fields.ts";
import { deviceSchema } from "./auth.ts";

const tag = "People";

export const PERSON_STATES = ["invited", "active", "disabled"] as const;

export const personSchema = z
  .strictObject({
    id: idField,
    name: z.string(),
    email: z.string(),
    role: roleField,
    state: z.enum(PERSON_STATES),
    hasTwoStep: z.boolean(),
    invitedAt: momentField,
    lastSeenAt: momentField.nullable(),
  })
  .meta({ id: "Person" });
export type Person = z.infer<typeof personSchema>;

const params = z.strictObject({ personId: idField });
const personAnswer = { kind: "json", status: 200, schema: personSchema } as const;

export const listPeople = defineContract({
  method: "get",
  path: "/api/people",
  access: "person:list",
  tag,
  summary: "The people of the company, by name.",
  answer: { kind: "json", status: 200, schema: z.strictObject({ items: z.array(personSchema) }) },
});

export const invitePerson = defineContract({
  method: "post",
  path: "/api/people/invites",
  access: "person:manage",
  tag,
  summary: "Invite somebody; a link goes out by e-mail.",
  body: z.strictObject({ name: personNameField, email: emailField, role: roleField }),
  answer: { kind: "json", status: 201, schema: personSchema },
  errors: ["email-taken"],
  limit: "mail",
});

export const resendInvite = defineContract({
  method: "post",
  path: "/api/people/{personId}/invite",
  access: "person:manage",
  tag,
  summary: "Send the invitation again with a new link.",
  params,
  answer: { kind: "empty", status: 204 },
  errors: ["not-found", "wrong-state"],
  limit: "mail",
});

export const updatePerson = defineContract({
  method: "patch",
  path: "/api/people/{personId}",
  access: "person:manage",
  tag,
  summary: "Change a name or a role. A changed role ends the person's sessions.",
  params,
  body: z
    .strictObject({ name: personNameField, role: roleField })
    .partial()
    .refine((body) => Object.keys(body).length > 0, "Name what to change."),
  answer: personAnswer,
  errors: ["not-found", "last-supervisor"],
});

export const disablePerson = defineContract({
  method: "post",
  path: "/api/people/{personId}/disable",
  access: "person:manage",
  tag,
  summary: "Shut somebody out at once. Their record stays.",
  params,
  answer: personAnswer,
  errors: ["not-found", "last-supervisor"],
});

export const enablePerson = defineContract({
  method: "post",
  path: "/api/people/{personId}/enable",
  access: "person:manage",
  tag,
  summary: "Let somebody in again.",
  params,
  answer: personAnswer,
  errors: ["not-found"],
});

export const endPersonSessions = defineContract({
  method: "post",
  path: "/api/people/{personId}/end-sessions",
  access: "person:manage",
  tag,
  summary: "End all sessions of a person.",
  params,
  answer: { kind: "empty", status: 204 },
  errors: ["not-found"],
});

export const removePersonTwoStep = defineContract({
  method: "post",
  path: "/api/people/{personId}/remove-two-step",
  access: "person:manage",
  tag,
  summary: "Remove a lost authenticator: its sessions end and a new one has to be set up where required.",
  params,
  answer: personAnswer,
  errors: ["not-found"],
});

export const listPersonDevices = defineContract({
  method: "get",
  path: "/api/people/{personId}/devices",
  access: "person:manage",
  tag,
  summary: "The devices of a person.",
  params,
  answer: { kind: "json", status: 200, schema: z.strictObject({ items: z.array(deviceSchema) }) },
  errors: ["not-found"],
});

export const revokeDevice = defineContract({
  method: "post",
  path: "/api/devices/{deviceId}/revoke",
  access: "device:revoke",
  tag,
  summary: "Revoke a lost device: its sessions end and it can send nothing more.",
  params: z.strictObject({ deviceId: idField }),
  answer: { kind: "json", status: 200, schema: deviceSchema },
  errors: ["not-found"],
});
