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
  return (
    <form
      role="search"
      aria-label={t("desk:calls.filter")}
      className="flex flex-wrap gap-3 border-b border-hair px-4 py-3 desk:px-6"
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
  );
}
