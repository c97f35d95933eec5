import type { MetAct, MetStop } from "@emberladder/diagnosis";
import { actPasses, getCheck } from "@emberladder/furnace";
import { useId, useState } from "react";
import { useTranslation } from "react-i18next";
import { Link } from "react-router-dom";
import { PlainButton, PrimaryButton } from "#components/ui/button.tsx";
import { ReadingField } from "#components/ui/reading-field.tsx";
import { TextAreaField } from "#components/ui/text-area-field.tsx";
import { paths } from "#lib/paths.ts";
import { parseReading } from "#lib/parse-reading.ts";
import { useNow } from "#lib/use-now.ts";
import { useDiagnosis } from "../diagnosis-context.tsx";
import { StepTimer } from "../parts/step-timer.tsx";

/**
 * One act of a stop rule. Acts are done in their order: the one whose turn it is opens, the ones before are
 * ticked, the ones after wait.
 */
export function StopActRow({
  number,
  stop,
  act,
  isNow,
  onDone,
}: {
  number: number;
  stop: MetStop;
  act: MetAct;
  isNow: boolean;
  onDone: (given: { value?: number; text?: string }) => void;
}) {
  const { t } = useTranslation();
  const words = t(`trade:stopRules.${stop.rule}.acts.${act.id}`);
  return (
    <li
      className={`rounded border-2 bg-surface p-3 ${isNow ? "border-4 border-ink" : "border-hair"}`}
      aria-current={isNow ? "step" : undefined}
    >
      <p className="flex gap-3 text-field">
        <span className="numeric w-6 shrink-0 font-semibold" aria-hidden="true">
          {act.done ? (
            <svg viewBox="0 0 24 24" className="size-6">
              <path d="M5 13l5 5 9-12" fill="none" stroke="currentColor" strokeWidth={3} />
            </svg>
          ) : (
            number
          )}
        </span>
        <span className={act.done ? "text-quiet" : "font-semibold"}>
          {words}
          {act.done && <span className="sr-only">{t("stop.done")}</span>}
          {!act.done && act.due === "going-on" && (
            <span className="block font-normal text-quiet">{t("stop.onlyToGoOn")}</span>
          )}
        </span>
      </p>
      {isNow && !act.done && (
        <div className="mt-3">
          <ActInput act={act} onDone={onDone} />
        </div>
      )}
    </li>
  );
}

function ActInput({
  act,
  onDone,
}: {
  act: MetAct;
  onDone: (given: { value?: number; text?: string }) => void;
}) {
  const { t } = useTranslation();
  const { diagnosisId } = useDiagnosis();
  const [text, setText] = useState("");
  const [since, setSince] = useState<number | null>(null);
  const hintId = useId();
  const now = useNow(since !== null);
  switch (act.kind) {
    case "tick":
      // A look that the rule asks for is taken as a check, so that what was seen is on record.
      if (act.check) {
        return (
          <Link
            to={paths.diagnosis.check(diagnosisId, act.check)}
            className="flex min-h-14 items-center justify-center rounded bg-ink px-4 text-[1.25rem] font-semibold text-ground no-underline"
          >
            {t("stop.takeCheck")}
          </Link>
        );
      }
      return <PrimaryButton onClick={() => onDone({})}>{t("stop.doneButton")}</PrimaryButton>;
    case "timer":
      return (
        <div className="flex flex-col gap-2">
          <StepTimer
            label={t("stop.wait")}
            seconds={act.seconds ?? 0}
            since={since}
            onStart={() => setSince(Date.now())}
          />
          <PlainButton
            disabled={since === null || now - since < (act.seconds ?? 0) * 1000}
            onClick={() => onDone({ value: act.seconds })}
          >
            {t("stop.waited")}
          </PlainButton>
        </div>
      );
    case "text":
      return (
        <div className="flex flex-col gap-2">
          <TextAreaField label={t("stop.write")} text={text} onChange={setText} />
          <PrimaryButton disabled={text.trim() === ""} onClick={() => onDone({ text: text.trim() })}>
            {t("stop.recordText")}
          </PrimaryButton>
        </div>
      );
    case "reading": {
      const parsed = parseReading(text);
      const value = parsed.ok && parsed.value !== "OL" ? parsed.value : undefined;
      const unit = act.check ? getCheck(act.check).units[0] : undefined;
      const fails = value !== undefined && !actPasses(act, value);
      return (
        <div className="flex flex-col gap-2">
          <ReadingField
            compact
            label={t("stop.read")}
            unit={unit ? t(`trade:units.${unit}`) : ""}
            text={text}
            onChange={setText}
            describedBy={hintId}
          />
          <p id={hintId} role="status" className="text-field">
            {fails ? t("stop.notYet") : ""}
          </p>
          <PrimaryButton disabled={value === undefined} onClick={() => onDone({ value })}>
            {t("reading.record", { value: text.trim(), unit: unit ? t(`trade:units.${unit}`) : "" })}
          </PrimaryButton>
        </div>
      );
    }
  }
}
