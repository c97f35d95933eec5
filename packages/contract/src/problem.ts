import { z } from "zod";
import { ERROR_CODES, ERRORS } from "./error-codes.ts";
import type { ErrorCode } from "./error-codes.ts";

/** A problem document (RFC 9457). `code` is ours; `errors` points at fields by JSON pointer. */
export const problemSchema = z
  .strictObject({
    type: z.string(),
    title: z.string(),
    status: z.number().int(),
    detail: z.string().optional(),
    /** Leads to the log entry of this request. */
    instance: z.string(),
    code: z.enum(ERROR_CODES),
    errors: z.array(z.strictObject({ pointer: z.string(), detail: z.string() })).optional(),
    retryAfterSeconds: z.number().int().optional(),
  })
  .meta({ id: "Problem", description: "A problem document (RFC 9457)." });
export type Problem = z.infer<typeof problemSchema>;

/** One field of a request that cannot be used, by JSON pointer. */
export type FieldError = NonNullable<Problem["errors"]>[number];

/** The problem document of a code; `instance` is the request's own id. */
export function problemOf(
  code: ErrorCode,
  instance: string,
  more: { detail?: string; errors?: FieldError[]; retryAfterSeconds?: number } = {},
): Problem {
  return { type: `urn:emberladder:problem:${code}`, ...ERRORS[code], code, instance, ...more };
}
