import { useTranslation } from "react-i18next";
import { Link } from "react-router-dom";
import { MissingRungDrawing } from "#components/ladder/drawings.tsx";
import { paths } from "#lib/paths.ts";

/** An address that leads nowhere: a ladder with a missing rung, and one way on. */
export function NotFoundScreen() {
  const { t } = useTranslation();
  return (
    <main className="mx-auto flex min-h-dvh max-w-[560px] flex-col justify-center gap-5 p-6">
      <MissingRungDrawing />
      <h1 className="text-question">{t("notFound.title")}</h1>
      <p className="text-field text-quiet">{t("notFound.kept")}</p>
      <Link to={paths.calls} className="text-field font-semibold">
        {t("notFound.toCalls")}
      </Link>
    </main>
  );
}
