import type { Call } from "@emberladder/contract";
import { useEffect } from "react";
import { useTranslation } from "react-i18next";
import { useSearchParams } from "react-router-dom";
import { ActLink } from "#components/ui/act.tsx";
import { CallDock } from "#components/ui/call-dock.tsx";
import { EmptyNote, KeptNote, LoadingNote, ProblemNote } from "#components/ui/list-states.tsx";
import { Pager } from "#components/ui/pager.tsx";
import { PageHead } from "#components/ui/page-head.tsx";
import { groupBy } from "#lib/group-by.ts";
import { useKeptQuery } from "#lib/kept-query.ts";
import { paths } from "#lib/paths.ts";
import { useMe, useSession } from "#lib/session.tsx";
import { dayOf, formatLongDay, formatMoment, formatTime } from "#lib/site-time.ts";
import { useNow } from "#lib/use-now.ts";
import { CallFilters } from "./call-filters.tsx";
import { CallRow } from "./call-row.tsx";
import { fetchCalls, isPlain, keepCalls, readCallFilter } from "./calls-query.ts";

/** Today's and later calls, phone first: what is next on top, an open shut-off record never overlooked. */
export function CallsScreen() {
  const { t } = useTranslation();
  const me = useMe();
  const now = useNow(true, 60_000);
  const { can } = useSession();
  const [search] = useSearchParams();
  const filter = readCallFilter(search);
  const { timeZone } = me.company;
  const today = dayOf(now, timeZone);
  const calls = useKeptQuery(
    `calls:${me.person.id}:${JSON.stringify(filter)}:${today}`,
    (signal) => fetchCalls(filter, today, signal),
    { refetchInterval: 60_000 },
  );
  const fresh = calls.data?.keptAt === undefined ? calls.data?.value : undefined;
  const isOwnDay = filter.scope === "mine" && isPlain(filter);
  useEffect(() => {
    if (fresh && isOwnDay) void keepCalls([...fresh.leftOver, ...fresh.page.items]);
  }, [fresh, isOwnDay]);

  return (
    <>
      <PageHead
        title={filter.date ? formatLongDay(`${filter.date}T12:00:00Z`, "UTC") : formatLongDay(now, timeZone)}
        line={
          calls.data &&
          t("desk:calls.count", { count: calls.data.value.page.total + calls.data.value.leftOver.length })
        }
        acts={can("call:create") && <ActLink to={paths.newCall}>{t("desk:calls.new")}</ActLink>}
      />
      <CallFilters filter={filter} />
      {calls.data?.keptAt !== undefined && <KeptNote at={formatMoment(calls.data.keptAt, timeZone)} />}
      <div className="grow">
        {calls.isPending && <LoadingNote />}
        {calls.isError && <ProblemNote problem={calls.error} onRetry={() => void calls.refetch()} />}
        {calls.data && calls.data.value.page.items.length + calls.data.value.leftOver.length === 0 && (
          <EmptyNote
            title={t(isPlain(filter) ? "desk:calls.none" : "desk:calls.noneFound")}
            note={
              <>
                <p>{t(isPlain(filter) ? "desk:calls.noneNote" : "desk:calls.noneFoundNote")}</p>
                <p>{t("desk:calls.lastLooked", { time: formatTime(calls.dataUpdatedAt, timeZone) })}</p>
              </>
            }
          />
        )}
        {calls.data && (
          <CallDays today={today} leftOver={calls.data.value.leftOver} items={calls.data.value.page.items} />
        )}
        {calls.data && (
          <Pager
            page={calls.data.value.page.page}
            pageSize={calls.data.value.page.pageSize}
            total={calls.data.value.page.total}
          />
        )}
      </div>
      <CallDock />
    </>
  );
}

/** The calls under the days they are for; the first one not yet done stands out as the next. */
function CallDays({
  today,
  leftOver,
  items,
}: {
  today: string;
  leftOver: readonly Call[];
  items: readonly Call[];
}) {
  const { t } = useTranslation();
  const me = useMe();
  const next = [...leftOver, ...items].find(
    (call) => (call.status === "open" || call.status === "under-way") && call.assignedTo?.id === me.person.id,
  );
  const days = groupBy(items, (call) => dayOf(call.scheduledFor, call.timeZone));
  return (
    <>
      {leftOver.length > 0 && (
        <section aria-labelledby="left-over">
          <h2
            id="left-over"
            className="border-b border-hair bg-sunk px-4 py-2 text-field font-semibold desk:px-6 desk:text-desk"
          >
            {t("desk:calls.leftOver")}
          </h2>
          <ul>
            {leftOver.map((call) => (
              <CallRow key={call.id} call={call} showsDay isNext={call === next} />
            ))}
          </ul>
        </section>
      )}
      {[...days].map(([day, calls]) => (
        <section key={day} aria-labelledby={`day-${day}`}>
          <h2
            id={`day-${day}`}
            className={
              day === today && leftOver.length === 0
                ? "sr-only"
                : "border-b border-hair bg-sunk px-4 py-2 text-field font-semibold desk:px-6 desk:text-desk"
            }
          >
            {day === today ? t("desk:calls.today") : formatLongDay(`${day}T12:00:00Z`, "UTC")}
          </h2>
          <ul>
            {calls.map((call) => (
              <CallRow key={call.id} call={call} isNext={call === next} />
            ))}
          </ul>
        </section>
      ))}
    </>
  );
}
