import { command } from "@emberladder/diagnosis";
import { COLD_ITEMS } from "@emberladder/furnace";
import { useState } from "react";
import { useTranslation } from "react-i18next";
import { PlainButton } from "#components/ui/button.tsx";
import { useDiagnosis } from "../diagnosis-context.tsx";

/** A unit left without heat: the people in it, safe heat, what must not be lit, the freeze, the CO alarm. */
export function ColdQuestions({ stays }: { stays: boolean }) {
  const { t } = useTranslation();
  const { record, recordAndGoOn } = useDiagnosis();
  const keep = stays ? record : recordAndGoOn;
  const [answers, setAnswers] = useState<Record<string, boolean>>({});
  const answered = COLD_ITEMS.filter((item) => answers[item] !== undefined).length;
  return (
    <div className="flex flex-col gap-2">
      {COLD_ITEMS.map((item) => (
        <fieldset
          key={item}
          className="flex flex-wrap items-center justify-between gap-2 border-b-1 border-hair pb-2"
        >
          <legend className="float-left mb-1 w-full text-field">{t(`trade:coldItems.${item}`)}</legend>
          {[true, false].map((yes) => (
            <label
              key={String(yes)}
              className={`flex min-h-12 grow items-center justify-center rounded px-4 text-field font-semibold has-focus-visible:outline-3 ${answers[item] === yes ? "border-4 border-ink bg-surface" : "border-2 border-rule bg-surface"}`}
            >
              <input
                type="radio"
                name={item}
                className="sr-only"
                checked={answers[item] === yes}
                onChange={() => setAnswers({ ...answers, [item]: yes })}
              />
              {t(yes ? "door.yes" : "door.no")}
            </label>
          ))}
        </fieldset>
      ))}
      <PlainButton
        disabled={answered < COLD_ITEMS.length}
        onClick={() =>
          void keep([
            command("proof.recorded", {
              closing: "close-cold",
              value: answered,
              unit: "count",
              also: answers,
            }),
          ])
        }
      >
        {t("proof.acts.close-cold", { count: answered, of: COLD_ITEMS.length })}
      </PlainButton>
    </div>
  );
}
