import { envelopeSchema, noteTextSchema } from "@emberladder/diagnosis";
import { z } from "zod";
import { MAX_BATCH_BYTES, MAX_BATCH_EVENTS, MAX_BATCH_NOTES, MAX_PULL_HEADS, MAX_REASON } from "../limits.ts";
import { REJECTION_CODES } from "../error-codes.ts";
import { defineContract } from "../route-contract.ts";
import { dateField, hashField, idField, momentField, pageOf, pageQuery, textOf } from "../schemas/fields.ts";

const tag = "Diagnoses";

export const DIAGNOSIS_STATUSES = ["open", "closed"] as const;

/** A rule of the trade that a record breaks, or a thing about the record a supervisor should know. */
export const flagSchema = z
  .strictObject({
    eventId: idField,
    rule: z.string(),
    params: z.record(z.string(), z.union([z.string(), z.number(), z.boolean()])).optional(),
  })
  .meta({ id: "Flag" });
export type Flag = z.infer<typeof flagSchema>;

export const diagnosisSummarySchema = z
  .strictObject({
    id: idField,
    callId: idField,
    callNumber: z.number().int(),
    unitId: idField,
    unitName: z.string(),
    technician: z.strictObject({ id: idField, name: z.string() }),
    status: z.enum(DIAGNOSIS_STATUSES),
    /** How it was closed; null while open. */
    outcome: z.string().nullable(),
    /** Highest stage completed at the last watch, as far as the record says. */
    lastStage: z.string().nullable(),
    openedAt: momentField,
    lastEventAt: momentField,
    closedAt: momentField.nullable(),
    flags: z.number().int(),
    /** A flagged closing waits for a supervisor before anything is mailed. */
    waitsForRelease: z.boolean(),
    serverSeq: z.number().int(),
    isDemo: z.boolean(),
  })
  .meta({ id: "DiagnosisSummary" });
export type DiagnosisSummary = z.infer<typeof diagnosisSummarySchema>;

export const storedEventSchema = envelopeSchema
  .extend({
    serverSeq: z.number().int(),
    companyId: idField,
    actorId: idField,
    receivedAt: z.number().int(),
    chainHash: hashField,
  })
  .meta({ id: "StoredEvent" });

/** A free text beside the events; null once erased, with who, when and why. */
export const noteSchema = z
  .strictObject({
    diagnosisId: idField,
    hash: hashField,
    salt: z.string(),
    text: z.string().nullable(),
    erased: z.strictObject({ at: momentField, by: z.string(), reason: z.string() }).nullable(),
  })
  .meta({ id: "Note" });

export const diagnosisDetailSchema = diagnosisSummarySchema
  .extend({
    events: z.array(storedEventSchema),
    notes: z.array(noteSchema),
    flagList: z.array(flagSchema),
    people: z.array(z.strictObject({ id: idField, name: z.string() })),
    verification: z.strictObject({
      intact: z.boolean(),
      breaks: z.array(
        z.strictObject({
          serverSeq: z.number().int(),
          reason: z.enum(["hash", "device-link", "server-order", "server-chain"]),
        }),
      ),
    }),
  })
  .meta({ id: "DiagnosisDetail" });
export type DiagnosisDetail = z.infer<typeof diagnosisDetailSchema>;

export const batchSchema = z.strictObject({
  /** Each is judged by itself, so that one bad event does not hold back other diagnoses. */
  events: z.array(z.unknown()).max(MAX_BATCH_EVENTS),
  notes: z
    .array(noteTextSchema.extend({ diagnosisId: idField }))
    .max(MAX_BATCH_NOTES)
    .default([]),
});

export const acceptedSchema = z.strictObject({ id: idField, serverSeq: z.number().int() });

