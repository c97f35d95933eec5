import { z } from "zod";
import { ALTITUDE_RULES } from "@emberladder/furnace";
import { MAX_NAME } from "../limits.ts";
import { defineContract } from "../route-contract.ts";
import {
  emailField,
  lineOf,
  newPasswordField,
  personNameField,
  timeZoneField,
  tokenField,
} from "../schemas/fields.ts";
import { companySchema, UNITS_SHOWN } from "./auth.ts";

const tag = "Company";

/** The settings that a company chooses for itself. */
export const companySettingsSchema = z.strictObject({
  name: lineOf(MAX_NAME, "the company's name"),
  timeZone: timeZoneField,
  altitudeRule: z.enum(ALTITUDE_RULES),
  unitsShown: z.enum(UNITS_SHOWN),
});

const companyAnswer = { kind: "json", status: 200, schema: companySchema } as const;

export const readCompany = defineContract({
  method: "get",
  path: "/api/company",
  access: "company:read",
  tag,
  summary: "The company and its settings.",
  answer: companyAnswer,
});

export const updateCompany = defineContract({
  method: "patch",
  path: "/api/company",
  access: "company:update",
  tag,
  summary: "Change the company's settings.",
  body: companySettingsSchema.partial(),
  answer: companyAnswer,
});

export const checkFirstRun = defineContract({
  method: "post",
  path: "/api/first-run/check",
  access: "public",
  tag,
  summary: "Whether a first-run link still holds.",
  body: z.strictObject({ token: tokenField }),
  answer: { kind: "json", status: 200, schema: z.strictObject({ holds: z.literal(true) }) },
  errors: ["link-expired"],
  limit: "door",
});

export const finishFirstRun = defineContract({
  method: "post",
  path: "/api/first-run",
  access: "public",
  tag,
  summary: "Set up an empty installation: its company and its first supervisor, who then signs in.",
  body: z.strictObject({
    token: tokenField,
    company: companySettingsSchema,
    supervisor: z.strictObject({ name: personNameField, email: emailField, password: newPasswordField }),
  }),
  answer: { kind: "json", status: 201, schema: companySchema },
  errors: ["link-expired", "already-set-up", "weak-password"],
  limit: "door",
});
