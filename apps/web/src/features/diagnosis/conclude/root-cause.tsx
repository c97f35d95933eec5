import { causesOf, isFaultId } from "@emberladder/furnace";
import type { FaultId } from "@emberladder/furnace";
import { useTranslation } from "react-i18next";
import { AnswerButton } from "#components/ui/answer-button.tsx";
import { TextAreaField } from "#components/ui/text-area-field.tsx";
import { useDiagnosis } from "../diagnosis-context.tsx";

export interface RootCauseGiven {
  fault?: FaultId;
  text: string;
}

/** Why a manual-reset device tripped: asked before it can be concluded as repaired. All clean is an answer too. */
export function RootCause({
  cause,
  given,
  onChange,
}: {
  cause: FaultId;
  given: RootCauseGiven | null;
  onChange: (given: RootCauseGiven) => void;
}) {
  const { t } = useTranslation();
  const { profile } = useDiagnosis();
  const causes = [cause, ...causesOf(cause, { codes: profile.codes, options: profile.options })].filter(
    isFaultId,
  );
  return (
    <section className="flex flex-col gap-2 border-t-2 border-ink pt-3" aria-label={t("conclude.rootCause")}>
      <h2 className="text-field font-semibold">{t("conclude.rootCause")}</h2>
      {[...new Set(causes)].map((fault) => (
        <AnswerButton
          key={fault}
          chosen={given?.fault === fault}
          onChoose={() => onChange({ fault, text: given?.text ?? "" })}
        >
          {t(`trade:faults.${fault}.name`)}
        </AnswerButton>
      ))}
      <AnswerButton
        chosen={given !== null && given.fault === undefined}
        onChoose={() => onChange({ text: given?.text ?? "" })}
      >
        {t("conclude.allClean")}
      </AnswerButton>
      {given && (
        <TextAreaField
          label={t("conclude.why")}
          text={given.text}
          onChange={(text) => onChange({ ...given, text })}
        />
      )}
    </section>
  );
}
