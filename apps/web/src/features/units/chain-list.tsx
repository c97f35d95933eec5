import type { UnitProfile } from "@emberladder/furnace";
import { useTranslation } from "react-i18next";

/** The safety chain in the order of the unit's own diagram. */
export function ChainList({ chain }: { chain: UnitProfile["chain"] }) {
  const { t } = useTranslation();
  if (!chain) return <p className="text-field text-quiet desk:text-desk">{t("desk:unit.noChain")}</p>;
  return (
    <>
      <p className="mb-2 text-field desk:text-desk">{t(`desk:arrangements.${chain.arrangement}`)}</p>
      <ol className="list-inside list-decimal text-field desk:text-desk">
        {chain.order.map((device) => (
          <li key={device} className="border-b border-hair py-1.5 last:border-b-0">
            {t(`trade:chainDevices.${device}`)}
          </li>
        ))}
      </ol>
    </>
  );
}
