import { useEffect, useRef } from "react";
import { useTranslation } from "react-i18next";
import { useRuleWords } from "#lib/use-rule-words.ts";
import { useDiagnosis } from "../diagnosis-context.tsx";

/** Why the last act was not taken: what the rule asks, that nothing was recorded, what to do. */
export function RefusalNote() {
  const { t } = useTranslation();
  const ruleWords = useRuleWords();
  const { refusal } = useDiagnosis();
  const note = useRef<HTMLDivElement>(null);
  useEffect(() => {
    if (refusal) note.current?.focus();
  }, [refusal]);
  if (!refusal) return null;
  return (
    <div
      ref={note}
      role="alert"
      tabIndex={-1}
      className="border-l-6 border-ink bg-surface p-3 text-field font-semibold"
    >
      <ul className="flex flex-col gap-2">
        {refusal.breaches.map((breach) => (
          <li key={breach.rule + JSON.stringify(breach.params)}>{ruleWords(breach)}</li>
        ))}
      </ul>
      <p className="mt-1 font-normal text-quiet">{t("rules.nothingRecorded")}</p>
    </div>
  );
}
