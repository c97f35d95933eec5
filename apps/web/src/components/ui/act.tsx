import type { ButtonHTMLAttributes, ReactNode } from "react";
import { Link } from "react-router-dom";
import type { LinkProps } from "react-router-dom";

export type ActKind = "solid" | "plain" | "words";

const KINDS: Record<ActKind, string> = {
  solid: "rounded border-2 border-ink bg-ink text-ground font-semibold px-5",
  plain: "rounded border-2 border-ink bg-surface text-ink font-medium px-3 desk:px-4",
  words: "text-link underline underline-offset-4 font-semibold px-1",
};

/** Classes of an act of the desk and the account: 56 px high on a phone, 48 px at a desk. */
export function actClass(kind: ActKind): string {
  return `inline-flex items-center justify-center text-center no-underline min-h-14 py-2 text-field desk:min-h-12 desk:text-desk aria-disabled:bg-rule disabled:border-rule disabled:text-quiet ${KINDS[kind]}`;
}

/** A button whose label says what is done. */
export function ActButton({
  kind = "plain",
  children,
  ...native
}: Omit<ButtonHTMLAttributes<HTMLButtonElement>, "className"> & { kind?: ActKind; children: ReactNode }) {
  return (
    <button type="button" {...native} className={actClass(kind)}>
      {children}
    </button>
  );
}

/** A link that looks like the act it leads to. */
export function ActLink({
  kind = "plain",
  children,
  ...native
}: Omit<LinkProps, "className"> & { kind?: ActKind }) {
  return (
    <Link {...native} className={actClass(kind)}>
      {children}
    </Link>
  );
}
