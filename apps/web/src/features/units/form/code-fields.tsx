import { CONTROLS, DRAFTS, FUELS, IGNITIONS, LOCATIONS, STAGINGS } from "@emberladder/furnace";
import { useTranslation } from "react-i18next";
import { SelectField } from "#components/forms/select-field.tsx";
import { FieldGrid, FormPart } from "./form-part.tsx";

const AXES = {
  ignition: IGNITIONS,
  draft: DRAFTS,
  staging: STAGINGS,
  location: LOCATIONS,
  control: CONTROLS,
  fuel: FUELS,
} as const;

/** The six choices that name a kind of unit. */
export function CodeFields() {
  const { t } = useTranslation();
  return (
    <FormPart title={t("desk:unit.kind")} note={t("desk:unit.kindNote")}>
      <FieldGrid>
        {Object.entries(AXES).map(([axis, values]) => (
          <SelectField
            key={axis}
            name={`profile.codes.${axis}`}
            label={t(`trade:codes.axes.${axis}`)}
            choices={values.map((value) => ({ value, label: t(`trade:codes.${axis}.${value}`) }))}
          />
        ))}
      </FieldGrid>
    </FormPart>
  );
}
