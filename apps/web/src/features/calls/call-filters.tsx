import { useState } from "react";
import { useTranslation } from "react-i18next";
import { useSearchParams } from "react-router-dom";
import { CALL_STATUSES } from "./calls-query.ts";
import type { CallFilter } from "./calls-query.ts";

const control =
  "min-h-12 min-w-0 grow rounded border-2 border-rule bg-surface px-3 text-field text-ink desk:min-h-11 desk:grow-0 desk:text-desk";

/** Whose calls, which day, which state. Each choice goes into the address, so that it can be kept and sent. */
export function CallFilters({ filter }: { filter: CallFilter }) {
  const { t } = useTranslation();
  const [, setSearch] = useSearchParams();
  const choose = (name: string, value: string) =>
    setSearch(
      (search) => {
        const next = new URLSearchParams(search);
        if (value) next.set(name, value);
        else next.delete(name);
        next.delete("page");
        return next;
      },
      { replace: true },
    );
  const [isOpen, setOpen] = useState(false);
  const summary = [
    t(`desk:calls.scopes.${filter.scope}`),
    filter.status && t(`desk:callStatus.${filter.status}`),
    filter.date ?? t("desk:calls.fromToday"),
  ]
    .filter(Boolean)
    .join(", ");
  return (
    <div className="border-b border-hair">
      {/* On a phone the calls come first: the choices fold into one line that says what is chosen. */}
      <button
        type="button"
        aria-expanded={isOpen}
        aria-controls="call-filters"
        onClick={() => setOpen(!isOpen)}
        className="focus-inside flex min-h-12 w-full items-center gap-3 px-4 text-left text-label text-quiet desk:hidden"
      >
        <svg
          viewBox="0 0 16 16"
          width={14}
          height={14}
          aria-hidden="true"
          className={`shrink-0 ${isOpen ? "rotate-90" : ""}`}
        >
          <path d="M4 1l8 7-8 7z" fill="var(--ink)" />
        </svg>
        {summary}
      </button>
      <form
        id="call-filters"
        role="search"
        aria-label={t("desk:calls.filter")}
        className={`${isOpen ? "flex" : "hidden"} flex-wrap gap-3 px-4 pb-3 desk:flex desk:px-6 desk:py-3`}
        onSubmit={(event) => event.preventDefault()}
      >
        <select
          aria-label={t("desk:calls.scope")}
          className={control}
          value={filter.scope}
          onChange={(event) => choose("scope", event.target.value === "all" ? "all" : "")}
        >
          <option value="mine">{t("desk:calls.scopes.mine")}</option>
          <option value="all">{t("desk:calls.scopes.all")}</option>
        </select>
        <select
          aria-label={t("desk:calls.status")}
          className={control}
          value={filter.status ?? ""}
          onChange={(event) => choose("status", event.target.value)}
        >
          <option value="">{t("desk:calls.anyStatus")}</option>
          {CALL_STATUSES.map((status) => (
            <option key={status} value={status}>
              {t(`desk:callStatus.${status}`)}
            </option>
          ))}
        </select>
        <label className="flex min-w-0 grow items-center gap-2 text-field desk:grow-0 desk:text-desk">
          <span className="shrink-0">{t("desk:calls.day")}</span>
          <input
            type="date"
            className={control}
            value={filter.date ?? ""}
            onChange={(event) => choose("date", event.target.value)}
          />
        </label>
      </form>
    </div>
  );
}
