import type { UnitProfile } from "@emberladder/furnace";
import { useTranslation } from "react-i18next";

/** The bands replaced for this unit, each with where its figures come from. */
export function BandList({ bands }: { bands: UnitProfile["bands"] }) {
  const { t } = useTranslation();
  if (bands.length === 0)
    return <p className="text-field text-quiet desk:text-desk">{t("desk:unit.noBands")}</p>;
  return (
    <ul>
      {bands.map((band) => (
        <li
          key={`${band.check} ${band.when}`}
          className="border-b border-hair py-2 text-field last:border-b-0 desk:text-desk"
        >
          <span className="font-semibold">{t(`trade:checks.${band.check}.title`)}</span>{" "}
          <span className="numeric">{band.chain}</span>
          <span className="block text-quiet">{t("desk:unit.bandSource", { source: band.source })}</span>
        </li>
      ))}
    </ul>
  );
}
