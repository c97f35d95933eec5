import { field } from "./field.ts";
import { review } from "./review.ts";
import { rules } from "./rules.ts";

/** Words of the diagnosis and its review. They are fetched with the trade's words and join those of `ui`. */
export const fieldFlow = { ...field, review, rules } as const;
