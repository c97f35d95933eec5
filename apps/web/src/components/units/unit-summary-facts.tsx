import type { UnitProfile } from "@emberladder/furnace";
import { useTranslation } from "react-i18next";
import { Facts } from "#components/ui/facts.tsx";
import { useFormatReading } from "#lib/use-format-reading.ts";

/** What to know of a unit before the door: its kind in words and the plate figures asked for most. */
export function UnitSummaryFacts({ profile }: { profile: UnitProfile }) {
  const { t } = useTranslation();
  const format = useFormatReading();
  const { codes, plate } = profile;
  const rows = [
    { name: t("trade:codes.axes.ignition"), value: t(`trade:codes.ignition.${codes.ignition}`) },
    { name: t("trade:codes.axes.draft"), value: t(`trade:codes.draft.${codes.draft}`) },
    { name: t("trade:codes.axes.staging"), value: t(`trade:codes.staging.${codes.staging}`) },
    { name: t("trade:codes.axes.location"), value: t(`trade:codes.location.${codes.location}`) },
    { name: t("trade:codes.axes.control"), value: t(`trade:codes.control.${codes.control}`) },
    { name: t("trade:codes.axes.fuel"), value: t(`trade:codes.fuel.${codes.fuel}`) },
  ];
  if (plate.manifoldHighInwc !== undefined)
    rows.push({ name: t("desk:plate.manifoldHighInwc"), value: format(plate.manifoldHighInwc, "inwc") });
  if (plate.switchMakeInwc !== undefined)
    rows.push({ name: t("desk:plate.switchMakeInwc"), value: format(plate.switchMakeInwc, "inwc") });
  if (plate.riseMinF !== undefined && plate.riseMaxF !== undefined) {
    const [least, most] = [
      format(plate.riseMinF, "F", { isRise: true }),
      format(plate.riseMaxF, "F", { isRise: true }),
    ];
    rows.push({ name: t("desk:unit.rise"), value: t("desk:unit.fromTo", { least, most }) });
  }
  return <Facts rows={rows} />;
}
