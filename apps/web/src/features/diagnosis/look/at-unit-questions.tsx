import { command } from "@emberladder/diagnosis";
import { AT_UNIT_FINDS } from "@emberladder/furnace";
import type { AtUnitFind } from "@emberladder/furnace";
import { useState } from "react";
import { useTranslation } from "react-i18next";
import { AnswerButton } from "#components/ui/answer-button.tsx";
import { LinkButton, PrimaryButton } from "#components/ui/button.tsx";
import { ReadingField } from "#components/ui/reading-field.tsx";
import { parseReading } from "#lib/parse-reading.ts";
import { useDiagnosis } from "../diagnosis-context.tsx";
import { FieldLayout } from "../parts/field-layout.tsx";
import { RefusalNote } from "../parts/refusal-note.tsx";
import { useUnitLine } from "../parts/use-unit-line.ts";

/** At the unit, before the first touch: soot, water, old wrap, what cannot be locked, a live cabinet. */
export function AtUnitQuestions({ onClose }: { onClose: () => void }) {
  const { t } = useTranslation();
  const { diagnosisId, state, recordAndGoOn } = useDiagnosis();
  const unitLine = useUnitLine();
  const [found, setFound] = useState<AtUnitFind[]>([]);
  const [volts, setVolts] = useState("");
  const parsed = parseReading(volts);
  const cabinetV = parsed.ok && parsed.value !== "OL" ? parsed.value : undefined;
  const toggle = (find: AtUnitFind) =>
    setFound((before) => (before.includes(find) ? before.filter((one) => one !== find) : [...before, find]));
  return (
    <FieldLayout
      diagnosisId={diagnosisId}
      state={state}
      title={t("look.header")}
      subtitle={unitLine}
      pinned={
        <PrimaryButton
          onClick={() => {
            onClose();
            void recordAndGoOn([
              command("door.answered", {
                question: "at-unit",
                found,
                ...(cabinetV === undefined ? {} : { cabinetV }),
              }),
            ]);
          }}
        >
          {t("look.recordAtUnit")}
        </PrimaryButton>
      }
    >
      <h1 className="text-question">{t("look.atUnitTitle")}</h1>
      <RefusalNote />
      {AT_UNIT_FINDS.map((find) => (
        <AnswerButton key={find} chosen={found.includes(find)} onChoose={() => toggle(find)}>
          {t(`trade:door.finds.${find}`)}
        </AnswerButton>
      ))}
      <ReadingField compact label={t("look.cabinet")} unit="V" text={volts} onChange={setVolts} />
      <LinkButton onClick={onClose}>{t("look.back")}</LinkButton>
    </FieldLayout>
  );
}
