import { openStops } from "@emberladder/diagnosis";
import type { DiagnosisState } from "@emberladder/diagnosis";
import { STOP_RULE_CODES } from "@emberladder/furnace";
import { useTranslation } from "react-i18next";
import { Link } from "react-router-dom";
import { paths } from "#lib/paths.ts";

/** A stop rule that lets the walk go on for now stays in sight until its acts are done. */
export function StopBanner({ diagnosisId, state }: { diagnosisId: string; state: DiagnosisState }) {
  const { t } = useTranslation();
  const [stop] = openStops(state);
  if (!stop || state.closed) return null;
  const left = stop.acts.filter((act) => !act.done && act.due !== "closing").length;
  return (
    <Link
      to={paths.diagnosis.stop(diagnosisId)}
      className="focus-inside flex min-h-12 shrink-0 items-center gap-3 bg-stopped px-4 text-field font-semibold text-on-stopped"
    >
      {t("stop.banner", { code: STOP_RULE_CODES[stop.rule], count: left })}
    </Link>
  );
}
