import { OPTION_FLAGS } from "@emberladder/furnace";
import { useTranslation } from "react-i18next";
import { YesNoField } from "#components/forms/yes-no-field.tsx";
import { optionApplies } from "../profile-fields.ts";
import { FormPart } from "./form-part.tsx";
import { useCodes } from "./use-codes.ts";

/** What the unit has besides its kind. Not known is a fair answer and the one it starts with. */
export function OptionFields() {
  const { t } = useTranslation();
  const codes = useCodes();
  return (
    <FormPart title={t("desk:unit.options")} note={t("desk:unit.optionsAsk")}>
      {OPTION_FLAGS.filter((flag) => optionApplies(flag, codes)).map((flag) => (
        <YesNoField key={flag} name={`profile.options.${flag}`} label={t(`trade:options.${flag}`)} />
      ))}
    </FormPart>
  );
}
