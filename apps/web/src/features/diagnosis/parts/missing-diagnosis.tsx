import { useTranslation } from "react-i18next";
import { Link } from "react-router-dom";
import { MissingRungDrawing } from "#components/ladder/drawings.tsx";
import { paths } from "#lib/paths.ts";

/** Neither this phone nor the server has the diagnosis, or there is no signal to ask. */
export function MissingDiagnosis() {
  const { t } = useTranslation();
  return (
    <main className="mx-auto flex min-h-dvh max-w-[560px] flex-col justify-center gap-5 p-6">
      <MissingRungDrawing />
      <h1 className="text-question">{t("field.missing")}</h1>
      <p className="text-field text-quiet">{t("field.missingHow")}</p>
      <Link to={paths.calls} className="text-field font-semibold">
        {t("notFound.toCalls")}
      </Link>
    </main>
  );
}
