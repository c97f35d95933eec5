import { doorProgress, openStops } from "@emberladder/diagnosis";
import type { Command } from "@emberladder/diagnosis";
import { format } from "date-fns";
import { useState } from "react";
import { useTranslation } from "react-i18next";
import { AnswerButton } from "#components/ui/answer-button.tsx";
import { PlainButton } from "#components/ui/button.tsx";
import { KeypadSheet } from "#components/ui/keypad-sheet.tsx";
import { useDiagnosis } from "../diagnosis-context.tsx";
import { FieldLayout } from "../parts/field-layout.tsx";
import { RefusalNote } from "../parts/refusal-note.tsx";
import { useUnitLine } from "../parts/use-unit-line.ts";

type Typing = "co" | "lel" | null;

/**
 * Arrival: people before meters. Three questions, each with one wide button whose label is the reading it
 * stores; all well is three taps, and the third goes on. Anything else opens the keypad or a stop rule.
 */
export function DoorScreen() {
  const { t } = useTranslation();
  const { diagnosisId, state, profile, recordAndGoOn } = useDiagnosis();
  const unitLine = useUnitLine();
  const [typing, setTyping] = useState<Typing>(null);
  const { people, smell, "way-in": wayIn } = state.door;
  const { answered } = doorProgress(state);
  const onRoof = profile.codes.location === "RTU";

  const answer = (body: Command["body"] & { question: string }) =>
    void recordAndGoOn([{ type: "door.answered", body } as Command]);
  const peopleWell = people && !people.unwell && !people.alarm && (people.coPpm ?? 0) === 0;
  const time = (at: number | undefined) => (at === undefined ? undefined : format(at, "HH:mm"));

  if (typing) {
    const isCo = typing === "co";
    return (
      <KeypadSheet
        title={t(isCo ? "door.coTitle" : "door.lelTitle")}
        hint={t(
          isCo
            ? onRoof
              ? "door.coWhereRoof"
              : "door.coWhere"
            : profile.codes.fuel === "LP"
              ? "door.lelFloor"
              : "door.lelCeiling",
        )}
        unit={isCo ? "ppm" : "% LEL"}
        label={t(isCo ? "door.coLabel" : "door.lelLabel")}
        limits={{ least: 0, most: isCo ? 2000 : 100 }}
        onCancel={() => setTyping(null)}
        onSave={(value) => {
          setTyping(null);
          if (isCo) answer({ question: "people", unwell: false, alarm: false, coPpm: value });
          else answer({ question: "smell", smell: false, lelPct: value });
        }}
      />
    );
  }

  return (
    <FieldLayout
      diagnosisId={diagnosisId}
      state={state}
      title={t("door.header")}
      subtitle={unitLine}
      door={{ answered, of: 3 }}
      stopped={openStops(state).length > 0}
    >
      <h1 className="border-b-1 border-hair pb-3 text-question short:pb-1.5 short:text-[1.375rem] short:leading-6.5">
        {t("door.title")}
      </h1>
      <RefusalNote />
      <Question number={1} text={t("door.people")}>
        <AnswerButton
          chosen={peopleWell === true}
          aside={time(people?.at)}
          onChoose={() => answer({ question: "people", unwell: false, alarm: false, coPpm: 0 })}
        >
          {t("door.peopleWell")}
        </AnswerButton>
        <div className="grid grid-cols-[4fr_3fr_3fr] large-letters:grid-cols-1 gap-2">
          <PlainButton compact onClick={() => setTyping("co")}>
            {people?.coPpm ? t("door.coStored", { ppm: people.coPpm }) : t("door.coMore")}
          </PlainButton>
          <PlainButton compact onClick={() => answer({ question: "people", unwell: true, alarm: false })}>
            {t("door.unwell")}
          </PlainButton>
          <PlainButton compact onClick={() => answer({ question: "people", unwell: false, alarm: true })}>
            {t("door.alarm")}
          </PlainButton>
        </div>
      </Question>
      <Question number={2} text={t("door.smell")}>
        <AnswerButton
          chosen={smell !== undefined && !smell.smell && (smell.lelPct ?? 0) === 0}
          aside={time(smell?.at)}
          onChoose={() => answer({ question: "smell", smell: false, lelPct: 0 })}
        >
          {t("door.smellNone")}
        </AnswerButton>
        <div className="grid grid-cols-2 large-letters:grid-cols-1 gap-2">
          <PlainButton compact onClick={() => setTyping("lel")}>
            {smell?.lelPct ? t("door.lelStored", { pct: smell.lelPct }) : t("door.lelMore")}
          </PlainButton>
          <PlainButton compact onClick={() => answer({ question: "smell", smell: true })}>
            {t("door.smellYes")}
          </PlainButton>
        </div>
      </Question>
      <Question number={3} text={t(onRoof ? "door.wayInRoof" : "door.wayIn")} last>
        <div className="grid grid-cols-[1fr_6rem] large-letters:grid-cols-1 gap-2">
          <AnswerButton
            chosen={wayIn?.safe === true}
            aside={time(wayIn?.at)}
            onChoose={() => answer({ question: "way-in", safe: true })}
          >
            {t("door.yes")}
          </AnswerButton>
          <PlainButton compact onClick={() => answer({ question: "way-in", safe: false })}>
            {t("door.no")}
          </PlainButton>
        </div>
      </Question>
      <p className="text-field text-quiet short:hidden">{t("door.note")}</p>
    </FieldLayout>
  );
}

function Question({
  number,
  text,
  last,
  children,
}: {
  number: number;
  text: string;
  last?: boolean;
  children: React.ReactNode;
}) {
  return (
    <section
      aria-label={text}
      className={`flex flex-col gap-2 short:gap-1.5 ${last ? "" : "border-b-1 border-hair pb-3 short:pb-1.5"}`}
    >
      <h2 className="flex gap-3 text-field font-semibold">
        <span className="numeric">{number}</span>
        {text}
      </h2>
      {children}
    </section>
  );
}
