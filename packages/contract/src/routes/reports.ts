import { z } from "zod";
import { defineContract } from "../route-contract.ts";
import { momentField, tokenField } from "../schemas/fields.ts";

const tag = "Customer report";

export const SAFE_STATES = ["safe", "shut-off", "not-running"] as const;

/** What the customer reads: words only, made when the report was, so that it never changes afterwards. */
export const reportContentSchema = z
  .strictObject({
    companyName: z.string(),
    isDemo: z.boolean(),
    callNumber: z.number().int(),
    customerFirstName: z.string(),
    siteAddress: z.string(),
    unitName: z.string(),
    technicianName: z.string(),
    /** The visit in the site's time with its abbreviation, as written on the report. */
    visited: z.string(),
    complaint: z.string(),
    found: z.array(z.string()),
    done: z.array(z.string()),
    measured: z.array(
      z.strictObject({ what: z.string(), reading: z.string(), expected: z.string(), verdict: z.string() }),
    ),
    safe: z.strictObject({ state: z.enum(SAFE_STATES), text: z.string() }),
    next: z.array(z.string()),
    cautions: z.array(z.string()),
    /** Head of the record's chain, so that a printed report can be held against the record. */
    recordHash: z.string(),
  })
  .meta({ id: "ReportContent" });
export type ReportContent = z.infer<typeof reportContentSchema>;

export const reportSchema = reportContentSchema
  .extend({ madeAt: momentField, linkHoldsUntil: momentField, hasPdf: z.boolean() })
  .meta({ id: "Report" });

const params = z.strictObject({ token: tokenField });

export const readReport = defineContract({
  method: "get",
  path: "/api/reports/{token}",
  access: "public",
  tag,
  summary: "The customer's report by its private link.",
  params,
  answer: { kind: "json", status: 200, schema: reportSchema },
  errors: ["link-expired"],
  limit: "door",
});

export const readReportPdf = defineContract({
  method: "get",
  path: "/api/reports/{token}/pdf",
  access: "public",
  tag,
  summary: "The same report as PDF.",
  params,
  answer: { kind: "pdf", status: 200 },
  errors: ["link-expired", "not-found"],
  limit: "door",
});
