import { useId } from "react";

/** Free text of a few lines: what was seen, said or asked, in the writer's own words. */
export function TextAreaField({
  label,
  text,
  onChange,
  rows = 3,
}: {
  label: string;
  text: string;
  onChange: (text: string) => void;
  rows?: number;
}) {
  const id = useId();
  return (
    <div>
      <label htmlFor={id} className="mb-1 block text-field font-semibold">
        {label}
      </label>
      <textarea
        id={id}
        rows={rows}
        maxLength={2000}
        value={text}
        onChange={(event) => onChange(event.target.value)}
        className="w-full rounded border-2 border-rule bg-surface p-3 text-field"
      />
    </div>
  );
}
