import { OPTION_FLAGS } from "@emberladder/furnace";
import type { Options } from "@emberladder/furnace";
import { useTranslation } from "react-i18next";

/** What a unit has besides its kind, and what it is known not to have. The rest is not known. */
export function OptionList({ options }: { options: Options }) {
  const { t } = useTranslation();
  const known = OPTION_FLAGS.filter((flag) => options[flag] !== undefined);
  if (known.length === 0)
    return <p className="text-field text-quiet desk:text-desk">{t("desk:unit.noOptions")}</p>;
  return (
    <ul className="flex flex-col gap-1 text-field desk:text-desk">
      {known.map((flag) => (
        <li key={flag}>
          {options[flag]
            ? t(`trade:options.${flag}`)
            : t("desk:unit.not", { option: t(`trade:options.${flag}`) })}
        </li>
      ))}
    </ul>
  );
}
