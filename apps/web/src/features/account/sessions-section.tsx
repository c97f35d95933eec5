import { endOtherSessions, endSession, listSessions } from "@emberladder/contract";
import { useQuery, useQueryClient } from "@tanstack/react-query";
import { useTranslation } from "react-i18next";
import { ActProblem } from "#components/ui/act-problem.tsx";
import { ActButton } from "#components/ui/act.tsx";
import { LoadingNote, ProblemNote } from "#components/ui/list-states.tsx";
import { Section } from "#components/ui/page-head.tsx";
import { callApi } from "#lib/api-client.ts";
import { useMe } from "#lib/session.tsx";
import { formatMoment } from "#lib/site-time.ts";
import { useAct } from "#lib/use-act.ts";

/** Where the person is signed in, and the way to end it there. */
export function SessionsSection() {
  const { t } = useTranslation();
  const { company } = useMe();
  const client = useQueryClient();
  const act = useAct();
  const sessions = useQuery({
    queryKey: ["sessions"],
    queryFn: ({ signal }) => callApi(listSessions, { signal }),
  });
  const end = (change: () => Promise<unknown>) =>
    act.run(async () => {
      await change();
      await client.invalidateQueries({ queryKey: ["sessions"] });
    });
  const others = sessions.data?.items.filter((session) => !session.isThis) ?? [];
  return (
    <Section title={t("desk:sessions.title")}>
      {sessions.isPending && <LoadingNote />}
      {sessions.isError && <ProblemNote problem={sessions.error} onRetry={() => void sessions.refetch()} />}
      <ActProblem problem={act.problem} />
      <ul className="mb-3 max-w-180">
        {sessions.data?.items.map((session) => (
          <li
            key={session.id}
            className="flex flex-wrap items-center justify-between gap-3 border-b border-hair py-2"
          >
            <span className="text-field desk:text-desk">
              <span className={session.isThis ? "font-semibold" : ""}>
                {session.deviceName ?? t("desk:sessions.noDevice")}
              </span>
              <span className="block text-quiet">
                {session.isThis
                  ? t("desk:sessions.this")
                  : t("desk:sessions.lastUsed", { at: formatMoment(session.lastUsedAt, company.timeZone) })}
              </span>
            </span>
            {!session.isThis && (
              <ActButton
                aria-label={t("desk:sessions.endOf", {
                  name: session.deviceName ?? t("desk:sessions.noDevice"),
                })}
                onClick={() => end(() => callApi(endSession, { params: { sessionId: session.id } }))}
              >
                {t("desk:sessions.end")}
              </ActButton>
            )}
          </li>
        ))}
      </ul>
      {others.length > 0 && (
        <ActButton onClick={() => end(() => callApi(endOtherSessions))}>
          {t("desk:sessions.endOthers")}
        </ActButton>
      )}
    </Section>
  );
}
