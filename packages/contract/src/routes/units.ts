import { z } from "zod";
import { codesSchema, unitProfileSchema } from "@emberladder/furnace";
import { MAX_COMPLAINT, MAX_NAME } from "../limits.ts";
import { defineContract } from "../route-contract.ts";
import { dateField, idField, lineOf, momentField, pageOf, pageQuery, textOf } from "../schemas/fields.ts";
import { siteSchema, unitSummarySchema } from "./customers.ts";
import { diagnosisSummarySchema } from "./diagnoses.ts";

const tag = "Units and calls";

/** A diagnosis that left the unit shut off, and that nothing has lifted since. */
export const openShutOffSchema = z
  .strictObject({ diagnosisId: idField, closedAt: momentField, technicianName: z.string() })
  .meta({ id: "OpenShutOff" });

export const unitDetailSchema = unitSummarySchema
  .extend({
    site: siteSchema,
    customerFirstName: z.string(),
    openShutOff: openShutOffSchema.nullable(),
    /** Newest first, at most fifty. */
    history: z.array(diagnosisSummarySchema),
  })
  .meta({ id: "UnitDetail" });
export type UnitDetail = z.infer<typeof unitDetailSchema>;

const unitNameField = lineOf(MAX_NAME, "a name for the unit, such as Basement furnace");

export const createUnit = defineContract({
  method: "post",
  path: "/api/units",
  access: "unit:write",
  tag,
  summary: "Add a unit to a site.",
  body: z.strictObject({ siteId: idField, name: unitNameField, profile: unitProfileSchema }),
  answer: { kind: "json", status: 201, schema: unitDetailSchema },
  errors: ["not-found", "profile-impossible"],
});

export const readUnit = defineContract({
  method: "get",
  path: "/api/units/{unitId}",
  access: "unit:read",
  tag,
  summary: "One unit with its profile, its history and any open shut-off record.",
  params: z.strictObject({ unitId: idField }),
  answer: { kind: "json", status: 200, schema: unitDetailSchema },
  errors: ["not-found"],
});

export const updateUnit = defineContract({
  method: "patch",
  path: "/api/units/{unitId}",
  access: "unit:write",
  tag,
  summary: "Correct a unit's name or profile; `version` is the one that was read.",
  params: z.strictObject({ unitId: idField }),
  body: z.strictObject({
    version: z.number().int().min(1),
    name: unitNameField.optional(),
    profile: unitProfileSchema.optional(),
  }),
  answer: { kind: "json", status: 200, schema: unitDetailSchema },
  errors: ["not-found", "profile-impossible", "changed-meanwhile"],
});

export const CALL_STATUSES = ["open", "under-way", "done", "cancelled"] as const;
export type CallStatus = (typeof CALL_STATUSES)[number];

export const callSchema = z
  .strictObject({
    id: idField,
    /** Counted per company, for people to name the call by. */
    number: z.number().int(),
    status: z.enum(CALL_STATUSES),
    complaint: z.string(),
    scheduledFor: momentField,
    assignedTo: z.strictObject({ id: idField, name: z.string() }).nullable(),
    customerFirstName: z.string(),
    site: siteSchema,
    /** The site's time zone, or the company's where the site has none. */
    timeZone: z.string(),
    unit: z.strictObject({ id: idField, name: z.string(), codes: codesSchema }),
    openShutOff: openShutOffSchema.nullable(),
    /** The diagnosis under way on this call, if there is one. */
    openDiagnosisId: idField.nullable(),
    version: z.number().int(),
  })
  .meta({ id: "Call" });
export type Call = z.infer<typeof callSchema>;

export const callDetailSchema = callSchema
  .extend({ unit: unitSummarySchema, diagnoses: z.array(diagnosisSummarySchema) })
  .meta({ id: "CallDetail" });
export type CallDetail = z.infer<typeof callDetailSchema>;

const callAnswer = { kind: "json", status: 200, schema: callDetailSchema } as const;
const callParams = z.strictObject({ callId: idField });

export const listCalls = defineContract({
  method: "get",
  path: "/api/calls",
  access: "call:read",
  tag,
  summary:
    "Calls by time. `scope=mine`: the person's own and those assigned to nobody. `date` is a day in the company's time zone.",
  query: z.strictObject({
    scope: z.enum(["mine", "all"]).default("mine"),
    date: dateField.optional(),
    from: dateField.optional(),
    to: dateField.optional(),
    status: z.enum(CALL_STATUSES).optional(),
    assignedTo: idField.optional(),
    unitId: idField.optional(),
    ...pageQuery,
  }),
  answer: { kind: "json", status: 200, schema: pageOf(callSchema) },
});

export const createCall = defineContract({
  method: "post",
  path: "/api/calls",
  access: "call:create",
  tag,
  summary: "Open a call on a unit. Only those who may assign can name somebody else.",
  body: z.strictObject({
    unitId: idField,
    complaint: textOf(MAX_COMPLAINT, "the complaint in the customer's words"),
    scheduledFor: momentField,
    assignedTo: idField.nullable().default(null),
  }),
  answer: { kind: "json", status: 201, schema: callDetailSchema },
  errors: ["not-found", "not-allowed"],
});

export const readCall = defineContract({
  method: "get",
  path: "/api/calls/{callId}",
  access: "call:read",
  tag,
  summary: "One call with its unit, site, any open shut-off record and its diagnoses.",
  params: callParams,
  answer: callAnswer,
  errors: ["not-found"],
});

export const assignCall = defineContract({
  method: "post",
  path: "/api/calls/{callId}/assign",
  access: "call:assign",
  tag,
  summary: "Assign a call, or take it from everybody with null. The person is told by e-mail.",
  params: callParams,
  body: z.strictObject({ personId: idField.nullable(), version: z.number().int().min(1) }),
  answer: callAnswer,
  errors: ["not-found", "wrong-state", "changed-meanwhile"],
  limit: "mail",
});

export const cancelCall = defineContract({
  method: "post",
  path: "/api/calls/{callId}/cancel",
  access: "call:cancel",
  tag,
  summary: "Cancel a call on which no diagnosis was begun.",
  params: callParams,
  body: z.strictObject({ version: z.number().int().min(1) }),
  answer: callAnswer,
  errors: ["not-found", "wrong-state", "changed-meanwhile"],
});
