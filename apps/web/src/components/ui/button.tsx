import type { ButtonHTMLAttributes, ReactNode } from "react";
import { takeFirstTap } from "./take-first-tap.ts";

type Native = Omit<ButtonHTMLAttributes<HTMLButtonElement>, "className">;

/** The one solid button of a screen. Its label says what is stored or done. */
export function PrimaryButton({ children, detail, onClick, ...native }: Native & { detail?: ReactNode }) {
  return (
    <button
      type="button"
      {...native}
      onClick={takeFirstTap(onClick)}
      className="min-h-14 w-full rounded bg-ink px-4 py-3 text-[1.25rem] leading-6 font-semibold text-ground disabled:bg-rule"
    >
      {children}
      {detail && <span className="mt-0.5 block text-field font-normal">{detail}</span>}
    </button>
  );
}

/** A second act beside the primary one: outlined, full width on a phone. */
export function PlainButton({ children, compact, onClick, ...native }: Native & { compact?: boolean }) {
  return (
    <button
      type="button"
      {...native}
      onClick={takeFirstTap(onClick)}
      className={`${compact ? "min-h-12 px-2" : "min-h-14 w-full px-4"} rounded border-2 border-rule bg-ground py-2 text-field font-medium text-ink disabled:text-quiet`}
    >
      {children}
    </button>
  );
}

/** A small act in words, underlined like a link, with a full-size target. */
export function LinkButton({ children, onClick, ...native }: Native) {
  return (
    <button
      type="button"
      {...native}
      onClick={takeFirstTap(onClick)}
      className="min-h-12 text-left text-field font-semibold text-link underline underline-offset-4"
    >
      {children}
    </button>
  );
}
