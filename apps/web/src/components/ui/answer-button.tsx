import type { ReactNode } from "react";
import { takeFirstTap } from "./take-first-tap.ts";

/**
 * One answer of a look: symbol at the left, the word, the band at the right. Chosen is a thick border and an
 * inverted symbol block, so that it never looks like the solid primary button.
 */
export function AnswerButton({
  children,
  symbol,
  aside,
  chosen = false,
  onChoose,
}: {
  children: ReactNode;
  symbol?: ReactNode;
  aside?: ReactNode;
  chosen?: boolean;
  onChoose: () => void;
}) {
  return (
    <button
      type="button"
      aria-pressed={chosen}
      onClick={takeFirstTap(onChoose)}
      className={`flex min-h-14 w-full items-stretch rounded bg-surface text-left text-field font-semibold text-ink ${chosen ? "border-4 border-ink" : "border-2 border-rule"}`}
    >
      <span
        className={`grid w-[48px] shrink-0 place-items-center ${chosen ? "bg-ink text-ground" : "text-ink"}`}
        aria-hidden="true"
      >
        {symbol ?? <Box checked={chosen} />}
      </span>
      <span className="flex min-w-0 grow items-center justify-between gap-3 px-2 py-2 large-letters:flex-wrap">
        <span className="min-w-0">{children}</span>
        {aside && (
          <span className="numeric text-label font-normal whitespace-nowrap text-quiet">{aside}</span>
        )}
      </span>
    </button>
  );
}

function Box({ checked }: { checked: boolean }) {
  return (
    <svg viewBox="0 0 24 24" width={24} height={24}>
      {checked ? (
        <path d="M5 13l5 5 9-12" fill="none" stroke="currentColor" strokeWidth={3} />
      ) : (
        <rect x={2} y={2} width={20} height={20} rx={3} fill="none" stroke="var(--rule)" strokeWidth={2} />
      )}
    </svg>
  );
}
