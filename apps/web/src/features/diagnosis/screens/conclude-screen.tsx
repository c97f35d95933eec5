import {
  causeCandidates,
  command,
  evidenceFor,
  foundTripped,
  isDecided,
  settledLook,
} from "@emberladder/diagnosis";
import { firstLookFor, isFaultId } from "@emberladder/furnace";
import type { FaultId } from "@emberladder/furnace";
import { useState } from "react";
import { useTranslation } from "react-i18next";
import { useSearchParams } from "react-router-dom";
import { AnswerButton } from "#components/ui/answer-button.tsx";
import { LinkButton, PrimaryButton } from "#components/ui/button.tsx";
import { TextAreaField } from "#components/ui/text-area-field.tsx";
import { makeNote } from "#lib/store/append-event.ts";
import { EvidenceList } from "../conclude/evidence-list.tsx";
import { NotFoundForm } from "../conclude/not-found-form.tsx";
import { RootCause } from "../conclude/root-cause.tsx";
import type { RootCauseGiven } from "../conclude/root-cause.tsx";
import { useDiagnosis } from "../diagnosis-context.tsx";
import { FieldLayout } from "../parts/field-layout.tsx";
import { RefusalNote } from "../parts/refusal-note.tsx";
import { UndoLine } from "../parts/undo-line.tsx";
import { useClimbLine, useUnitLine } from "../parts/use-unit-line.ts";

/**
 * The cause, with the readings that show it. The button repeats the cause. Another cause can be chosen from
 * those the record points at; where nothing was proven, the record says so and what is left to find out.
 */
export function ConcludeScreen() {
  const { t } = useTranslation();
  const { diagnosisId, state, profile, recordAndGoOn } = useDiagnosis();
  const unitLine = useUnitLine();
  const climb = useClimbLine();
  const [search] = useSearchParams();
  const [chosen, setChosen] = useState<FaultId | null>(null);
  const [mode, setMode] = useState<"cause" | "choose" | "not-found">("cause");
  const [said, setSaid] = useState("");
  const [rootCause, setRootCause] = useState<RootCauseGiven | null>(null);

  const asked = search.get("cause");
  const candidates = causeCandidates(state);
  const look = settledLook(state);
  const lookFault =
    look &&
    firstLookFor(profile)
      .find((item) => item.id === look.item)
      ?.hits.find((hit) => hit.check === look.check && hit.finding === look.finding)?.fault;
  const cause = chosen ?? (asked && isFaultId(asked) ? asked : undefined) ?? lookFault ?? candidates[0];
  const tripped = foundTripped(state);

  if (mode === "not-found" || (!cause && mode !== "choose"))
    return <NotFoundForm onBack={cause ? () => setMode("cause") : undefined} />;
  if (mode === "choose" || !cause) {
    return (
      <FieldLayout diagnosisId={diagnosisId} state={state} title={unitLine} subtitle={climb}>
        <h1 className="text-question">{t("conclude.choose")}</h1>
        <ul className="flex flex-col gap-2">
          {candidates.map((candidate) => (
            <li key={candidate}>
              <AnswerButton
                chosen={candidate === cause}
                onChoose={() => {
                  setChosen(candidate);
                  setMode("cause");
                }}
              >
                {t(`trade:faults.${candidate}.name`)}
              </AnswerButton>
            </li>
          ))}
        </ul>
        <LinkButton onClick={() => setMode("not-found")}>{t("conclude.notFound")}</LinkButton>
        <LinkButton onClick={() => setMode("cause")}>{t("conclude.back")}</LinkButton>
      </FieldLayout>
    );
  }

  const evidence = evidenceFor(state, cause);
  const decided = isDecided(state, { cause, evidence, proven: true });
  const record = () => {
    const notes = [said.trim(), rootCause?.text ?? ""].map((text) => (text ? makeNote(text) : undefined));
    const [, rootNote] = notes;
    void recordAndGoOn(
      [
        command("cause.concluded", {
          cause,
          evidence,
          proven: true,
          ...(tripped && rootCause
            ? {
                rootCause: {
                  ...(rootCause.fault ? { fault: rootCause.fault } : { soughtAllClean: true }),
                  ...(rootNote ? { noteRef: rootNote.hash } : {}),
                },
              }
            : {}),
        }),
      ],
      notes.filter((note) => note !== undefined),
    );
  };

  return (
    <FieldLayout
      diagnosisId={diagnosisId}
      state={state}
      title={unitLine}
      subtitle={climb}
      pinned={
        <PrimaryButton onClick={record} detail={decided ? undefined : t("conclude.undecided")}>
          {t("conclude.record", { cause: t(`trade:faults.${cause}.name`) })}
        </PrimaryButton>
      }
    >
      <p className="text-field text-quiet">{t("conclude.header")}</p>
      <h1 className="text-question">{t(`trade:faults.${cause}.name`)}</h1>
      <RefusalNote />
      <p className="text-field">{t(`trade:faults.${cause}.what`)}</p>
      <EvidenceList evidence={evidence} />
      {tripped && <RootCause cause={cause} given={rootCause} onChange={setRootCause} />}
      <details className="text-field">
        <summary className="flex min-h-12 cursor-pointer items-center font-semibold text-link underline underline-offset-4">
          {t("conclude.addWords")}
        </summary>
        <TextAreaField label={t("conclude.words")} text={said} onChange={setSaid} />
      </details>
      <div className="flex flex-wrap gap-x-6">
        <LinkButton onClick={() => setMode("choose")}>{t("conclude.another")}</LinkButton>
        <LinkButton onClick={() => setMode("not-found")}>{t("conclude.notFound")}</LinkButton>
      </div>
      <UndoLine />
    </FieldLayout>
  );
}
