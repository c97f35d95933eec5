import { set } from "react-hook-form";
import type { FieldError, FieldErrors, FieldValues, Resolver } from "react-hook-form";
import type { z } from "zod";
import { ApiProblem } from "#lib/api-client.ts";

type Schema<Input, Output> = z.ZodType<Output, Input>;
/** A schema, or a function that fetches it, for forms that are drawn before their schema is here. */
export type SchemaSource<Input, Output> = Schema<Input, Output> | (() => Promise<Schema<Input, Output>>);

/**
 * Judges a form by a schema. `words` gives the message of an issue for which the schema has none; the first issue
 * of a field is the one shown. Written out rather than taken from a library, because the library's one brings all
 * of zod into the first download.
 */
export function resolveBy<Input extends FieldValues, Output>(
  source: SchemaSource<Input, Output>,
  words: (issue: object) => string,
): Resolver<Input, unknown, Output> {
  return async (values) => {
    const schema = typeof source === "function" ? await fetchSchema(source) : source;
    const parsed = await schema.safeParseAsync(withoutAbsent(values), { error: words });
    if (parsed.success) return { values: parsed.data, errors: {} };
    const first = new Map<string, FieldError>();
    for (const { path, code, message } of parsed.error.issues) {
      const name = path.length > 0 ? path.join(".") : "root.schema";
      if (!first.has(name)) first.set(name, { type: code, message });
    }
    const errors: FieldErrors<Input> = {};
    for (const [name, error] of first) {
      // A list's own error stands beside those of its entries, never in their place.
      const hasEntries = [...first.keys()].some((other) => other.startsWith(`${name}.`));
      set(errors, hasEntries ? `${name}.root` : name, error);
    }
    return { values: {}, errors };
  };
}

async function fetchSchema<S>(fetchIt: () => Promise<S>): Promise<S> {
  try {
    return await fetchIt();
  } catch {
    throw new ApiProblem(0, "offline", "No signal.");
  }
}

/** Values without the entries that are undefined: a question that was not answered is not there. */
function withoutAbsent(value: unknown): unknown {
  if (Array.isArray(value)) return value.map(withoutAbsent);
  if (typeof value !== "object" || value === null || Object.getPrototypeOf(value) !== Object.prototype)
    return value;
  return Object.fromEntries(
    Object.entries(value).flatMap(([key, entry]) =>
      entry === undefined ? [] : [[key, withoutAbsent(entry)]],
    ),
  );
}
