import { breaches, command, OUTCOMES_OF_VISIT, proofOf } from "@emberladder/diagnosis";
import type { BodyOf, VisitOutcome } from "@emberladder/diagnosis";
import { isLeftInService } from "@emberladder/furnace";
import { useState } from "react";
import { useTranslation } from "react-i18next";
import { AnswerButton } from "#components/ui/answer-button.tsx";
import { PrimaryButton } from "#components/ui/button.tsx";
import { useDiagnosis } from "../diagnosis-context.tsx";
import { FieldLayout } from "../parts/field-layout.tsx";
import { RefusalNote } from "../parts/refusal-note.tsx";
import { UndoLine } from "../parts/undo-line.tsx";
import { useOpenedAt } from "#lib/use-now.ts";
import { useUnitLine } from "../parts/use-unit-line.ts";
import { ProofRow } from "../proof/proof-row.tsx";

/** Closing another way than fixed: how the unit is left, what has to be asked for it, the act that names it. */
export function CloseScreen() {
  const { t } = useTranslation();
  const { diagnosisId, state, recordAndGoOn } = useDiagnosis();
  const unitLine = useUnitLine();
  const now = useOpenedAt();
  const [outcome, setOutcome] = useState<VisitOutcome | null>(null);
  const [tag, setTag] = useState("");
  const [told, setTold] = useState(false);

  const leftOff = outcome !== null && !isLeftInService(outcome);
  const left: BodyOf<"diagnosis.closed">["left"] =
    outcome === "shut-off"
      ? {
          inService: false,
          gas: "shut-tagged",
          power: "off",
          ...(tag.trim() ? { tag: tag.trim() } : {}),
          told,
        }
      : leftOff
        ? { inService: false, gas: "shut", power: "off", told }
        : { inService: true, gas: "open", power: "on" };
  const closing = outcome && command("diagnosis.closed", { outcome, left });
  const missing = closing ? breaches(state, closing, { now: now }) : [];
  const items = outcome
    ? proofOf(state, outcome, now).filter(
        (item) => !item.verdict.pass && item.id !== "close-jumpers" && item.id !== "close-docs",
      )
    : [];

  return (
    <FieldLayout diagnosisId={diagnosisId} state={state} title={t("close.header")} subtitle={unitLine}>
      <h1 className="text-question">{t("close.title")}</h1>
      <RefusalNote />
      {OUTCOMES_OF_VISIT.map((candidate) => (
        <AnswerButton key={candidate} chosen={candidate === outcome} onChoose={() => setOutcome(candidate)}>
          <span className="block">{t(`outcomes.${candidate}`)}</span>
          <span className="block font-normal text-quiet">{t(`close.means.${candidate}`)}</span>
        </AnswerButton>
      ))}
      {outcome && (
        <section className="flex flex-col gap-3 border-t-2 border-ink pt-3" aria-label={t("close.needs")}>
          {items.map((item) => (
            <ProofRow key={item.id} item={item} stays />
          ))}
          {outcome === "shut-off" && (
            <label className="flex flex-col gap-1 text-field font-semibold">
              {t("close.tag")}
              <input
                value={tag}
                maxLength={40}
                onChange={(event) => setTag(event.target.value)}
                className="min-h-14 rounded border-2 border-rule bg-surface px-3 font-normal"
              />
            </label>
          )}
          {leftOff && (
            <label className="flex min-h-12 items-center gap-3 text-field">
              <input
                type="checkbox"
                className="size-6 accent-ink"
                checked={told}
                onChange={(event) => setTold(event.target.checked)}
              />
              {t("close.told")}
            </label>
          )}
          {missing.length > 0 && (
            <ul className="flex list-disc flex-col gap-1 border-l-6 border-ink bg-surface p-3 pl-8 text-field">
              {missing.map((breach) => (
                <li key={breach.rule + JSON.stringify(breach.params)}>
                  {t([`rules.${breach.rule}`, "rules.unknown"], {
                    ...breach.params,
                    rule: breach.rule,
                    closing: breach.params?.["closing"]
                      ? t(`trade:closing.${String(breach.params["closing"])}.title`)
                      : "",
                  })}
                </li>
              ))}
            </ul>
          )}
          <PrimaryButton
            disabled={missing.length > 0}
            onClick={() => closing && void recordAndGoOn([closing])}
          >
            {t(`answers.close.${outcome}`)}
          </PrimaryButton>
        </section>
      )}
      <UndoLine />
    </FieldLayout>
  );
}
