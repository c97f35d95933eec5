import { useState } from "react";
import { useFormContext } from "react-hook-form";
import { useTranslation } from "react-i18next";
import { controlClass, FieldShell } from "./field-shell.tsx";

/** A password: pasted or typed, and shown on request, so that a long one can be typed with gloves. */
export function PasswordField({
  name,
  label,
  hint,
  autoComplete,
}: {
  name: string;
  label: string;
  hint?: string;
  autoComplete: "current-password" | "new-password";
}) {
  const { t } = useTranslation();
  const { register } = useFormContext();
  const [isShown, setShown] = useState(false);
  return (
    <FieldShell name={name} label={label} hint={hint}>
      {(control) => (
        <div>
          <input
            {...control}
            {...register(name)}
            type={isShown ? "text" : "password"}
            autoComplete={autoComplete}
            autoCapitalize="none"
            autoCorrect="off"
            spellCheck={false}
            className={controlClass}
          />
          <button
            type="button"
            aria-pressed={isShown}
            onClick={() => setShown(!isShown)}
            className="min-h-12 px-1 text-field font-semibold text-link underline underline-offset-4 desk:text-desk"
          >
            {isShown ? t("desk:form.hidePassword") : t("desk:form.showPassword")}
          </button>
        </div>
      )}
    </FieldShell>
  );
}
