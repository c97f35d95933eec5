import type { ReactNode } from "react";
import { Link } from "react-router-dom";
import { useTitle } from "#lib/use-title.ts";

/** Head of a screen: the way back, its one heading, a second line, and acts at its end. */
export function PageHead({
  title,
  line,
  back,
  acts,
}: {
  title: string;
  line?: ReactNode;
  back?: { to: string; label: string };
  acts?: ReactNode;
}) {
  useTitle(title);
  return (
    <header className="border-b-2 border-ink bg-surface px-4 py-3 desk:px-6 desk:py-4">
      {back && (
        <Link
          to={back.to}
          className="-mt-2 inline-flex min-h-12 items-center text-field font-medium desk:-mt-3 desk:text-desk"
        >
          {back.label}
        </Link>
      )}
      <div className="flex flex-wrap items-center justify-between gap-x-4 gap-y-2">
        <div className="min-w-0">
          <h1 className="text-question break-words short:text-[1.375rem] short:leading-6.5">{title}</h1>
          {line && <div className="text-field text-quiet desk:text-desk">{line}</div>}
        </div>
        {acts && <div className="flex flex-wrap gap-3">{acts}</div>}
      </div>
    </header>
  );
}

/** A part of a screen under its own heading, parted from the one before by a line. */
export function Section({
  title,
  note,
  acts,
  children,
}: {
  title: string;
  note?: string;
  acts?: ReactNode;
  children: ReactNode;
}) {
  return (
    <section className="border-b border-hair px-4 py-5 last:border-b-0 desk:px-6">
      <div className="mb-3 flex flex-wrap items-center justify-between gap-x-6 gap-y-2">
        <h2 className="text-field font-semibold desk:text-[1.0625rem]">{title}</h2>
        {acts}
      </div>
      {note && <p className="mb-3 max-w-160 text-field text-quiet desk:text-desk">{note}</p>}
      {children}
    </section>
  );
}
