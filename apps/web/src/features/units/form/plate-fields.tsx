import { useWatch } from "react-hook-form";
import { useTranslation } from "react-i18next";
import { NumberField } from "#components/forms/number-field.tsx";
import { SelectField } from "#components/forms/select-field.tsx";
import { plateFieldsFor, timingFieldsFor } from "../profile-fields.ts";
import type { PlateField } from "../profile-fields.ts";
import { countKnown } from "./count-known.ts";
import { FieldGrid, FoldedPart, FormPart } from "./form-part.tsx";
import { useCodes } from "./use-codes.ts";

/** Figures of the plate and timings of the control, as they are printed: always in the plate's own units. */
export function PlateFields() {
  const { t } = useTranslation();
  const codes = useCodes();
  const timings = useWatch({ name: "profile.timings" }) as object | undefined;
  const timingFields = timingFieldsFor(codes);
  return (
    <>
      <FormPart title={t("desk:unit.plate")} note={t("desk:unit.plateAsk")}>
        <FieldGrid isPaired>
          <NumberField
            name="profile.altitudeFt"
            label={t("desk:unit.altitude")}
            unit={t("desk:plateUnits.ft")}
            allowNegative
          />
          {plateFieldsFor(codes).map((field) => (
            <PlateControl key={field.name} field={field} />
          ))}
        </FieldGrid>
      </FormPart>
      <FoldedPart
        title={t("desk:unit.timings")}
        aside={t("desk:unit.known", { known: countKnown(timings), count: timingFields.length })}
        note={t("desk:unit.timingsAsk")}
      >
        <FieldGrid isPaired>
          {timingFields.map(({ name, unit }) => (
            <NumberField
              key={name}
              name={`profile.timings.${name}`}
              label={t(`desk:timings.${name}`)}
              unit={unit && t(`trade:units.${unit}`)}
            />
          ))}
        </FieldGrid>
      </FoldedPart>
    </>
  );
}

function PlateControl({ field }: { field: PlateField }) {
  const { t } = useTranslation();
  const name = `profile.plate.${field.name}`;
  const label = t(`desk:plate.${field.name}`);
  const unknown = t("desk:form.unknown");
  if (field.name === "igniterVolts")
    return (
      <SelectField
        name={name}
        label={label}
        as="number"
        emptyLabel={unknown}
        choices={["24", "80", "120"].map((volts) => ({
          value: volts,
          label: `${volts} ${t("trade:units.V")}`,
        }))}
      />
    );
  if (field.name === "igniterKind")
    return (
      <SelectField
        name={name}
        label={label}
        emptyLabel={unknown}
        choices={["SiC", "SiN"].map((kind) => ({ value: kind, label: t(`desk:igniterKinds.${kind}`) }))}
      />
    );
  if (field.name === "phase")
    return (
      <SelectField
        name={name}
        label={label}
        as="number"
        emptyLabel={unknown}
        choices={["1", "3"].map((phase) => ({ value: phase, label: phase }))}
      />
    );
  const { unit } = field;
  const sign =
    unit === "btuh" || unit === "VA" || unit === "btuPerFt3"
      ? t(`desk:plateUnits.${unit}`)
      : unit && t(`trade:units.${unit}`);
  return <NumberField name={name} label={label} unit={sign} allowNegative={field.name === "draftMinInwc"} />;
}
