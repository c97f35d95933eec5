import { useTranslation } from "react-i18next";
import { NumberField } from "#components/forms/number-field.tsx";
import { TextField } from "#components/forms/text-field.tsx";

/** Where a site is and how to get in; the note is shown on site, so no codes belong in it. */
export function SiteFields({ prefix = "" }: { prefix?: string }) {
  const { t } = useTranslation();
  return (
    <>
      <TextField name={`${prefix}address`} label={t("desk:site.address")} />
      <TextField name={`${prefix}town`} label={t("desk:site.town")} />
      <div className="grid gap-4 min-[26rem]:grid-cols-2">
        <TextField name={`${prefix}region`} label={t("desk:site.region")} empty="null" />
        <TextField name={`${prefix}postalCode`} label={t("desk:site.postalCode")} empty="null" />
      </div>
      <NumberField
        name={`${prefix}altitudeFt`}
        label={t("desk:site.altitude")}
        unit={t("desk:plateUnits.ft")}
        empty="null"
        allowNegative
      />
      <TextField
        name={`${prefix}timeZone`}
        label={t("desk:site.timeZone")}
        hint={t("desk:site.timeZoneHint")}
        empty="null"
      />
      <TextField
        name={`${prefix}accessNote`}
        label={t("desk:site.accessNote")}
        hint={t("desk:site.accessHint")}
        empty="null"
      />
    </>
  );
}

/** A site of which nothing is known yet. */
export const EMPTY_SITE = {
  address: "",
  town: "",
  region: null,
  postalCode: null,
  timeZone: null,
  altitudeFt: null,
  accessNote: null,
};
