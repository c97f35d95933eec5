import { useController } from "react-hook-form";
import { useTranslation } from "react-i18next";
import { useControlId } from "./form.tsx";
import { FieldMessage, useFieldError } from "./field-shell.tsx";

const ANSWERS = [
  { key: "yes", value: true },
  { key: "no", value: false },
  { key: "unknown", value: undefined },
] as const;

/** Yes, no, or not known: for what a plate or a look may not tell. Three large targets in one row. */
export function YesNoField({ name, label }: { name: string; label: string }) {
  const { t } = useTranslation();
  const { field } = useController({ name });
  const id = useControlId(name);
  const error = useFieldError(name);
  return (
    <fieldset
      className="flex flex-wrap items-center gap-x-4 gap-y-1 border-b border-hair py-2"
      aria-describedby={error ? `${id}-error` : undefined}
    >
      <legend className="sr-only">{label}</legend>
      <span aria-hidden="true" className="min-w-48 grow text-field desk:text-desk">
        {label}
      </span>
      {error && <FieldMessage id={`${id}-error`} message={error} />}
      <span className="flex gap-2">
        {ANSWERS.map((answer, index) => (
          <label
            key={answer.key}
            className="flex min-h-12 min-w-14 cursor-pointer items-center justify-center rounded border-2 border-rule bg-surface px-3 text-field has-checked:border-ink has-checked:bg-ink has-checked:font-semibold has-checked:text-ground has-focus-visible:outline-3 has-focus-visible:outline-offset-2 has-focus-visible:outline-link desk:text-desk"
          >
            <input
              type="radio"
              id={index === 0 ? id : undefined}
              name={id}
              className="sr-only"
              checked={(field.value ?? undefined) === answer.value}
              onChange={() => field.onChange(answer.value)}
              onBlur={field.onBlur}
            />
            {t(`desk:form.${answer.key}`)}
          </label>
        ))}
      </span>
    </fieldset>
  );
}
