import { useTranslation } from "react-i18next";
import { chooseScheme, SCHEMES, useScheme } from "#lib/scheme.ts";

/** One tap to the next scheme: as the system, daylight, attic, full sun. */
export function SchemeSwitch() {
  const { t } = useTranslation();
  const scheme = useScheme();
  const next = SCHEMES[(SCHEMES.indexOf(scheme) + 1) % SCHEMES.length] ?? "system";
  return (
    <button
      type="button"
      onClick={() => chooseScheme(next)}
      aria-label={t("scheme.switch", { now: t(`scheme.${scheme}`), next: t(`scheme.${next}`) })}
      title={t(`scheme.${scheme}`)}
      className="grid size-[48px] place-items-center desk:size-9 rounded border-2 border-rule"
    >
      <svg
        viewBox="0 0 24 24"
        width={22}
        height={22}
        fill="none"
        stroke="currentColor"
        strokeWidth={2}
        aria-hidden="true"
      >
        <circle cx={12} cy={12} r={9} />
        {scheme === "system" && <path d="M12 3a9 9 0 0 1 0 18z" fill="currentColor" />}
        {scheme === "attic" && <circle cx={12} cy={12} r={9} fill="currentColor" />}
        {scheme === "full-sun" && <path d="M12 0v3M12 21v3M0 12h3M21 12h3" strokeWidth={2.6} />}
      </svg>
    </button>
  );
}
