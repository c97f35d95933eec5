import { useTranslation } from "react-i18next";
import { actClass } from "#components/ui/act.tsx";

/** The solid button of a form. While it sends it says so and takes no further tap, but keeps the focus. */
export function SubmitButton({ children, busy }: { children: string; busy: boolean }) {
  const { t } = useTranslation();
  return (
    <button
      type="submit"
      aria-disabled={busy || undefined}
      className={`${actClass("solid")} w-full desk:w-auto desk:min-w-40`}
    >
      {busy ? t("desk:form.sending") : children}
    </button>
  );
}
