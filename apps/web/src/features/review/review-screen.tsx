import { readDiagnosis } from "@emberladder/contract";
import type { DiagnosisDetail } from "@emberladder/contract";
import { fold, ladderOf } from "@emberladder/diagnosis";
import { useQuery } from "@tanstack/react-query";
import { format } from "date-fns";
import { useMemo } from "react";
import { useTranslation } from "react-i18next";
import { Link, useParams, useSearchParams } from "react-router-dom";
import { callApi } from "#lib/api-client.ts";
import { paths } from "#lib/paths.ts";
import { FlagList } from "./flag-list.tsx";
import { LadderDesk } from "./ladder-desk.tsx";
import { StepDetail } from "./step-detail.tsx";
import { StepList } from "#components/record/step-list.tsx";
import { TimeLine } from "./time-line.tsx";
import { stepsOf } from "#components/record/steps-of.ts";

/**
 * How a diagnosis was reached, step by step: the time line, the ladder as it stood, what was recorded and what
 * the screen showed, flags, and whether the record is as it was received. Read-only.
 */
export function ReviewScreen() {
  const { diagnosisId = "" } = useParams();
  const { t } = useTranslation();
  const { data, isPending, error } = useQuery({
    queryKey: ["diagnosis", diagnosisId],
    queryFn: ({ signal }) => callApi(readDiagnosis, { params: { diagnosisId }, signal }),
  });
  if (isPending) return <p className="p-6 text-field">{t("review.loading")}</p>;
  if (error || !data) {
    return (
      <div className="flex flex-col gap-3 p-6 text-field">
        <p className="border-l-6 border-ink bg-surface p-3">{t("review.unreachable")}</p>
        <Link to={paths.review}>{t("review.back")}</Link>
      </div>
    );
  }
  return <Review record={data} />;
}

function Review({ record }: { record: DiagnosisDetail }) {
  const { t } = useTranslation();
  const [search, setSearch] = useSearchParams();
  const steps = useMemo(() => stepsOf(record), [record]);
  const asked = Number(search.get("step") ?? steps.length);
  const at = Math.min(Math.max(1, Number.isFinite(asked) ? Math.round(asked) : steps.length), steps.length);
  const step = steps[at - 1];
  const state = useMemo(() => fold(record.events.slice(0, at)), [record, at]);
  const whole = useMemo(() => fold(record.events), [record]);
  const go = (to: number) =>
    setSearch(
      { step: String(Math.min(Math.max(1, to), steps.length)) },
      {
        replace: true,
        // At once, so that a held arrow key does not fall on the step before.
        flushSync: true,
      },
    );
  if (!step) return null;
  const { verification } = record;
  return (
    <div className="flex grow flex-col">
      <header className="border-b-1 border-hair bg-surface px-4 py-3 desk:px-6">
        <p className="text-desk">
          <Link to={paths.review}>{t("review.back")}</Link>
        </p>
        <h1 className="mt-1 text-question">
          {t("review.row", { number: record.callNumber, unit: record.unitName })}
        </h1>
        <p className="text-field text-quiet desk:text-desk">
          {t("review.headline", {
            name: record.technician.name,
            date: format(new Date(record.openedAt), "d MMM yyyy"),
            outcome: record.outcome ? t(`outcomes.${record.outcome}`) : t("review.open"),
          })}{" "}
          <strong className="font-semibold text-ink">
            {verification.intact
              ? t("review.intact", { count: record.events.length })
              : t("review.altered", {
                  count: verification.breaks.length,
                  place: verification.breaks[0]?.serverSeq ?? 0,
                })}
          </strong>
          {record.isDemo && ` ${t("review.inventedLong")}`}
        </p>
      </header>
      <TimeLine steps={steps} state={whole} at={at} onGo={go} />
      <div className="grid grow gap-6 p-4 desk:grid-cols-[344px_1fr_300px] desk:p-6">
        <section aria-label={t("review.ladderAt", { time: step.time })} className="min-w-0">
          <h2 className="mb-2 text-field font-semibold desk:text-desk">
            {t("review.ladderAt", { time: step.time })}
          </h2>
          <LadderDesk rungs={ladderOf(state)} />
        </section>
        <StepDetail step={step} number={at} count={steps.length} record={record} onGo={go} />
        <aside className="flex min-w-0 flex-col gap-6">
          <FlagList record={record} steps={steps} onGo={go} />
          <StepList steps={steps} at={at} onGo={go} />
        </aside>
      </div>
    </div>
  );
}
