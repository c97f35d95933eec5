import { lazy, Suspense } from "react";
import { useTranslation } from "react-i18next";
import { Link } from "react-router-dom";
import { paths } from "#lib/paths.ts";

// The chip watches the store, which comes after the shell.
const SavedChip = lazy(() => import("./saved-chip.tsx").then((module) => ({ default: module.SavedChip })));

/** Foot of the screens around a call on a phone: what is saved, and the gas and CO acts in one tap. */
export function CallDock() {
  const { t } = useTranslation();
  return (
    <nav
      aria-label={t("dock.label")}
      className="sticky bottom-0 z-1 grid min-h-15 shrink-0 grid-cols-2 border-t-3 border-ink bg-surface desk:hidden"
    >
      <Suspense fallback={<span />}>
        <SavedChip />
      </Suspense>
      <Link
        to={paths.safety}
        className="focus-inside grid place-items-center border-2 border-caution-edge bg-caution px-1 text-center text-label font-semibold text-on-caution no-underline"
      >
        {t("dock.safety")}
      </Link>
    </nav>
  );
}
