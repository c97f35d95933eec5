import { useFormContext } from "react-hook-form";
import { parseReading } from "#lib/parse-reading.ts";
import { controlClass, FieldShell } from "./field-shell.tsx";

/**
 * A number with its unit inside the field: text with a decimal keypad, point or comma, spaces ignored. Empty is
 * sent as absent (or null), and what is no number is kept as typed and refused in words.
 */
export function NumberField({
  name,
  label,
  unit,
  hint,
  empty = "absent",
  allowNegative = false,
}: {
  name: string;
  label: string;
  unit?: string;
  hint?: string;
  empty?: "absent" | "null";
  allowNegative?: boolean;
}) {
  const { register } = useFormContext();
  return (
    <FieldShell name={name} label={label} hint={hint}>
      {(control) => (
        <div className="relative">
          <input
            {...control}
            {...register(name, {
              setValueAs: (value: unknown) => readNumber(value, empty === "null" ? null : undefined),
            })}
            type="text"
            inputMode={allowNegative ? "text" : "decimal"}
            autoComplete="off"
            className={`${controlClass} numeric ${unit ? "pr-20" : ""}`}
          />
          {unit && (
            <span className="pointer-events-none absolute inset-y-0 right-3 flex items-center text-label text-quiet desk:text-small">
              {unit}
            </span>
          )}
        </div>
      )}
    </FieldShell>
  );
}

/** Number of a field: absent where empty, the typed text where it is none, so that it is refused as such. */
export function readNumber(value: unknown, whenEmpty: null | undefined): unknown {
  if (typeof value !== "string") return value ?? whenEmpty;
  const parsed = parseReading(value);
  if (parsed.ok) return parsed.value;
  return parsed.reason === "empty" ? whenEmpty : value;
}
