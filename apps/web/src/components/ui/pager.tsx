import { useTranslation } from "react-i18next";
import { Link, useSearchParams } from "react-router-dom";

const link = "inline-flex min-h-12 items-center px-2 text-field font-semibold desk:text-desk";

/** Pages of a list, by the address; nothing where all fits on one. */
export function Pager({
  page,
  pageSize,
  total,
  name = "page",
}: {
  page: number;
  pageSize: number;
  total: number;
  name?: string;
}) {
  const { t } = useTranslation();
  const [search] = useSearchParams();
  const pages = Math.ceil(total / pageSize);
  if (pages <= 1) return null;
  const to = (number: number) => {
    const next = new URLSearchParams(search);
    next.set(name, String(number));
    return `?${next.toString()}`;
  };
  return (
    <nav aria-label={t("desk:pager.label")} className="flex flex-wrap items-center gap-4 px-4 py-3 desk:px-6">
      {page > 1 && (
        <Link className={link} to={to(page - 1)}>
          {t("desk:pager.before")}
        </Link>
      )}
      <span className="text-field text-quiet desk:text-desk">
        {t("desk:pager.page", { page, pages, count: total })}
      </span>
      {page < pages && (
        <Link className={link} to={to(page + 1)}>
          {t("desk:pager.after")}
        </Link>
      )}
    </nav>
  );
}
