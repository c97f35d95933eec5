import type { ReportContent } from "@emberladder/contract";
import { useTranslation } from "react-i18next";

/** The one picture of the report: where it stopped before, and what it does now, in words beside each line. */
export function BeforeAndNow({ state }: { state: ReportContent["safe"]["state"] }) {
  const { t } = useTranslation();
  const heats = state === "safe";
  return (
    <div className="my-4 grid grid-cols-[auto_1fr_auto] items-center gap-x-3 text-field">
      <span className="leading-10">{t("desk:report.before")}</span>
      <svg
        viewBox="0 0 280 80"
        className="row-span-2 block h-20 w-full"
        aria-hidden="true"
        preserveAspectRatio="none"
      >
        <path d="M10 4v72M270 4v72" stroke="var(--ink)" strokeWidth={3} />
        <path d="M2 22h112M166 22h112" stroke="var(--stopped)" strokeWidth={5} />
        <path d="M114 8v28M166 8v28" stroke="var(--stopped)" strokeWidth={4} />
        {heats ? (
          <>
            <path d="M10 60h260" stroke="var(--glow)" strokeWidth={18} />
            <path d="M2 60h276" stroke="var(--proven)" strokeWidth={8} />
          </>
        ) : (
          <>
            <path d="M2 60h112M166 60h112" stroke="var(--stopped)" strokeWidth={5} />
            <path d="M114 46v28M166 46v28" stroke="var(--stopped)" strokeWidth={4} />
          </>
        )}
      </svg>
      <span className="leading-10">{t("desk:report.stops")}</span>
      <span className="leading-10">{t("desk:report.now")}</span>
      <span className="leading-10">{t(`desk:report.nowStates.${state}`)}</span>
    </div>
  );
}
