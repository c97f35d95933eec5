import { OPTION_FLAGS } from "@emberladder/furnace";
import type { Options } from "@emberladder/furnace";
import { useWatch } from "react-hook-form";
import { useTranslation } from "react-i18next";
import { YesNoField } from "#components/forms/yes-no-field.tsx";
import { optionApplies } from "../profile-fields.ts";
import { FoldedPart } from "./form-part.tsx";
import { useCodes } from "./use-codes.ts";

/** What the unit has besides its kind. Not known is a fair answer and the one it starts with. */
export function OptionFields() {
  const { t } = useTranslation();
  const codes = useCodes();
  const options = useWatch({ name: "profile.options" }) as Options | undefined;
  const flags = OPTION_FLAGS.filter((flag) => optionApplies(flag, codes));
  const known = flags.filter((flag) => options?.[flag] !== undefined).length;
  return (
    <FoldedPart
      title={t("desk:unit.options")}
      aside={t("desk:unit.known", { known, count: flags.length })}
      note={t("desk:unit.optionsAsk")}
    >
      {flags.map((flag) => (
        <YesNoField key={flag} name={`profile.options.${flag}`} label={t(`trade:options.${flag}`)} />
      ))}
    </FoldedPart>
  );
}
