import type { FieldError } from "@emberladder/contract";
import type { z } from "zod";
import { ApiError } from "./api-error.ts";

/**
 * Parses one part of a request by its schema.
 * @throws ApiError `invalid-input` with a JSON pointer for each field.
 */
export function validate(
  schema: z.ZodType | undefined,
  value: unknown,
  part: "body" | "query" | "path",
): unknown {
  if (!schema) return undefined;
  const parsed = schema.safeParse(value);
  if (parsed.success) return parsed.data;
  const prefix = part === "body" ? "" : `/${part}`;
  const fields = parsed.error.issues.slice(0, 20).map((issue): FieldError => {
    const path = issue.code === "unrecognized_keys" ? [...issue.path, ...issue.keys.slice(0, 1)] : issue.path;
    return {
      pointer: prefix + path.map((key) => `/${escapePointer(String(key))}`).join(""),
      detail: issue.code === "unrecognized_keys" ? "This is not a field of ours." : issue.message,
    };
  });
  throw new ApiError("invalid-input", { fields });
}

/**
 * The query of a request as plain texts.
 * @throws ApiError `invalid-input` for a name that is given twice.
 */
export function readQuery(query: Readonly<Record<string, unknown>>): Record<string, string> {
  const plain: Record<string, string> = {};
  for (const [key, value] of Object.entries(query)) {
    if (typeof value !== "string" || key === "__proto__")
      throw new ApiError("invalid-input", {
        fields: [{ pointer: `/query/${escapePointer(key)}`, detail: "Give this once, as text." }],
      });
    plain[key] = value;
  }
  return plain;
}

const escapePointer = (key: string) => key.slice(0, 80).replaceAll("~", "~0").replaceAll("/", "~1");
