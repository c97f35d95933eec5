import { useTranslation } from "react-i18next";
import { FailedDrawing } from "#components/ladder/drawings.tsx";
import { PrimaryButton } from "#components/ui/button.tsx";

/** A fault of the product: what was kept, and one act. It never draws a stopped rung of the unit. */
export function FailedScreen() {
  const { t } = useTranslation();
  return (
    <main className="mx-auto flex min-h-dvh max-w-[560px] flex-col justify-center gap-5 p-6">
      <FailedDrawing />
      <h1 className="text-question">{t("failed.title")}</h1>
      <ul className="flex flex-col gap-2 text-field text-quiet">
        <li>{t("failed.kept")}</li>
        <li>{t("failed.sends")}</li>
      </ul>
      <PrimaryButton onClick={() => location.reload()}>{t("failed.again")}</PrimaryButton>
    </main>
  );
}
