import { useTranslation } from "react-i18next";
import { actClass } from "#components/ui/act.tsx";

/** The button that sends a form. While it sends it says so and takes no further tap, but keeps the focus. */
export function SubmitButton({
  children,
  kind,
  busy,
}: {
  children: string;
  kind: "solid" | "plain";
  busy: boolean;
}) {
  const { t } = useTranslation();
  return (
    <button
      type="submit"
      aria-disabled={busy || undefined}
      className={`${actClass(kind)} w-full desk:w-auto desk:min-w-40`}
    >
      {busy ? t("desk:form.sending") : children}
    </button>
  );
}
