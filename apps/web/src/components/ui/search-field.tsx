import { useId } from "react";

/** A field that narrows a list as it is typed into. */
export function SearchField({
  label,
  text,
  onChange,
}: {
  label: string;
  text: string;
  onChange: (text: string) => void;
}) {
  const id = useId();
  return (
    <div className="flex max-w-110 min-w-0 grow flex-col gap-1">
      <label htmlFor={id} className="text-field font-semibold desk:text-desk">
        {label}
      </label>
      <input
        id={id}
        type="search"
        autoComplete="off"
        value={text}
        maxLength={100}
        onChange={(event) => onChange(event.target.value)}
        className="min-h-14 w-full rounded border-2 border-rule bg-surface px-3 text-field desk:min-h-12 desk:text-desk"
      />
    </div>
  );
}
