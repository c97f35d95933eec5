import { UNIT_SYSTEMS } from "@emberladder/field-math";
import { useTranslation } from "react-i18next";
import { ChoiceGroup } from "#components/forms/choice-group.tsx";
import { Section } from "#components/ui/page-head.tsx";
import { chooseHandedness, HANDS, useHandedness } from "#lib/handedness.ts";
import { chooseScheme, SCHEMES, useScheme } from "#lib/scheme.ts";
import { useMe } from "#lib/session.tsx";
import { chooseUnits, useUnitChoice } from "#lib/units-shown.ts";

/** How the screens look on this device: colours, units, and the side of the ladder. Each choice holds at once. */
export function AppearanceSection() {
  const { t } = useTranslation();
  const { company } = useMe();
  const scheme = useScheme();
  const units = useUnitChoice();
  const hand = useHandedness();
  return (
    <Section title={t("desk:appearance.title")} note={t("desk:appearance.note")}>
      <div className="flex flex-col gap-5">
        <ChoiceGroup
          label={t("desk:appearance.scheme")}
          choices={SCHEMES.map((value) => ({ value, label: t(`desk:schemes.${value}`) }))}
          value={scheme}
          onChoose={chooseScheme}
        />
        <ChoiceGroup
          label={t("desk:company.unitsShown")}
          choices={[
            {
              value: "company" as const,
              label: t("desk:appearance.asCompany", { units: t(`desk:unitSystems.${company.unitsShown}`) }),
            },
            ...UNIT_SYSTEMS.map((value) => ({ value, label: t(`desk:unitSystems.${value}`) })),
          ]}
          value={units ?? "company"}
          onChoose={(value) => chooseUnits(value === "company" ? undefined : value)}
        />
        <ChoiceGroup
          label={t("desk:appearance.strip")}
          choices={HANDS.map((value) => ({ value, label: t(`desk:hands.${value}`) }))}
          value={hand}
          onChoose={chooseHandedness}
        />
      </div>
    </Section>
  );
}
