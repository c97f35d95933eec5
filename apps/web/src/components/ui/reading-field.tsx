import { useId } from "react";
import type { Ref } from "react";

/**
 * The field a reading is typed into: large digits, the unit inside at the right, decimal keypad. Text, never a
 * number input: point and comma are both accepted, and what was typed stays as it was typed.
 */
export function ReadingField({
  label,
  unit,
  text,
  onChange,
  onSubmit,
  invalid,
  describedBy,
  compact,
  inputRef,
  allowNegative,
}: {
  label: string;
  unit: string;
  text: string;
  onChange: (text: string) => void;
  onSubmit?: () => void;
  invalid?: boolean;
  describedBy?: string;
  compact?: boolean;
  inputRef?: Ref<HTMLInputElement>;
  allowNegative?: boolean;
}) {
  const id = useId();
  return (
    <div className="min-w-0 grow">
      <label htmlFor={id} className="mb-1 block text-field font-semibold first-letter:uppercase">
        {label}
      </label>
      <div className="flex h-15 items-center gap-2 rounded border-3 border-ink bg-surface px-3 outline-offset-2 outline-link has-[input:focus-visible]:outline-3">
        <input
          id={id}
          ref={inputRef}
          type="text"
          placeholder=" "
          inputMode={allowNegative ? "text" : "decimal"}
          autoComplete="off"
          autoCorrect="off"
          spellCheck={false}
          enterKeyHint="done"
          value={text}
          aria-invalid={invalid || undefined}
          aria-describedby={describedBy}
          onChange={(event) => onChange(event.target.value)}
          onKeyDown={(event) => {
            if (event.key === "Enter") onSubmit?.();
          }}
          className={`numeric h-full w-full min-w-0 bg-transparent font-semibold outline-none ${compact ? "text-[1.75rem]" : "text-reading"}`}
        />
        <span className={`${unit.length > 4 ? "" : "numeric"} shrink-0 text-field text-quiet`}>{unit}</span>
      </div>
    </div>
  );
}
