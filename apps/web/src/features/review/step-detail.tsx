import type { DiagnosisDetail } from "@emberladder/contract";
import { useTranslation } from "react-i18next";
import type { Step } from "#components/record/steps-of.ts";
import { useStepWords } from "#components/record/use-step-words.ts";

/** One step: what was recorded, in which state of the unit, by whom, and what the screen showed then. */
export function StepDetail({
  step,
  number,
  count,
  record,
  onGo,
}: {
  step: Step;
  number: number;
  count: number;
  record: DiagnosisDetail;
  onGo: (to: number) => void;
}) {
  const { t } = useTranslation();
  const words = useStepWords();
  const { title, value } = words(step);
  const { event } = step;
  const notes = record.notes.filter((note) => JSON.stringify(event?.body ?? {}).includes(note.hash));
  const shown = event?.type === "check.answered" ? event.body.shown : undefined;
  const facts: [string, string][] = [
    [t("review.facts.time"), step.time],
    [t("review.facts.by"), step.actorName],
    ...(event?.type === "check.answered"
      ? ([
          [
            t("review.facts.unit"),
            [
              t(`unitState.short.${event.body.power}`),
              shown?.unitState?.gas === "shut" ? t("unitState.gasShut") : "",
            ]
              .filter(Boolean)
              .join(", "),
          ],
          [t("review.facts.stage"), t(`trade:stages.${event.body.stage}.name`)],
        ] as [string, string][])
      : []),
    ...(shown?.bandUsed ? ([[t("review.facts.band"), shown.bandUsed]] as [string, string][]) : []),
    ...(shown?.treeNode
      ? ([[t("review.facts.tree"), `${shown.treeNode} (${shown.versions?.tree ?? ""})`]] as [
          string,
          string,
        ][])
      : []),
    ...(shown?.versions
      ? ([[t("review.facts.catalogue"), shown.versions.catalogue]] as [string, string][])
      : []),
    ...(step.undone ? ([[t("review.facts.undone"), t("review.struck")]] as [string, string][]) : []),
    ...(step.clockOff ? ([[t("review.facts.clock"), t("review.clockOff")]] as [string, string][]) : []),
  ];
  return (
    <section className="min-w-0" aria-live="polite">
      <p className="text-field text-quiet desk:text-desk">{t("review.stepOf", { number, count })}</p>
      <h2 className={`text-question ${step.undone ? "line-through" : ""}`}>{title}</h2>
      {value && (
        <p
          className={`numeric mt-1 text-[1.75rem] leading-9 font-semibold break-words ${step.undone ? "line-through" : ""}`}
        >
          {value}
        </p>
      )}
      <dl className="mt-4 grid grid-cols-[6.5rem_1fr] gap-y-1.5 text-field desk:text-desk">
        {facts.map(([name, fact]) => (
          <div key={name} className="contents">
            <dt className="text-quiet">{name}</dt>
            <dd className="font-medium break-words">{fact}</dd>
          </div>
        ))}
      </dl>
      {notes.map((note) => (
        <blockquote
          key={note.hash}
          className="mt-3 border-l-6 border-ink bg-surface p-3 text-field desk:text-desk"
        >
          {note.text ?? t("review.erased", { reason: note.erased?.reason ?? "" })}
        </blockquote>
      ))}
      <div className="mt-5 flex gap-3">
        <button
          type="button"
          disabled={number === 1}
          onClick={() => onGo(number - 1)}
          className="min-h-12 rounded border-2 border-rule px-4 text-field font-semibold disabled:text-quiet desk:text-desk"
        >
          {t("review.backStep")}
        </button>
        <button
          type="button"
          disabled={number === count}
          onClick={() => onGo(number + 1)}
          className="min-h-12 rounded border-2 border-rule px-4 text-field font-semibold disabled:text-quiet desk:text-desk"
        >
          {t("review.nextStep")}
        </button>
      </div>
    </section>
  );
}
