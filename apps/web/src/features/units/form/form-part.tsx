import { useState } from "react";
import type { ReactNode } from "react";

/** One part of a long form: a heading, a line on what it is for, its fields. */
export function FormPart({ title, note, children }: { title: string; note?: string; children: ReactNode }) {
  return (
    <section className="border-t-2 border-ink pt-4">
      <h2 className="text-[1.1875rem] font-semibold">{title}</h2>
      {note && <p className="mb-3 text-field text-quiet desk:text-desk">{note}</p>}
      {children}
    </section>
  );
}

/** A part that most units never need: its heading says how much of it is known, and a tap opens it. */
export function FoldedPart({
  title,
  aside,
  note,
  children,
}: {
  title: string;
  aside: string;
  note?: string;
  children: ReactNode;
}) {
  const [isOpen, setOpen] = useState(false);
  return (
    <details
      open={isOpen}
      onToggle={(event) => setOpen(event.currentTarget.open)}
      className="border-t-2 border-ink"
    >
      <summary className="flex min-h-14 cursor-pointer list-none flex-wrap items-center gap-x-3 py-2">
        <svg
          viewBox="0 0 16 16"
          width={14}
          height={14}
          aria-hidden="true"
          className={isOpen ? "rotate-90" : ""}
        >
          <path d="M4 1l8 7-8 7z" fill="var(--ink)" />
        </svg>
        <h2 className="text-[1.1875rem] font-semibold">{title}</h2>
        <span className="text-field text-quiet desk:text-desk">{aside}</span>
      </summary>
      {note && <p className="mb-3 text-field text-quiet desk:text-desk">{note}</p>}
      {children}
    </details>
  );
}

/** Fields in two columns; where `isPaired`, also on a phone, since a figure needs little room. */
export function FieldGrid({ children, isPaired = false }: { children: ReactNode; isPaired?: boolean }) {
  return (
    <div
      className={`mt-3 grid items-end gap-x-3 gap-y-4 ${isPaired ? "grid-cols-2" : "min-[34rem]:grid-cols-2"}`}
    >
      {children}
    </div>
  );
}
