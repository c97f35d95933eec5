import { z } from "zod";
import { defineContract } from "../route-contract.ts";
import { idField, momentField, pageOf, pageQuery } from "../schemas/fields.ts";

const tag = "System";

const upSchema = z.strictObject({ up: z.literal(true) });

export const readLive = defineContract({
  method: "get",
  path: "/health/live",
  access: "public",
  tag,
  summary: "The process answers.",
  answer: { kind: "json", status: 200, schema: upSchema },
});

export const readReady = defineContract({
  method: "get",
  path: "/health/ready",
  access: "public",
  tag,
  summary: "The process and its database answer.",
  answer: { kind: "json", status: 200, schema: upSchema },
  errors: ["database-away"],
});

export const ping = defineContract({
  method: "get",
  path: "/api/ping",
  access: "public",
  tag,
  summary:
    "The server's mode and clock in UTC milliseconds, to tell a real connection from a captive portal.",
  answer: {
    kind: "json",
    status: 200,
    schema: z.strictObject({
      product: z.literal("emberladder"),
      mode: z.enum(["demo", "live"]),
      serverTime: z.number().int(),
    }),
  },
});

export const readOpenApi = defineContract({
  method: "get",
  path: "/api/openapi.json",
  access: "public",
  tag,
  summary: "This document.",
  answer: { kind: "json", status: 200, schema: z.looseObject({ openapi: z.string() }) },
});

export const readApiPage = defineContract({
  method: "get",
  path: "/api/docs",
  access: "public",
  tag,
  summary: "This document as a page to read.",
  answer: { kind: "html", status: 200 },
});

export const readApiPageStyle = defineContract({
  method: "get",
  path: "/api/docs.css",
  access: "public",
  tag,
  summary: "The style of the server's own pages.",
  answer: { kind: "css", status: 200 },
});

export const JOB_STATES = ["waiting", "running", "done", "cancelled", "dead"] as const;
export const JOB_KINDS = ["mail.send", "report.render"] as const;
export type JobKind = (typeof JOB_KINDS)[number];

export const jobSchema = z
  .strictObject({
    id: idField,
    kind: z.string(),
    state: z.enum(JOB_STATES),
    attempts: z.number().int(),
    progress: z.number().int(),
    createdAt: momentField,
    runAfter: momentField,
    /** What went wrong at the last attempt, in words without secrets. */
    lastError: z.string().nullable(),
  })
  .meta({ id: "Job" });

const params = z.strictObject({ jobId: idField });
const jobAnswer = { kind: "json", status: 200, schema: jobSchema } as const;

export const listJobs = defineContract({
  method: "get",
  path: "/api/jobs",
  access: "job:read",
  tag,
  summary: "Work done in the background; `state=dead` lists what failed for good.",
  query: z.strictObject({ state: z.enum(JOB_STATES).optional(), ...pageQuery }),
  answer: { kind: "json", status: 200, schema: pageOf(jobSchema) },
});

export const retryJob = defineContract({
  method: "post",
  path: "/api/jobs/{jobId}/retry",
  access: "job:manage",
  tag,
  summary: "Try a failed job again.",
  params,
  answer: jobAnswer,
  errors: ["not-found", "wrong-state"],
});

export const cancelJob = defineContract({
  method: "post",
  path: "/api/jobs/{jobId}/cancel",
  access: "job:manage",
  tag,
  summary: "Give a job up.",
  params,
  answer: jobAnswer,
  errors: ["not-found", "wrong-state"],
});

export const readMailBox = defineContract({
  method: "get",
  path: "/dev/mail",
  access: "public",
  tag: "Demo",
  summary: "The demo's inbox: every message the product has sent.",
  answer: { kind: "html", status: 200 },
  demoOnly: true,
});

export const readMailMessage = defineContract({
  method: "get",
  path: "/dev/mail/{messageId}",
  access: "public",
  tag: "Demo",
  summary: "One message of the demo's inbox.",
  params: z.strictObject({ messageId: z.string().regex(/^[0-9a-z-]{1,64}$/) }),
  answer: { kind: "html", status: 200 },
  errors: ["not-found"],
  demoOnly: true,
});
