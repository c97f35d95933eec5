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

/** Fields in two columns where there is room. */
export function FieldGrid({ children }: { children: ReactNode }) {
  return <div className="mt-3 grid items-end gap-4 min-[34rem]:grid-cols-2">{children}</div>;
}
