import { command, stageForCheck, stoppedStageOf, treePosition } from "@emberladder/diagnosis";
import { CANNOT_REASONS, DEPARTURE_REASONS, checkCost, checksFor, STAGES } from "@emberladder/furnace";
import type { CheckId, DepartureReason } from "@emberladder/furnace";
import { isAsking } from "@emberladder/trees";
import { useState } from "react";
import { useTranslation } from "react-i18next";
import { Link, useNavigate } from "react-router-dom";
import { AnswerButton } from "#components/ui/answer-button.tsx";
import { LinkButton, PlainButton, PrimaryButton } from "#components/ui/button.tsx";
import { TextAreaField } from "#components/ui/text-area-field.tsx";
import { paths } from "#lib/paths.ts";
import { makeNote } from "#lib/store/append-event.ts";
import { useDiagnosis } from "../diagnosis-context.tsx";
import { FieldLayout } from "../parts/field-layout.tsx";
import { RefusalNote } from "../parts/refusal-note.tsx";
import { useClimbLine, useUnitLine } from "../parts/use-unit-line.ts";

/**
 * Checks beside the tree: all that fit the unit, those of the stopped rung first, the cheaper first. Leaving
 * the tree is one tap from the list of reasons; the way back to it stays open.
 */
export function ChecksScreen() {
  const { t } = useTranslation();
  const navigate = useNavigate();
  const { diagnosisId, state, profile, tree, record, recordAndGoOn } = useDiagnosis();
  const unitLine = useUnitLine();
  const climb = useClimbLine();
  const [chosen, setChosen] = useState<CheckId | null>(null);
  const [other, setOther] = useState<string | null>(null);
  const [shown, setShown] = useState(12);
  const position = tree ? treePosition(tree, state) : null;
  const backTo = position?.leftAt ?? position?.node ?? null;
  const stage = stoppedStageOf(state);
  const stageDistance = (check: CheckId) => {
    const own = stageForCheck(check);
    const place = STAGES.findIndex((candidate) => candidate === own);
    return stage && place >= 0 ? Math.abs(place - STAGES.indexOf(stage)) : 6;
  };
  const checks = checksFor(profile)
    .map((check) => ({
      id: check.id,
      minutes: checkCost(check.id, { codes: profile.codes, ratedVolts: profile.plate.ratedVolts }),
      distance: stageDistance(check.id),
    }))
    .toSorted((a, b) => a.distance - b.distance || a.minutes - b.minutes);

  const open = async (check: CheckId) => {
    await navigate(paths.diagnosis.check(diagnosisId, check));
  };
  const leave = async (reason: DepartureReason, text?: string) => {
    if (!chosen) return;
    const note = text ? makeNote(text) : undefined;
    const node = position?.node;
    const left = await record(
      [
        command("tree.left", {
          reason,
          toCheck: chosen,
          ...(node ? { treeNode: node.id } : {}),
          ...(note ? { noteRef: note.hash } : {}),
        }),
      ],
      note ? [note] : [],
    );
    if (left) await open(chosen);
  };
  const onTree = position?.node && isAsking(position.node);

  if (chosen && onTree) {
    return (
      <FieldLayout diagnosisId={diagnosisId} state={state} title={unitLine} subtitle={climb}>
        <h1 className="text-question">{t("leave.title")}</h1>
        <RefusalNote />
        {DEPARTURE_REASONS.filter(
          (reason) => reason !== "other" && !(CANNOT_REASONS.includes(reason) && reason === "not-fitted"),
        ).map((reason) => (
          <AnswerButton key={reason} onChoose={() => void leave(reason)}>
            {t(`trade:departures.${reason}`)}
          </AnswerButton>
        ))}
        {other === null ? (
          <AnswerButton onChoose={() => setOther("")}>{t("trade:departures.other")}</AnswerButton>
        ) : (
          <>
            <TextAreaField label={t("cannot.otherLabel")} text={other} onChange={setOther} />
            <PrimaryButton disabled={other.trim() === ""} onClick={() => void leave("other", other.trim())}>
              {t("leave.record")}
            </PrimaryButton>
          </>
        )}
        <LinkButton onClick={() => setChosen(null)}>{t("leave.stay")}</LinkButton>
      </FieldLayout>
    );
  }

  return (
    <FieldLayout
      diagnosisId={diagnosisId}
      state={state}
      title={unitLine}
      subtitle={climb}
      notch={stage ?? undefined}
    >
      <h1 className="text-question">{t("checks.title")}</h1>
      <RefusalNote />
      {backTo && (
        <PrimaryButton onClick={() => void recordAndGoOn([command("tree.entered", { treeNode: backTo.id })])}>
          {t("checks.backToTree")}
        </PrimaryButton>
      )}
      <ul className="flex flex-col gap-2">
        {checks.slice(0, shown).map(({ id, minutes }) => (
          <li key={id}>
            <AnswerButton
              aside={t("checks.minutes", { count: minutes })}
              onChoose={() => (onTree ? setChosen(id) : void open(id))}
            >
              {t(`trade:checks.${id}.title`)}
            </AnswerButton>
          </li>
        ))}
      </ul>
      {shown < checks.length && (
        <PlainButton onClick={() => setShown(checks.length)}>
          {t("checks.all", { count: checks.length })}
        </PlainButton>
      )}
      <Link
        to={paths.diagnosis.conclude(diagnosisId)}
        className="flex min-h-12 items-center text-field font-semibold"
      >
        {t("checks.conclude")}
      </Link>
      <Link
        to={paths.diagnosis.answers(diagnosisId)}
        className="flex min-h-12 items-center text-field font-semibold"
      >
        {t("check.finishWithout")}
      </Link>
    </FieldLayout>
  );
}
