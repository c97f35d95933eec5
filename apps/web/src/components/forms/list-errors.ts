import type { FieldErrors, FieldValues } from "react-hook-form";

/** One message of a form: the dotted name of its field, or null for the form as a whole. */
export interface FormError {
  name: string | null;
  message: string;
}

/** The errors of a form as a flat list: those of the form first, then the fields in the order they were found. */
export function listErrors<V extends FieldValues>(errors: FieldErrors<V>): FormError[] {
  const { root, ...fields } = errors as Record<string, unknown>;
  return [...collect(root, null), ...collect(fields, "")];
}

function collect(node: unknown, name: string | null): FormError[] {
  if (typeof node !== "object" || node === null || node instanceof Element) return [];
  const { message, type } = node as { message?: unknown; type?: unknown };
  if (typeof message === "string" && (typeof type === "string" || type === undefined)) {
    return message === "" ? [] : [{ name: name === "" ? null : name, message }];
  }
  return Object.entries(node).flatMap(([key, child]) =>
    key === "ref" ? [] : collect(child, nameBelow(name, key)),
  );
}

function nameBelow(name: string | null, key: string): string | null {
  if (name === null) return null;
  // A list keeps an error of its own beside those of its entries.
  if (key === "root") return name;
  return name === "" ? key : `${name}.${key}`;
}
