import { useFormContext } from "react-hook-form";
import { controlClass, FieldShell } from "./field-shell.tsx";

export interface Choice {
  value: string;
  label: string;
}

/** One of a list, with the browser's own list, which every phone shows large. */
export function SelectField({
  name,
  label,
  hint,
  choices,
  emptyLabel,
  as = "text",
  empty = "absent",
}: {
  name: string;
  label: string;
  hint?: string;
  choices: readonly Choice[];
  /** Words of the entry for nothing chosen; left out where one has to be chosen and is. */
  emptyLabel?: string;
  /** Numbers are sent as numbers. */
  as?: "text" | "number";
  empty?: "absent" | "null";
}) {
  const { register } = useFormContext();
  const read = (value: unknown) => {
    if (value === "" || value === undefined || value === null) return empty === "null" ? null : undefined;
    return as === "number" ? Number(value) : value;
  };
  return (
    <FieldShell name={name} label={label} hint={hint}>
      {(control) => (
        <select {...control} {...register(name, { setValueAs: read })} className={controlClass}>
          {emptyLabel !== undefined && <option value="">{emptyLabel}</option>}
          {choices.map((choice) => (
            <option key={choice.value} value={choice.value}>
              {choice.label}
            </option>
          ))}
        </select>
      )}
    </FieldShell>
  );
}
