import { command, openPutBacks } from "@emberladder/diagnosis";
import type { Command, ProofItem } from "@emberladder/diagnosis";
import { useState } from "react";
import { useTranslation } from "react-i18next";
import { AnswerButton } from "#components/ui/answer-button.tsx";
import { PlainButton } from "#components/ui/button.tsx";
import { useDiagnosis } from "../diagnosis-context.tsx";
import { ColdQuestions } from "./cold-questions.tsx";
import { ProofNumber } from "./proof-number.tsx";
import { TimedProof } from "./timed-proof.tsx";

/** The act that records one closing check: a tap whose label is what it stores, or a number. */
export function ProofAct({ item, stays }: { item: ProofItem; stays: boolean }) {
  const { t } = useTranslation();
  const { state, record, recordAndGoOn } = useDiagnosis();
  const keep = stays ? record : recordAndGoOn;
  const [typing, setTyping] = useState(false);
  const { id } = item;
  const label = (key: string, values?: Record<string, unknown>) => t(`proof.acts.${key}`, values);
  const tap = (commands: Command[]) => void keep(commands);
  const runs = command("unit-state.set", { power: "on", calling: true });

  switch (id) {
    case "close-cycles": {
      const lit = item.reading?.value ?? 0;
      const asked = item.lights ?? 1;
      return (
        <div className="grid grid-cols-[1fr_7rem] large-letters:grid-cols-1 gap-2">
          <AnswerButton
            onChoose={() =>
              void record([
                ...(lit === 0 ? [runs] : []),
                command("proof.recorded", {
                  closing: id,
                  value: lit + 1,
                  unit: "count",
                  also: { retries: 0 },
                }),
              ])
            }
          >
            {label(lit === 0 ? "firstLight" : "light", { number: lit + 1, count: asked })}
          </AnswerButton>
          <PlainButton
            compact
            onClick={() =>
              void record([
                command("proof.recorded", { closing: id, value: 0, unit: "count", also: { retries: 1 } }),
              ])
            }
          >
            {label("retried")}
          </PlainButton>
        </div>
      );
    }
    case "close-flame":
      return (
        <AnswerButton
          onChoose={() =>
            void record([
              command("proof.recorded", { closing: "close-flame", seenRight: true }),
              command("proof.recorded", { closing: "close-cycle-end", value: 2, unit: "s", seenRight: true }),
              command("unit-state.set", { calling: false }),
            ])
          }
        >
          {label("flame")}
        </AnswerButton>
      );
    case "close-cycle-end":
      return state.proofs["close-flame"] ? (
        <AnswerButton
          onChoose={() =>
            void record([command("proof.recorded", { closing: id, value: 2, unit: "s", seenRight: true })])
          }
        >
          {label("cycleEnd")}
        </AnswerButton>
      ) : null;
    case "close-room-co":
      return typing ? (
        <ProofNumber item={item} stays={stays} />
      ) : (
        <div className="grid grid-cols-[1fr_8rem] large-letters:grid-cols-1 gap-2">
          <AnswerButton
            onChoose={() =>
              void record([
                command("proof.recorded", {
                  closing: id,
                  value: 0,
                  unit: "ppm",
                  also: { beforePpm: coBefore() },
                }),
              ])
            }
          >
            {label("roomCo")}
          </AnswerButton>
          <PlainButton compact onClick={() => setTyping(true)}>
            {label("readsMore")}
          </PlainButton>
        </div>
      );
    case "close-panels":
      return (
        <AnswerButton
          onChoose={() =>
            tap([
              ...openPutBacks(state)
                .filter((open) => open.kind === "cover-removed")
                .map((open) => command("put-back.restored", { of: open.eventId, entry: open.entry })),
              command("proof.recorded", { closing: id, seenRight: true }),
            ])
          }
        >
          {label("panels")}
        </AnswerButton>
      );
    case "close-tstat":
    case "close-safeties":
    case "close-restore":
      return (
        <AnswerButton onChoose={() => tap([command("proof.recorded", { closing: id, seenRight: true })])}>
          {label(id)}
        </AnswerButton>
      );
    case "close-leak-up":
    case "close-leak-down":
      return (
        <AnswerButton
          onChoose={() =>
            tap([command("proof.recorded", { closing: id, value: 0, unit: "pct", also: { bubbles: false } })])
          }
        >
          {label(id)}
        </AnswerButton>
      );
    case "close-draft-opens":
      return <TimedProof item={item} seconds={60} stays={stays} />;
    case "close-cold":
      return <ColdQuestions stays={stays} />;
    default:
      return <ProofNumber item={item} stays={stays} />;
  }

  function coBefore(): number {
    return state.door.people?.question === "people" ? (state.door.people.coPpm ?? 0) : 0;
  }
}
