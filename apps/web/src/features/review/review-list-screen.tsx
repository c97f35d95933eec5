import { listDiagnoses } from "@emberladder/contract";
import type { DiagnosisSummary } from "@emberladder/contract";
import { useQuery } from "@tanstack/react-query";
import { useTranslation } from "react-i18next";
import { Link, useSearchParams } from "react-router-dom";
import { ColdLadderDrawing } from "#components/ladder/drawings.tsx";
import { callApi } from "#lib/api-client.ts";
import { paths } from "#lib/paths.ts";
import { useMe } from "#lib/session.tsx";
import { formatMoment } from "#lib/site-time.ts";

const FILTERS = ["all", "flagged", "open", "closed"] as const;
type Filter = (typeof FILTERS)[number];

function queryOf(filter: Filter, page: number) {
  return {
    page,
    pageSize: 25,
    ...(filter === "flagged" ? { flagged: "yes" as const } : {}),
    ...(filter === "open" || filter === "closed" ? { status: filter } : {}),
  };
}

/** Diagnoses to read, newest first. The filter and the page live in the address. */
export function ReviewListScreen() {
  const { t } = useTranslation();
  const [search, setSearch] = useSearchParams();
  const filter = FILTERS.find((one) => one === search.get("show")) ?? "all";
  const page = Math.max(1, Number(search.get("page") ?? "1") || 1);
  const { data, isPending, error } = useQuery({
    queryKey: ["diagnoses", filter, page],
    queryFn: ({ signal }) => callApi(listDiagnoses, { query: queryOf(filter, page), signal }),
  });
  const go = (change: Record<string, string>) => setSearch({ ...Object.fromEntries(search), ...change });
  return (
    <div className="mx-auto w-full max-w-[1100px] p-4 desk:p-6">
      <h1 className="text-question">{t("review.title")}</h1>
      <p className="text-field text-quiet desk:text-desk">
        {data ? t("review.count", { count: data.total }) : ""}
      </p>
      <div className="mt-3 flex flex-wrap gap-2" role="group" aria-label={t("review.show")}>
        {FILTERS.map((one) => (
          <button
            key={one}
            type="button"
            aria-pressed={one === filter}
            onClick={() => go({ show: one, page: "1" })}
            className={`min-h-12 rounded px-4 text-field font-medium desk:text-desk ${one === filter ? "border-4 border-ink" : "border-2 border-rule"}`}
          >
            {t(`review.filters.${one}`)}
          </button>
        ))}
      </div>
      {isPending && <p className="mt-6 text-field">{t("review.loading")}</p>}
      {error && (
        <p className="mt-6 border-l-6 border-ink bg-surface p-3 text-field">{t("review.unreachable")}</p>
      )}
      {data?.items.length === 0 && (
        <div className="mt-8 flex flex-col gap-4">
          <ColdLadderDrawing />
          <p className="text-field">{t("review.none")}</p>
        </div>
      )}
      <ul className="mt-4 flex flex-col divide-y-1 divide-hair border-y-1 border-hair">
        {data?.items.map((item) => (
          <ReviewRow key={item.id} item={item} />
        ))}
      </ul>
      {data && data.total > data.pageSize && (
        <nav className="mt-4 flex gap-3" aria-label={t("review.pages")}>
          <button
            type="button"
            disabled={page === 1}
            onClick={() => go({ page: String(page - 1) })}
            className="min-h-12 rounded border-2 border-rule px-4 text-field disabled:text-quiet desk:text-desk"
          >
            {t("review.newer")}
          </button>
          <button
            type="button"
            disabled={page * data.pageSize >= data.total}
            onClick={() => go({ page: String(page + 1) })}
            className="min-h-12 rounded border-2 border-rule px-4 text-field disabled:text-quiet desk:text-desk"
          >
            {t("review.older")}
          </button>
        </nav>
      )}
    </div>
  );
}

function ReviewRow({ item }: { item: DiagnosisSummary }) {
  const { t } = useTranslation();
  const { timeZone } = useMe().company;
  const outcome = item.outcome ? t(`outcomes.${item.outcome}`) : t("review.open");
  return (
    <li>
      <Link
        to={paths.reviewOf(item.id)}
        className="grid gap-x-6 py-3 text-ink no-underline hover:underline desk:grid-cols-[1fr_auto]"
      >
        <span className="text-field font-semibold desk:text-desk">
          {t("review.row", { number: item.callNumber, unit: item.unitName })}
          {item.isDemo && <span className="ml-2 font-normal text-quiet">{t("review.invented")}</span>}
        </span>
        <span className="numeric text-label text-quiet desk:text-small">
          {formatMoment(item.openedAt, timeZone)}
        </span>
        <span className="text-field text-quiet desk:text-desk">
          {t("review.who", { name: item.technician.name, outcome })}
          {item.lastStage
            ? `, ${t("review.lastStage", { stage: t(`trade:stages.${item.lastStage}.name`) })}`
            : ""}
        </span>
        {item.flags > 0 && (
          <span className="text-field font-semibold desk:text-desk">
            {t("review.flags", { count: item.flags })}
          </span>
        )}
      </Link>
    </li>
  );
}
