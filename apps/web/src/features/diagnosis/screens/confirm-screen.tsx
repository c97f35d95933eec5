import { command } from "@emberladder/diagnosis";
import { useTranslation } from "react-i18next";
import { Link } from "react-router-dom";
import { PrimaryButton } from "#components/ui/button.tsx";
import { paths } from "#lib/paths.ts";
import { useCorrectedProfile } from "../parts/use-corrected-profile.ts";
import { useFormatReading } from "#lib/use-format-reading.ts";
import { useDiagnosis } from "../diagnosis-context.tsx";
import { FieldLayout } from "../parts/field-layout.tsx";
import { RefusalNote } from "../parts/refusal-note.tsx";
import { useUnitLine } from "../parts/use-unit-line.ts";

/** Complaint and unit as they came with the call: right in one tap, or the unit corrected from its plate. */
export function ConfirmScreen() {
  const { t } = useTranslation();
  const { diagnosisId, state, profile: pinned, call, recordAndGoOn } = useDiagnosis();
  const corrected = useCorrectedProfile(call?.unit.id, pinned);
  const profile = corrected ?? pinned;
  const unitLine = useUnitLine();
  const formatReading = useFormatReading();
  const { codes, plate } = profile;
  const facts = [
    t(`trade:codes.ignition.${codes.ignition}`),
    t(`trade:codes.draft.${codes.draft}`),
    t(`trade:codes.staging.${codes.staging}`),
    t(`trade:codes.control.${codes.control}`),
    t(`trade:codes.fuel.${codes.fuel}`),
    t(`trade:codes.location.${codes.location}`),
  ];
  const figures = [
    plate.inputBtuh && t("confirm.input", { value: formatReading(plate.inputBtuh, "btuh") }),
    plate.switchMakeInwc && t("confirm.switchMake", { value: formatReading(plate.switchMakeInwc, "inwc") }),
    plate.riseMinF &&
      plate.riseMaxF &&
      t("confirm.rise", {
        least: formatReading(plate.riseMinF, "F", { isRise: true }),
        most: formatReading(plate.riseMaxF, "F", { isRise: true }),
      }),
    plate.dropOutUa && t("confirm.dropOut", { value: formatReading(plate.dropOutUa, "uA") }),
  ].filter(Boolean);
  return (
    <FieldLayout
      diagnosisId={diagnosisId}
      state={state}
      title={t("confirm.header")}
      subtitle={unitLine}
      pinned={
        <PrimaryButton
          onClick={() =>
            void recordAndGoOn([command("unit.confirmed", corrected ? { profile: corrected } : {})])
          }
        >
          {t("confirm.right")}
        </PrimaryButton>
      }
    >
      <h1 className="text-question">{t("confirm.title")}</h1>
      <RefusalNote />
      {corrected && (
        <p role="status" className="border-l-6 border-ink bg-surface p-3 text-field font-semibold">
          {t("confirm.corrected")}
        </p>
      )}
      {call && (
        <blockquote className="border-l-6 border-ink bg-surface p-3 text-field">
          <p>{call.complaint}</p>
        </blockquote>
      )}
      <ul className="flex flex-col divide-y-1 divide-hair border-y-1 border-hair text-field">
        {[...facts, ...figures].map((fact) => (
          <li key={String(fact)} className="py-1.5">
            {fact}
          </li>
        ))}
      </ul>
      <p className="text-field text-quiet">{t("confirm.plateOutranks")}</p>
      {call && (
        <Link
          to={`${paths.editUnit(call.unit.id)}?diagnosis=${diagnosisId}`}
          className="text-field font-semibold"
        >
          {t("confirm.correct")}
        </Link>
      )}
    </FieldLayout>
  );
}
