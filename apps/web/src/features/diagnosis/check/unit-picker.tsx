import type { ReadingUnit } from "@emberladder/furnace";
import { useTranslation } from "react-i18next";

/** Which unit the meter shows, where a check can be read in more than one. */
export function UnitPicker({
  units,
  chosen,
  onChoose,
  signOf,
}: {
  units: readonly ReadingUnit[];
  chosen: ReadingUnit;
  onChoose: (unit: ReadingUnit) => void;
  /** The sign of a unit as this person sees it. */
  signOf: (unit: ReadingUnit) => string;
}) {
  const { t } = useTranslation();
  return (
    <fieldset className="flex flex-wrap gap-2">
      <legend className="mb-1 text-field font-semibold">{t("reading.unitLegend")}</legend>
      {units.map((unit) => (
        <label
          key={unit}
          className={`flex min-h-12 items-center rounded bg-surface px-4 text-field has-focus-visible:outline-3 ${unit === chosen ? "border-4 border-ink font-semibold" : "border-2 border-rule"}`}
        >
          <input
            type="radio"
            name="unit"
            className="sr-only"
            checked={unit === chosen}
            onChange={() => onChoose(unit)}
          />
          {signOf(unit)}
        </label>
      ))}
    </fieldset>
  );
}
