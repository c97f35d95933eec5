import { command, stopFor } from "@emberladder/diagnosis";
import { useState } from "react";
import { useTranslation } from "react-i18next";
import { AnswerButton } from "#components/ui/answer-button.tsx";
import { PrimaryButton } from "#components/ui/button.tsx";
import { HazardLine } from "#components/ui/hazard-line.tsx";
import { ReadingField } from "#components/ui/reading-field.tsx";
import { parseReading } from "#lib/parse-reading.ts";
import { useDiagnosis } from "../diagnosis-context.tsx";
import { FieldLayout } from "../parts/field-layout.tsx";
import { RefusalNote } from "../parts/refusal-note.tsx";
import { StepTimer } from "../parts/step-timer.tsx";
import { useUnitLine } from "../parts/use-unit-line.ts";

/** Minutes with the gas shut before another try, once the unit was reset. Common practice for pilot lighting. */
const CLEAR_OUT_S = 300;

type Resets = "none" | "some" | "unknown";

/** Asks for the resets before this visit; after one, or when nobody knows, five minutes and two zero readings. */
export function BeforeWatch() {
  const { t } = useTranslation();
  const { diagnosisId, state, record } = useDiagnosis();
  const unitLine = useUnitLine();
  const [resets, setResets] = useState<Resets | null>(null);
  const [shutSince, setShutSince] = useState<number | null>(null);
  const [burnerBox, setBurnerBox] = useState("");
  const [vent, setVent] = useState("");
  const readings = [parseReading(burnerBox), parseReading(vent)];
  const needsWait = resets === "some" || resets === "unknown";
  const numbers = readings.map((reading) => (reading.ok && reading.value !== "OL" ? reading.value : null));
  const [boxPct, ventPct] = numbers;
  // A rule against firing lets a call be watched with the gas shut: nothing can burn then.
  const mustShut = stopFor(state, "call-for-heat")?.stops === "firing";
  const ready =
    !mustShut &&
    (resets === "none" || (needsWait && shutSince !== null && boxPct !== null && ventPct !== null));

  const start = () => {
    void record([
      command("watch.started", {
        resetsBefore: resets === "none" ? 0 : resets === "some" ? 1 : null,
        ...(needsWait
          ? {
              before: {
                gasShutS: Math.floor((Date.now() - (shutSince ?? Date.now())) / 1000),
                lelBurnerBoxPct: boxPct ?? 100,
                lelVentPct: ventPct ?? 100,
              },
            }
          : {}),
      }),
    ]);
  };

  return (
    <FieldLayout
      diagnosisId={diagnosisId}
      state={state}
      title={t("watch.header")}
      subtitle={unitLine}
      flush={<HazardLine flush>{t("watch.hazard")}</HazardLine>}
      pinned={
        <PrimaryButton disabled={!ready} onClick={start} detail={t("watch.startDetail")}>
          {t("watch.start")}
        </PrimaryButton>
      }
    >
      <h1 className="text-question">{t("watch.resets")}</h1>
      <RefusalNote />
      {mustShut && (
        <AnswerButton
          onChoose={() =>
            void record([
              command("unit-state.set", { gas: "shut" }),
              command("put-back.opened", { kind: "valve-closed", what: "unit-gas-valve" }),
            ])
          }
        >
          {t("watch.shutForWatch")}
        </AnswerButton>
      )}
      <AnswerButton chosen={resets === "none"} onChoose={() => setResets("none")}>
        {t("watch.resetsNone")}
      </AnswerButton>
      <AnswerButton chosen={resets === "some"} onChoose={() => setResets("some")}>
        {t("watch.resetsSome")}
      </AnswerButton>
      <AnswerButton chosen={resets === "unknown"} onChoose={() => setResets("unknown")}>
        {t("watch.resetsUnknown")}
      </AnswerButton>
      {needsWait && (
        <section className="flex flex-col gap-3 border-t-2 border-ink pt-3" aria-label={t("watch.clearOut")}>
          <h2 className="text-field font-semibold">{t("watch.clearOut")}</h2>
          <StepTimer
            label={t("watch.gasShut")}
            seconds={CLEAR_OUT_S}
            since={shutSince}
            onStart={() => setShutSince(Date.now())}
          />
          <ReadingField
            compact
            label={t("watch.lelBurnerBox")}
            unit="% LEL"
            text={burnerBox}
            onChange={setBurnerBox}
          />
          <ReadingField compact label={t("watch.lelVent")} unit="% LEL" text={vent} onChange={setVent} />
        </section>
      )}
    </FieldLayout>
  );
}
