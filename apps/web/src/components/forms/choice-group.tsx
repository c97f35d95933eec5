import { useId } from "react";

/** One of a few, all in sight, in effect as soon as it is chosen. */
export function ChoiceGroup<Value extends string>({
  label,
  choices,
  value,
  onChoose,
}: {
  label: string;
  choices: readonly { value: Value; label: string }[];
  value: Value;
  onChoose: (value: Value) => void;
}) {
  const name = useId();
  return (
    <fieldset>
      <legend className="mb-1 text-field font-semibold desk:text-desk">{label}</legend>
      <div className="flex flex-wrap gap-2">
        {choices.map((choice) => (
          <label
            key={choice.value}
            className="flex min-h-14 cursor-pointer items-center rounded border-2 border-rule bg-surface px-4 text-field has-checked:border-ink has-checked:bg-ink has-checked:font-semibold has-checked:text-ground has-focus-visible:outline-3 has-focus-visible:outline-offset-2 has-focus-visible:outline-link desk:min-h-12 desk:text-desk"
          >
            <input
              type="radio"
              name={name}
              className="sr-only"
              checked={choice.value === value}
              onChange={() => onChoose(choice.value)}
            />
            {choice.label}
          </label>
        ))}
      </div>
    </fieldset>
  );
}
