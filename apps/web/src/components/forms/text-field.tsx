import type { HTMLInputAutoCompleteAttribute } from "react";
import { useFormContext } from "react-hook-form";
import { controlClass, FieldShell } from "./field-shell.tsx";

interface TextFieldProps {
  name: string;
  label: string;
  hint?: string;
  type?: "text" | "email" | "tel" | "date" | "time" | "search";
  autoComplete?: HTMLInputAutoCompleteAttribute;
  inputMode?: "text" | "numeric" | "email" | "tel";
  /** What an empty field is sent as; a schema that allows nothing there says which. */
  empty?: "text" | "null" | "absent";
  list?: string;
}

const emptied = { text: "", null: null, absent: undefined };

/** One line of text. */
export function TextField({
  name,
  label,
  hint,
  type = "text",
  autoComplete = "off",
  inputMode,
  empty = "text",
  list,
}: TextFieldProps) {
  const { register } = useFormContext();
  return (
    <FieldShell name={name} label={label} hint={hint}>
      {(control) => (
        <input
          {...control}
          {...register(name, {
            setValueAs: (text: unknown) => (text === "" || text === null ? emptied[empty] : text),
          })}
          type={type}
          list={list}
          autoComplete={autoComplete}
          inputMode={inputMode}
          spellCheck={type === "text" ? undefined : false}
          className={controlClass}
        />
      )}
    </FieldShell>
  );
}

/** Text of a few lines, in the writer's own words. */
export function AreaField({
  name,
  label,
  hint,
  rows = 3,
  empty = "text",
}: Omit<TextFieldProps, "type" | "inputMode" | "autoComplete" | "list"> & { rows?: number }) {
  const { register } = useFormContext();
  return (
    <FieldShell name={name} label={label} hint={hint}>
      {(control) => (
        <textarea
          {...control}
          {...register(name, {
            setValueAs: (text: unknown) => (text === "" || text === null ? emptied[empty] : text),
          })}
          rows={rows}
          className={`${controlClass} py-3`}
        />
      )}
    </FieldShell>
  );
}