export const verdictsSchema = z
  .strictObject({
    accepted: z.array(acceptedSchema),
    /** Received before with the same content: as good as accepted. */
    duplicate: z.array(acceptedSchema),
    rejected: z.array(
      z.strictObject({
        /** Null where the event has no readable id; `index` is its place in the batch. */
        id: z.string().nullable(),
        index: z.number().int(),
        code: z.enum(REJECTION_CODES),
        retryable: z.boolean(),
        detail: z.string().optional(),
      }),
    ),
    flags: z.array(flagSchema),
    /** Hashes of the free texts now kept, and of those refused because the hash or diagnosis does not fit. */
    keptNotes: z.array(hashField),
    rejectedNotes: z.array(hashField),
    heads: z.record(idField, z.number().int()),
    serverTime: z.number().int(),
  })
  .meta({ id: "BatchVerdicts" });
export type Verdicts = z.infer<typeof verdictsSchema>;

export const sendBatch = defineContract({
  method: "post",
  path: "/api/sync/batch",
  access: "diagnosis:record",
  tag,
  summary:
    "Append events. A list of independent items grouped by diagnosis: within one diagnosis the first refused item stops the rest.",
  body: batchSchema,
  maxBytes: MAX_BATCH_BYTES,
  answer: { kind: "json", status: 200, schema: verdictsSchema },
});

export const pullEvents = defineContract({
  method: "post",
  path: "/api/sync/pull",
  access: "diagnosis:read",
  tag,
  summary: "Events of the named diagnoses after the heads the client has (0 for none).",
  body: z.strictObject({
    heads: z
      .record(idField, z.number().int().min(0))
      .refine((heads) => Object.keys(heads).length <= MAX_PULL_HEADS, `At most ${MAX_PULL_HEADS} diagnoses.`),
  }),
  answer: {
    kind: "json",
    status: 200,
    schema: z.strictObject({
      events: z.array(storedEventSchema),
      notes: z.array(noteSchema),
      /** Named diagnoses that this company does not have. */
      unknown: z.array(idField),
      more: z.boolean(),
      serverTime: z.number().int(),
    }),
  },
});

export const listDiagnoses = defineContract({
  method: "get",
  path: "/api/diagnoses",
  access: "diagnosis:review",
  tag,
  summary: "Diagnoses, newest first, for review.",
  query: z.strictObject({
    status: z.enum(DIAGNOSIS_STATUSES).optional(),
    outcome: z.string().max(40).optional(),
    technicianId: idField.optional(),
    unitId: idField.optional(),
    flagged: z.enum(["yes", "no"]).optional(),
    from: dateField.optional(),
    to: dateField.optional(),
    ...pageQuery,
  }),
  answer: { kind: "json", status: 200, schema: pageOf(diagnosisSummarySchema) },
});

const params = z.strictObject({ diagnosisId: idField });

export const readDiagnosis = defineContract({
  method: "get",
  path: "/api/diagnoses/{diagnosisId}",
  access: "diagnosis:read",
  tag,
  summary: "One diagnosis: its events, texts, flags, and whether the record is as it was received.",
  params,
  answer: { kind: "json", status: 200, schema: diagnosisDetailSchema },
  errors: ["not-found"],
});

export const releaseDiagnosis = defineContract({
  method: "post",
  path: "/api/diagnoses/{diagnosisId}/release",
  access: "diagnosis:release",
  tag,
  summary: "After looking at a flagged closing: let the report go to the customer.",
  params,
  body: z.strictObject({ comment: textOf(MAX_REASON, "what you looked at") }),
  answer: { kind: "json", status: 200, schema: diagnosisSummarySchema },
  errors: ["not-found", "wrong-state"],
  limit: "mail",
});

export const eraseNote = defineContract({
  method: "post",
  path: "/api/diagnoses/{diagnosisId}/notes/{hash}/erase",
  access: "note:erase",
  tag,
  summary: "Erase a free text with a reason. The record still verifies.",
  params: z.strictObject({ diagnosisId: idField, hash: hashField }),
  body: z.strictObject({ reason: textOf(MAX_REASON, "why it has to go") }),
  answer: { kind: "json", status: 200, schema: noteSchema },
  errors: ["not-found", "wrong-state"],
});
