import { UNITS_SHOWN } from "@emberladder/contract";
import { ALTITUDE_RULES } from "@emberladder/furnace";
import { useTranslation } from "react-i18next";
import { SelectField } from "./select-field.tsx";
import { TextField } from "./text-field.tsx";

/** What a company settles for itself: its name, its clock, how altitude counts, the units it reads. */
export function CompanyFields({ prefix = "" }: { prefix?: string }) {
  const { t } = useTranslation();
  return (
    <>
      <TextField name={`${prefix}name`} label={t("desk:company.name")} autoComplete="organization" />
      <TextField
        name={`${prefix}timeZone`}
        label={t("desk:company.timeZone")}
        hint={t("desk:company.timeZoneHint")}
        list="time-zones"
      />
      <datalist id="time-zones">
        {Intl.supportedValuesOf("timeZone").map((zone) => (
          <option key={zone} value={zone}>
            {zone}
          </option>
        ))}
      </datalist>
      <SelectField
        name={`${prefix}altitudeRule`}
        label={t("desk:company.altitudeRule")}
        hint={t("desk:company.altitudeHint")}
        choices={ALTITUDE_RULES.map((rule) => ({ value: rule, label: t(`desk:altitudeRules.${rule}`) }))}
      />
      <SelectField
        name={`${prefix}unitsShown`}
        label={t("desk:company.unitsShown")}
        choices={UNITS_SHOWN.map((system) => ({ value: system, label: t(`desk:unitSystems.${system}`) }))}
      />
    </>
  );
}
