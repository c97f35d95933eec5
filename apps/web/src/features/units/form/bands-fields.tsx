import { bandsOf, CHECK_IDS } from "@emberladder/furnace";
import type { CheckId } from "@emberladder/furnace";
import { useFieldArray, useWatch } from "react-hook-form";
import { useTranslation } from "react-i18next";
import { SelectField } from "#components/forms/select-field.tsx";
import { TextField } from "#components/forms/text-field.tsx";
import { ActButton } from "#components/ui/act.tsx";
import { FieldGrid, FoldedPart } from "./form-part.tsx";

const WITH_BAND = CHECK_IDS.filter((check) => bandsOf(check).length > 0);

/** Bands replaced for this unit: the check, the figures as a chain, and where they come from. */
export function BandsFields() {
  const { t } = useTranslation();
  const { fields, append, remove } = useFieldArray({ name: "profile.bands" });
  return (
    <FoldedPart title={t("desk:unit.bands")} aside={String(fields.length)} note={t("desk:unit.bandsAsk")}>
      {fields.map((field, index) => (
        <fieldset key={field.id} className="border-b border-hair py-3">
          <legend className="sr-only">{t("desk:bands.number", { number: index + 1 })}</legend>
          <BandFields index={index} />
          <div className="mt-2">
            <ActButton
              kind="words"
              aria-label={t("desk:bands.removeOf", { number: index + 1 })}
              onClick={() => remove(index)}
            >
              {t("desk:bands.remove")}
            </ActButton>
          </div>
        </fieldset>
      ))}
      <div className="mt-3">
        <ActButton onClick={() => append({ check: WITH_BAND[0], chain: "", source: "" })}>
          {t("desk:bands.add")}
        </ActButton>
      </div>
    </FoldedPart>
  );
}

function BandFields({ index }: { index: number }) {
  const { t } = useTranslation();
  const name = `profile.bands.${index}`;
  const check = useWatch({ name: `${name}.check` }) as CheckId;
  const bands = bandsOf(check);
  return (
    <FieldGrid>
      <SelectField
        name={`${name}.check`}
        label={t("desk:bands.check")}
        choices={WITH_BAND.map((id) => ({ value: id, label: t(`trade:checks.${id}.title`) }))}
      />
      {bands.length > 1 && (
        <SelectField
          name={`${name}.when`}
          label={t("desk:bands.when")}
          emptyLabel={t("desk:bands.first")}
          choices={[...new Set(bands.map((band) => band.key))].map((key) => ({ value: key, label: key }))}
        />
      )}
      <TextField name={`${name}.chain`} label={t("desk:bands.chain")} hint={t("desk:bands.chainHint")} />
      <TextField name={`${name}.source`} label={t("desk:bands.source")} hint={t("desk:bands.sourceHint")} />
    </FieldGrid>
  );
}
