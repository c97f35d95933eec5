import type { ReactNode } from "react";
import { get, useFormContext } from "react-hook-form";
import { useControlId } from "./form.tsx";

/** What a control needs from its field: ids, whether it is at fault, and what describes it. */
export interface ControlProps {
  id: string;
  "aria-invalid": true | undefined;
  "aria-describedby": string | undefined;
}

/** The look of every text control. */
export const controlClass =
  "block w-full min-w-0 rounded border-2 border-rule bg-surface px-3 text-field text-ink aria-invalid:border-ink aria-invalid:border-l-6 min-h-14 desk:min-h-12 desk:text-desk";

/** Label above, hint under it, the message of the last sending, then the control. */
export function FieldShell({
  name,
  label,
  hint,
  children,
}: {
  name: string;
  label: string;
  hint?: string;
  children: (control: ControlProps) => ReactNode;
}) {
  const id = useControlId(name);
  const error = useFieldError(name);
  const hintId = hint ? `${id}-hint` : undefined;
  const errorId = error ? `${id}-error` : undefined;
  return (
    <div className="flex min-w-0 flex-col gap-1">
      <label htmlFor={id} className="text-field font-semibold desk:text-desk">
        {label}
      </label>
      {hint && (
        <p id={hintId} className="text-field text-quiet desk:text-small">
          {hint}
        </p>
      )}
      {error && <FieldMessage id={errorId} message={error} />}
      {children({
        id,
        "aria-invalid": error ? true : undefined,
        "aria-describedby": [hintId, errorId].filter(Boolean).join(" ") || undefined,
      })}
    </div>
  );
}

/** The message of a field that was refused. */
export function FieldMessage({ id, message }: { id?: string; message: string }) {
  return (
    <p id={id} className="flex items-start gap-2 text-field font-semibold desk:text-desk">
      <svg viewBox="0 0 20 20" width={20} height={20} className="mt-0.5 shrink-0" aria-hidden="true">
        <path d="M1 10h5M14 10h5M7 3v14M13 3v14" stroke="var(--ink)" strokeWidth={2.6} />
      </svg>
      {message}
    </p>
  );
}

/** The message of one field at the last sending; undefined where it was taken. */
export function useFieldError(name: string): string | undefined {
  const { formState } = useFormContext();
  const error: unknown = get(formState.errors, name);
  if (typeof error !== "object" || error === null) return undefined;
  const { message, root } = error as { message?: unknown; root?: { message?: unknown } };
  if (typeof message === "string" && message) return message;
  return typeof root?.message === "string" ? root.message : undefined;
}
