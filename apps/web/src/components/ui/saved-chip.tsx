import { format } from "date-fns";
import { useTranslation } from "react-i18next";
import { Link } from "react-router-dom";
import { paths } from "#lib/paths.ts";
import { useSaved } from "#lib/store/use-saved.ts";

/** Saved on this phone, sending, on the server, or a problem: always in sight, in words and with a shape. */
export function SavedChip() {
  const { t } = useTranslation();
  const saved = useSaved();
  const time = saved.onServerAt ? format(saved.onServerAt, "HH:mm") : "";
  const words = t(`saved.${saved.kind}`, { count: saved.waiting, time });
  const alarming = saved.kind === "problem" || saved.kind === "needs-sign-in";
  return (
    <Link
      to={paths.sync}
      className={`focus-inside flex items-center justify-center gap-2 large-letters:flex-col border-x-2 border-hair px-1 text-label leading-4.5 font-medium no-underline ${alarming ? "bg-stopped text-on-stopped" : "text-ink"}`}
    >
      <svg
        viewBox="0 0 22 30"
        width={20}
        height={28}
        fill="none"
        stroke="currentColor"
        strokeWidth={2.4}
        className="shrink-0"
        aria-hidden="true"
      >
        <rect x={2} y={2} width={18} height={26} rx={3} />
        {saved.kind === "sending" ? (
          <path d="M11 22V9M6 13l5-5 5 5" />
        ) : alarming ? (
          <path d="M11 8v9M11 21v2" />
        ) : (
          <path d="M6 15l4 4 6-8" />
        )}
      </svg>
      <span role="status" className="max-w-[5.5rem] large-letters:max-w-full">
        {words}
      </span>
    </Link>
  );
}
