import { command } from "@emberladder/diagnosis";
import { useTranslation } from "react-i18next";
import { useNavigate } from "react-router-dom";
import { LinkButton } from "#components/ui/button.tsx";
import { useDiagnosis } from "../diagnosis-context.tsx";

const RAISED = ["gas-odor", "co", "co-alarm", "raw-gas", "live-cabinet"] as const;

/** One tap away on every field screen: what is wrong, and the acts follow. */
export function SafetyScreen() {
  const { t } = useTranslation();
  const navigate = useNavigate();
  const { recordAndGoOn } = useDiagnosis();
  return (
    <main className="mx-auto flex min-h-dvh max-w-[560px] flex-col gap-3 p-4">
      <h1 className="text-question">{t("safety.title")}</h1>
      {RAISED.map((rule) => (
        <button
          key={rule}
          type="button"
          onClick={() => void recordAndGoOn([command("stop.raised", { rule })])}
          className="min-h-16 rounded border-3 border-caution-edge bg-caution px-4 py-2 text-left text-[1.25rem] font-semibold text-on-caution"
        >
          {t(`safety.raise.${rule}`)}
        </button>
      ))}
      <p className="text-field text-quiet">{t("safety.defer")}</p>
      <LinkButton onClick={() => void navigate(-1)}>{t("safety.back")}</LinkButton>
    </main>
  );
}

/** The same acts to read, without a diagnosis open. */
export function GeneralSafetyScreen() {
  const { t } = useTranslation();
  return (
    <main className="mx-auto flex min-h-dvh max-w-[560px] flex-col gap-4 p-4">
      <h1 className="text-question">{t("stop.leaveNow")}</h1>
      <ol className="flex list-decimal flex-col gap-2 pl-6 text-field">
        {["everyone-out", "called-gas-supplier"].map((act) => (
          <li key={act}>{t(`trade:stopRules.gas-odor.acts.${act}`)}</li>
        ))}
      </ol>
      <h2 className="text-question">{t("trade:stopRules.co.title")}</h2>
      <ol className="flex list-decimal flex-col gap-2 pl-6 text-field">
        {["everyone-out", "called-emergency"].map((act) => (
          <li key={act}>{t(`trade:stopRules.co.acts.${act}`)}</li>
        ))}
      </ol>
      <p className="text-field text-quiet">{t("safety.defer")}</p>
    </main>
  );
}
