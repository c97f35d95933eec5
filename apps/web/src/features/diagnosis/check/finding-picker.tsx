import type { CheckId, Finding } from "@emberladder/furnace";
import { useState } from "react";
import { useTranslation } from "react-i18next";
import { LinkButton } from "#components/ui/button.tsx";

const FIRST_SHOWN = 4;

/** What exactly was found, where a reading can mean more than one thing. It is optional: the value stands alone. */
export function FindingPicker({
  check,
  findings,
  chosen,
  onChoose,
}: {
  check: CheckId;
  findings: readonly Finding[];
  chosen: string | undefined;
  onChoose: (finding: string | undefined) => void;
}) {
  const { t } = useTranslation();
  const [all, setAll] = useState(false);
  if (findings.length === 0) return null;
  const offered = all ? findings : findings.slice(0, FIRST_SHOWN);
  return (
    <fieldset className="flex flex-col gap-2">
      <legend className="mb-1 text-field font-semibold">{t("check.which")}</legend>
      {offered.map((finding) => (
        <label
          key={finding.id}
          className={`flex min-h-12 items-center rounded bg-surface px-4 text-field has-focus-visible:outline-3 ${finding.id === chosen ? "border-4 border-ink font-semibold" : "border-2 border-rule"}`}
        >
          <input
            type="radio"
            name="finding"
            className="sr-only"
            checked={finding.id === chosen}
            onChange={() => onChoose(finding.id)}
          />
          {t(`trade:findings.${check}.${finding.id}`)}
        </label>
      ))}
      {findings.length > FIRST_SHOWN && !all && (
        <LinkButton onClick={() => setAll(true)}>{t("check.moreFindings")}</LinkButton>
      )}
    </fieldset>
  );
}
