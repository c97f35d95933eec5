import type { ReactNode } from "react";

/** Pairs of a name and what holds for it, in lines; at a desk the names stand in a column. */
export function Facts({ rows }: { rows: readonly { name: string; value: ReactNode; numeric?: boolean }[] }) {
  return (
    <dl className="max-w-180">
      {rows.map((row) => (
        <div
          key={row.name}
          className="grid gap-x-4 border-b border-hair py-2 last:border-b-0 grid-cols-[minmax(0,9fr)_minmax(0,11fr)] desk:grid-cols-[12rem_1fr]"
        >
          <dt className="text-field text-quiet desk:text-desk">{row.name}</dt>
          <dd
            className={`min-w-0 break-words text-field font-medium desk:text-desk ${row.numeric ? "numeric" : ""}`}
          >
            {row.value}
          </dd>
        </div>
      ))}
    </dl>
  );
}
