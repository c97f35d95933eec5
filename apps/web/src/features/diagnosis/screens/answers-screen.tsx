import {
  breaches,
  command,
  likelyOutcome,
  ladderOf,
  openPutBacks,
  proofOf,
  doorProgress,
} from "@emberladder/diagnosis";
import type { BodyOf } from "@emberladder/diagnosis";
import { format } from "date-fns";
import { useTranslation } from "react-i18next";
import { Link } from "react-router-dom";
import { PrimaryButton } from "#components/ui/button.tsx";
import { OutcomeMark } from "#components/ui/outcome-mark.tsx";
import { paths } from "#lib/paths.ts";
import { useRuleWords } from "#lib/use-rule-words.ts";
import { useDiagnosis } from "../diagnosis-context.tsx";
import { FieldLayout } from "../parts/field-layout.tsx";
import { RefusalNote } from "../parts/refusal-note.tsx";
import { UndoLine } from "../parts/undo-line.tsx";
import { useAnswerWords } from "../parts/use-answer-words.ts";
import { useOpenedAt } from "#lib/use-now.ts";
import { useUnitLine } from "../parts/use-unit-line.ts";

/** Everything answered, one line each with Change; what still keeps it from closing; the act that closes it. */
export function AnswersScreen() {
  const { t } = useTranslation();
  const { diagnosisId, state, recordAndGoOn } = useDiagnosis();
  const unitLine = useUnitLine();
  const now = useOpenedAt();
  const { ofObservation, ofLook } = useAnswerWords();
  const ruleWords = useRuleWords();
  const outcome = likelyOutcome(state);
  const closing: BodyOf<"diagnosis.closed"> = {
    outcome,
    left: { inService: true, gas: "open", power: "on" },
  };
  const missing = breaches(state, command("diagnosis.closed", closing), { now: now });
  const rungs = ladderOf(state);
  const stopped = rungs.find((rung) => rung.state === "stopped");
  const out = openPutBacks(state);

  const rows: {
    id: string;
    what: string;
    value: string;
    change: string;
    outcome?: "good" | "marginal" | "fail";
  }[] = [
    {
      id: "door",
      what: t("answers.door"),
      value: t(doorProgress(state).complete ? "answers.doorClear" : "answers.notProvided"),
      change: paths.diagnosis.door(diagnosisId),
    },
    ...state.looks.map((look) => ({
      id: look.eventId,
      what: ofLook(look).what,
      value: ofLook(look).value,
      change: paths.diagnosis.look(diagnosisId),
    })),
    ...(stopped
      ? [
          {
            id: "watch",
            what: t("answers.watch"),
            value: t("field.stoppedAt", { number: stopped.number, count: rungs.length }),
            change: paths.diagnosis.watch(diagnosisId),
          },
        ]
      : []),
    ...state.observations.map((one) => ({
      id: one.eventId,
      what: ofObservation(one).what,
      value: ofObservation(one).value,
      outcome: one.outcome,
      change: paths.diagnosis.changeCheck(diagnosisId, one.check),
    })),
    ...(state.conclusion
      ? [
          {
            id: state.conclusion.eventId,
            what: t("answers.cause"),
            value: t([`trade:faults.${state.conclusion.cause}.name`, "answers.notProven"]),
            change: paths.diagnosis.conclude(diagnosisId),
          },
        ]
      : []),
    ...state.repairs.map((repair) => ({
      id: repair.eventId,
      what: t("answers.repair"),
      value: repair.done.map((id) => t(`trade:repairs.${id}`)).join(", "),
      change: paths.diagnosis.repair(diagnosisId),
    })),
    {
      id: "put-back",
      what: t("answers.putBack"),
      value: out.length === 0 ? t("answers.allBack") : t("answers.stillOut", { count: out.length }),
      change: paths.diagnosis.putBack(diagnosisId),
    },
    ...proofOf(state, outcome, now).map((item) => ({
      id: item.id,
      what: t(`trade:closing.${item.id}.title`),
      value: item.verdict.pass ? t("answers.passed") : t("answers.notProvided"),
      change: paths.diagnosis.proof(diagnosisId),
    })),
  ];

  return (
    <FieldLayout diagnosisId={diagnosisId} state={state} title={t("answers.header")} subtitle={unitLine}>
      <h1 className="text-question">{t("answers.title")}</h1>
      <RefusalNote />
      <dl className="flex flex-col divide-y-1 divide-hair border-y-1 border-hair text-field">
        {rows.map((row) => (
          <div
            key={row.id}
            className="grid grid-cols-[minmax(0,1fr)_auto] large-letters:grid-cols-1 items-start gap-x-3 py-2"
          >
            <dt className="font-semibold">{row.what}</dt>
            <dd className="flex items-center gap-2 text-quiet">
              {row.outcome && <OutcomeMark outcome={row.outcome} />}
              {row.value}
            </dd>
            <dd className="col-start-2 row-span-2 row-start-1 large-letters:col-start-1 large-letters:row-start-auto">
              <Link
                to={row.change}
                className="flex min-h-12 min-w-12 items-center justify-end large-letters:justify-start"
              >
                {t("answers.change")}
                <span className="sr-only">{` ${row.what}`}</span>
              </Link>
            </dd>
          </div>
        ))}
      </dl>
      <p className="text-field text-quiet">
        {state.opened && t("answers.opened", { time: format(state.opened.at, "HH:mm") })}
      </p>
      {missing.length > 0 && (
        <section aria-label={t("answers.missing")} className="border-l-6 border-ink bg-surface p-3">
          <h2 className="text-field font-semibold">
            {t("answers.missingFor", { outcome: t(`outcomes.${outcome}`) })}
          </h2>
          <ul className="mt-1 flex list-disc flex-col gap-1 pl-5 text-field">
            {missing.map((breach) => (
              <li key={breach.rule + JSON.stringify(breach.params)}>{ruleWords(breach)}</li>
            ))}
          </ul>
        </section>
      )}
      {missing.length === 0 && (
        <PrimaryButton onClick={() => void recordAndGoOn([command("diagnosis.closed", closing)])}>
          {t(`answers.close.${outcome}`)}
        </PrimaryButton>
      )}
      <Link
        to={paths.diagnosis.close(diagnosisId)}
        className="flex min-h-12 items-center text-field font-semibold"
      >
        {t("answers.otherWay")}
      </Link>
      <UndoLine />
    </FieldLayout>
  );
}
