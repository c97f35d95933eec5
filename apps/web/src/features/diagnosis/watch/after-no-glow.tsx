import { command } from "@emberladder/diagnosis";
import { useTranslation } from "react-i18next";
import { PrimaryButton } from "#components/ui/button.tsx";
import { HazardLine } from "#components/ui/hazard-line.tsx";
import { useDiagnosis } from "../diagnosis-context.tsx";
import { FieldLayout } from "../parts/field-layout.tsx";
import { RefusalNote } from "../parts/refusal-note.tsx";
import { useUnitLine } from "../parts/use-unit-line.ts";

/** After a missing glow: the gas is shut at the unit, and that goes on the put-back list by itself. */
export function AfterNoGlow() {
  const { t } = useTranslation();
  const { diagnosisId, state, recordAndGoOn } = useDiagnosis();
  const unitLine = useUnitLine();
  return (
    <FieldLayout
      diagnosisId={diagnosisId}
      state={state}
      title={t("watch.header")}
      subtitle={unitLine}
      notch="ignition-source"
      pinned={
        <PrimaryButton
          onClick={() =>
            void recordAndGoOn([
              command("unit-state.set", { gas: "shut", calling: false }),
              command("put-back.opened", { kind: "valve-closed", what: "unit-gas-valve" }),
            ])
          }
        >
          {t("watch.gasIsShut")}
        </PrimaryButton>
      }
    >
      <HazardLine>{t("watch.gasOpensNext")}</HazardLine>
      <h1 className="text-question">{t("watch.shutGas")}</h1>
      <RefusalNote />
      <p className="text-field text-quiet">{t("watch.shutGasWhy")}</p>
    </FieldLayout>
  );
}
