import type { UnitProfile } from "@emberladder/furnace";
import { useTranslation } from "react-i18next";
import { Facts } from "#components/ui/facts.tsx";
import { useFormatReading } from "#lib/use-format-reading.ts";
import { PLATE_FIELDS, TIMING_FIELDS } from "./profile-fields.ts";

/** What the plate, the labels and the control's sheet say of a unit; only what is known. */
export function PlateFacts({ profile }: { profile: UnitProfile }) {
  const { t } = useTranslation();
  const format = useFormatReading();
  const rows = PLATE_FIELDS.flatMap(({ name, unit, isRise }) => {
    const value = profile.plate[name];
    if (value === undefined) return [];
    const shown = () => {
      if (value === null) return t("desk:plate.none");
      if (typeof value === "string") return t(`desk:igniterKinds.${value}`);
      if (unit === undefined) return String(value);
      if (unit === "VA" || unit === "btuPerFt3") return `${value} ${t(`desk:plateUnits.${unit}`)}`;
      return format(value, unit, { isRise });
    };
    return [{ name: t(`desk:plate.${name}`), value: shown() }];
  });
  const timings = TIMING_FIELDS.flatMap(({ name, unit }) => {
    const value = profile.timings[name];
    return value === undefined
      ? []
      : [{ name: t(`desk:timings.${name}`), value: unit ? format(value, unit) : String(value) }];
  });
  const altitude =
    profile.altitudeFt === undefined
      ? []
      : [{ name: t("desk:unit.altitude"), value: t("desk:unit.feet", { value: profile.altitudeFt }) }];
  const all = [...altitude, ...rows, ...timings];
  if (all.length === 0)
    return <p className="text-field text-quiet desk:text-desk">{t("desk:unit.nothingRead")}</p>;
  return <Facts rows={all} />;
}
