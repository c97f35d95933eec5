import { fieldChecks } from "./field-checks.ts";
import { field } from "./field.ts";
import { review } from "./review.ts";
import { rules } from "./rules.ts";

/** Words of the diagnosis and its review. They are fetched with the trade's words and join those of `ui`. */
export const fieldFlow = { ...field, ...fieldChecks, review, rules } as const;
