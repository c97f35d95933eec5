import type { DiagnosisState } from "@emberladder/diagnosis";
import { openPutBacks } from "@emberladder/diagnosis";
import { useTranslation } from "react-i18next";
import { Link } from "react-router-dom";
import { SavedChip } from "#components/ui/saved-chip.tsx";
import { paths } from "#lib/paths.ts";

/** Foot of every field screen: what is out, what is saved, and the way to the gas and CO acts in one tap. */
export function FieldDock({ diagnosisId, state }: { diagnosisId: string; state: DiagnosisState }) {
  const { t } = useTranslation();
  const out = openPutBacks(state).length;
  return (
    <nav
      aria-label={t("dock.label")}
      className="grid min-h-15 shrink-0 grid-cols-3 border-t-3 border-ink bg-surface large-letters:grid-cols-[2fr_3fr_3fr] large-letters:sticky large-letters:bottom-0 large-letters:z-1"
    >
      <Link
        to={paths.diagnosis.putBack(diagnosisId)}
        className="focus-inside flex items-center justify-center gap-2 large-letters:flex-col text-label leading-4.5 font-medium text-ink no-underline"
      >
        <span
          className={`numeric grid size-7 place-items-center rounded border-2 ${out > 0 ? "border-ink bg-ink text-ground" : "border-rule"}`}
        >
          {out}
        </span>
        <span className="w-11 large-letters:w-auto">
          {t("dock.putBack")}
          <span className="sr-only">{t("dock.stillOut")}</span>
        </span>
      </Link>
      <SavedChip />
      <Link
        to={paths.diagnosis.safety(diagnosisId)}
        className="focus-inside grid place-items-center border-2 border-caution-edge bg-caution px-1 large-letters:px-0 text-center text-label leading-4.5 font-semibold text-on-caution no-underline"
      >
        {t("dock.safety")}
      </Link>
    </nav>
  );
}
