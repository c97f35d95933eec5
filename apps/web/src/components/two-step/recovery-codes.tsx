import { useState } from "react";
import { useTranslation } from "react-i18next";
import { ActButton } from "#components/ui/act.tsx";

/** Recovery codes, shown once: to copy, to print, and to leave only after saying that they are kept. */
export function RecoveryCodes({ codes, onKept }: { codes: readonly string[]; onKept: () => void }) {
  const { t } = useTranslation();
  const [isCopied, setCopied] = useState(false);
  return (
    <div className="flex flex-col gap-4">
      <p className="text-field desk:text-desk">{t("desk:twoStep.recoveryNote")}</p>
      <ol className="numeric border-2 border-ink bg-surface p-3 text-label leading-7 break-words desk:text-desk">
        {codes.map((code) => (
          <li key={code} className="select-all">
            {code}
          </li>
        ))}
      </ol>
      <div className="flex flex-wrap gap-3">
        <ActButton
          onClick={() =>
            void navigator.clipboard.writeText(codes.join("\n")).then(
              () => setCopied(true),
              () => setCopied(false),
            )
          }
        >
          {isCopied ? t("desk:twoStep.copied") : t("desk:twoStep.copy")}
        </ActButton>
        <ActButton onClick={() => print()}>{t("desk:twoStep.print")}</ActButton>
      </div>
      <ActButton kind="solid" onClick={onKept}>
        {t("desk:twoStep.kept")}
      </ActButton>
    </div>
  );
}
