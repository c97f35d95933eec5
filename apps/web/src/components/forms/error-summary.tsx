import { useState } from "react";
import type { Ref } from "react";
import { useTranslation } from "react-i18next";
import { useControlId } from "./form.tsx";
import type { FormError } from "./list-errors.ts";

/** What has to be mended before a form can be sent, on top of it, with a link to each field. */
export function ErrorSummary({ errors, ref }: { errors: readonly FormError[]; ref: Ref<HTMLDivElement> }) {
  const { t } = useTranslation();
  return (
    <div
      ref={ref}
      role="alert"
      tabIndex={-1}
      className="border-l-6 border-ink bg-surface p-4 text-field outline-offset-2 desk:text-desk"
    >
      <h2 className="mb-1 font-semibold">{t("desk:form.summary")}</h2>
      <ul className="flex flex-col">
        {errors.map((error) => (
          <li key={`${error.name} ${error.message}`}>
            {error.name === null ? error.message : <FieldLink name={error.name} message={error.message} />}
          </li>
        ))}
      </ul>
    </div>
  );
}

function FieldLink({ name, message }: { name: string; message: string }) {
  const { t } = useTranslation();
  const id = useControlId(name);
  const [label] = useState(() => labelOf(id));
  return (
    <a
      href={`#${id}`}
      className="inline-flex min-h-12 items-center font-medium desk:min-h-8"
      onClick={(event) => {
        event.preventDefault();
        const control = document.getElementById(id);
        // A field in a folded part can only take the focus once the part is open.
        for (let part = control?.closest("details"); part; part = part.parentElement?.closest("details")) {
          part.open = true;
        }
        control?.scrollIntoView({ block: "center" });
        control?.focus({ preventScroll: true });
      }}
    >
      {label ? t("desk:form.fieldError", { label, message }) : message}
    </a>
  );
}

/** The words that a field is labelled with: many messages only make sense beside them. */
function labelOf(id: string): string | null {
  const control = document.getElementById(id);
  const label =
    control instanceof HTMLInputElement ||
    control instanceof HTMLSelectElement ||
    control instanceof HTMLTextAreaElement
      ? control.labels?.[0]
      : null;
  return label?.textContent ?? null;
}
