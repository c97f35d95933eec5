import type { Rung } from "@emberladder/diagnosis";
import type { Sight, Span } from "@emberladder/furnace";
import { useEffect, useRef } from "react";
import { useTranslation } from "react-i18next";
import { takeFirstTap } from "#components/ui/take-first-tap.ts";
import { formatClock } from "#lib/use-now.ts";

/**
 * One thing that can be seen, as a button standing on its rung, over the rungs that cannot be seen. Seen is a
 * lit rung with its time; under the highest one seen the rest is passed, with a hollow ring.
 */
export function SightRow({
  sight,
  seenAtS,
  isNext,
  isUnder,
  due,
  elapsed,
  between,
  onSee,
}: {
  sight: Sight;
  seenAtS: number | undefined;
  isNext: boolean;
  isUnder: boolean;
  due: Span | undefined;
  elapsed: number;
  /** Rungs below this one that nobody can see. */
  between: readonly Rung[];
  onSee: () => void;
}) {
  const { t } = useTranslation();
  const seen = seenAtS !== undefined;
  const state = seen
    ? formatClock(seenAtS)
    : isUnder
      ? t("watch.passed")
      : isNext && due
        ? dueWord(t, due, elapsed)
        : "";
  const row = useRef<HTMLLIElement>(null);
  // The next thing to be seen stays in sight on a small phone; nothing moves under a thumb that is not there.
  useEffect(() => {
    if (isNext) row.current?.scrollIntoView({ block: "center" });
  }, [isNext]);
  return (
    <li ref={row} className="flex flex-col">
      <button
        type="button"
        onClick={takeFirstTap(onSee)}
        disabled={seen}
        className="flex min-h-14 items-center gap-3 px-3 short:min-h-12 text-left text-[1.25rem] font-semibold text-ink"
      >
        <svg
          viewBox="0 0 34 22"
          width={34}
          height={22}
          fill="none"
          stroke="currentColor"
          strokeWidth={2}
          className="shrink-0"
          aria-hidden="true"
        >
          <path d="M2 11C8 3 26 3 32 11 26 19 8 19 2 11z" />
          <circle cx={17} cy={11} r={4.5} fill="currentColor" />
        </svg>
        <span className="grow">{t(`watch.sights.${sight}`)}</span>
        <span className={seen ? "numeric" : "text-field font-normal"}>{state}</span>
      </button>
      <svg
        viewBox="0 0 300 12"
        preserveAspectRatio="none"
        className="h-3 w-full overflow-visible"
        aria-hidden="true"
      >
        {seen ? (
          <>
            <path d="M-8 6h316" stroke="var(--glow)" strokeWidth={14} />
            <path d="M-8 6h316" stroke="var(--proven)" strokeWidth="var(--lit)" />
          </>
        ) : (
          <path d="M0 6h300" stroke={isUnder ? "var(--proven)" : "var(--rule)"} strokeWidth={2.4} />
        )}
      </svg>
      {between.length > 0 && (
        <div className="flex flex-col gap-1.5 py-1" aria-hidden="true">
          {between.map((rung) => (
            <svg key={rung.stage} viewBox="0 0 300 8" preserveAspectRatio="none" className="h-2 w-full">
              <path
                d="M0 4h300"
                stroke={rung.state === "waiting" ? "var(--rule)" : "var(--proven)"}
                strokeWidth={rung.state === "waiting" ? 1.5 : 2.4}
              />
            </svg>
          ))}
        </div>
      )}
    </li>
  );
}

function dueWord(
  t: (key: string, values?: Record<string, unknown>) => string,
  due: Span,
  elapsed: number,
): string {
  if (elapsed < due.least) return t("watch.dueFrom", { time: formatClock(due.least) });
  return elapsed <= due.most ? t("watch.dueNow") : t("watch.late");
}
