import { readCall } from "@emberladder/contract";
import type { CallDetail } from "@emberladder/contract";
import { useEffect } from "react";
import { useTranslation } from "react-i18next";
import { Link, useNavigate, useParams } from "react-router-dom";
import { ActProblem } from "#components/ui/act-problem.tsx";
import { PrimaryButton } from "#components/ui/button.tsx";
import { CallDock } from "#components/ui/call-dock.tsx";
import { KeptNote, LoadingNote, ProblemNote } from "#components/ui/list-states.tsx";
import { PageHead, Section } from "#components/ui/page-head.tsx";
import { ShutOffLabel } from "#components/ui/shut-off-label.tsx";
import { UnitSummaryFacts } from "#components/units/unit-summary-facts.tsx";
import { callApi } from "#lib/api-client.ts";
import { useKeptQuery } from "#lib/kept-query.ts";
import { paths } from "#lib/paths.ts";
import { useMe, useSession } from "#lib/session.tsx";
import { formatDay, formatLongDay, formatMoment, formatTime, zoneName } from "#lib/site-time.ts";
import { useAct } from "#lib/use-act.ts";
import { useRecordPath } from "#lib/use-record-path.ts";
import { useTradeWords } from "#lib/use-trade-words.ts";
import { AssignCall } from "./assign-call.tsx";
import { CancelCall } from "./cancel-call.tsx";

/** One call: everything that must be seen before the door, and the one act that starts or goes on. */
export function CallScreen() {
  const { callId = "" } = useParams();
  const call = useKeptQuery(`call:${callId}`, (signal) => callApi(readCall, { params: { callId }, signal }));
  const me = useMe();
  if (call.isPending) return <LoadingNote />;
  if (call.isError) return <ProblemNote problem={call.error} onRetry={() => void call.refetch()} />;
  const { value, keptAt } = call.data;
  return (
    <>
      {keptAt !== undefined && <KeptNote at={formatMoment(keptAt, me.company.timeZone)} />}
      <CallPage call={value} isKept={keptAt !== undefined} />
      <CallDock />
    </>
  );
}

function CallPage({ call, isKept }: { call: CallDetail; isKept: boolean }) {
  const { t } = useTranslation();
  const { can } = useSession();
  const hasTradeWords = useTradeWords();
  const recordPath = useRecordPath();
  const { site, unit, timeZone, scheduledFor } = call;
  const isRoof = unit.profile.codes.location === "RTU";
  return (
    <>
      <PageHead
        back={{ to: paths.calls, label: t("desk:call.back") }}
        title={t("desk:call.title", { number: call.number, name: call.customerFirstName })}
        line={
          <>
            <p>
              {site.address}, {site.town}
            </p>
            <p>
              {formatLongDay(scheduledFor, timeZone)},{" "}
              <span className="numeric">{formatTime(scheduledFor, timeZone)}</span>{" "}
              {zoneName(scheduledFor, timeZone)}
            </p>
          </>
        }
      />
      <div className="grow desk:grid desk:grid-cols-[minmax(0,1fr)_minmax(0,1fr)]">
        <div className="desk:border-r-2 desk:border-ink">
          <section className="flex flex-col gap-3 px-4 py-4 desk:px-6">
            {call.openShutOff && (
              <div>
                <ShutOffLabel record={call.openShutOff} timeZone={timeZone} />
                <Link
                  to={recordPath(call.openShutOff.diagnosisId)}
                  className="inline-flex min-h-12 items-center text-field font-medium desk:text-desk"
                >
                  {t("desk:shutOff.read")}
                </Link>
              </div>
            )}
            <p className="text-[1.25rem] leading-7 font-medium">
              {t("desk:calls.quote", { complaint: call.complaint })}
            </p>
            <p className="text-field desk:text-desk">{unit.name}</p>
            {(site.accessNote || isRoof) && (
              <p className="border-l-4 border-ink pl-3 text-field font-semibold desk:text-desk">
                {site.accessNote ?? t("desk:calls.roof")}
              </p>
            )}
            <p className="text-field text-quiet desk:text-desk">
              {t(`desk:callStatus.${call.status}`)}.{" "}
              {call.assignedTo
                ? t("desk:call.assignedTo", { name: call.assignedTo.name })
                : t("desk:call.nobody")}
            </p>
            <StartAct call={call} />
          </section>
          {!isKept &&
            (can("call:assign") || can("call:cancel")) &&
            (call.status === "open" || call.status === "under-way") && (
              <Section title={t("desk:call.office")}>
                <div className="flex flex-col gap-4">
                  {can("call:assign") && <AssignCall call={call} />}
                  {can("call:cancel") && call.status === "open" && <CancelCall call={call} />}
                </div>
              </Section>
            )}
        </div>
        <div>
          <Section
            title={unit.name}
            acts={
              <Link
                to={paths.unit(unit.id)}
                className="inline-flex min-h-12 items-center text-field font-medium desk:text-desk"
              >
                {t("desk:call.unit")}
              </Link>
            }
          >
            {hasTradeWords && <UnitSummaryFacts profile={unit.profile} />}
          </Section>
          <Section title={t("desk:call.history")}>
            {call.diagnoses.length === 0 ? (
              <p className="text-field text-quiet desk:text-desk">{t("desk:call.noHistory")}</p>
            ) : (
              <ul>
                {call.diagnoses.map((diagnosis) => (
                  <li key={diagnosis.id} className="border-b border-hair last:border-b-0">
                    <Link
                      to={recordPath(diagnosis.id)}
                      className="flex min-h-12 flex-wrap items-center gap-x-3 text-field desk:text-desk"
                    >
                      <span className="numeric">{formatDay(diagnosis.openedAt, timeZone)}</span>
                      <span>{diagnosis.technician.name}</span>
                      <span>
                        {diagnosis.outcome
                          ? t(`desk:outcomes.${diagnosis.outcome}`)
                          : t("desk:outcomes.open")}
                      </span>
                    </Link>
                  </li>
                ))}
              </ul>
            )}
          </Section>
        </div>
      </div>
    </>
  );
}

/** The one solid act of the screen: start a diagnosis at the door, or go on with the one under way. */
function StartAct({ call }: { call: CallDetail }) {
  const { t } = useTranslation();
  const me = useMe();
  const navigate = useNavigate();
  const act = useAct();
  const { openDiagnosisId } = call;
  useEffect(() => {
    // Fetched before the tap, so that the tap also works where the signal has gone by then.
    void import("#lib/start-diagnosis.ts")
      .then(({ prepareDiagnosis }) => prepareDiagnosis(call))
      .catch(() => undefined);
  }, [call]);
  if (openDiagnosisId) {
    return (
      <PrimaryButton onClick={() => void navigate(paths.diagnosis.next(openDiagnosisId))}>
        {t("desk:call.goOn")}
      </PrimaryButton>
    );
  }
  if (call.status !== "open" && call.status !== "under-way") return null;
  const start = async () => {
    const { startDiagnosis } = await import("#lib/start-diagnosis.ts");
    await navigate(paths.diagnosis.next(await startDiagnosis({ call, personId: me.person.id })));
  };
  return (
    <>
      <PrimaryButton aria-disabled={act.isBusy || undefined} onClick={() => act.run(start)}>
        {t("desk:call.start")}
      </PrimaryButton>
      <ActProblem problem={act.problem} />
    </>
  );
}
