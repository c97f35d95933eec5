import { useTranslation } from "react-i18next";
import { formatDay } from "#lib/site-time.ts";

/** An open shut-off record of a unit: inverted, with a tag, so that nobody turns it back on unasked. */
export function ShutOffLabel({
  record,
  timeZone,
}: {
  record: { closedAt: string; technicianName: string };
  timeZone: string;
}) {
  const { t } = useTranslation();
  return (
    <p className="mt-2 flex items-start gap-3 rounded bg-stopped px-3 py-2 text-field font-semibold text-on-stopped desk:text-desk">
      <svg
        viewBox="0 0 20 26"
        width={20}
        height={26}
        fill="none"
        stroke="currentColor"
        strokeWidth={2.4}
        className="shrink-0"
        aria-hidden="true"
      >
        <path d="M3 24V9l7-7 7 7v15z" />
        <circle cx={10} cy={11} r={1.6} fill="currentColor" />
      </svg>
      <span>
        {t("desk:shutOff.label", { day: formatDay(record.closedAt, timeZone), name: record.technicianName })}
      </span>
    </p>
  );
}
