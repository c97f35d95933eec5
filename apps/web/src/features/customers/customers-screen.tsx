import { listCustomers } from "@emberladder/contract";
import { useQuery } from "@tanstack/react-query";
import { useTranslation } from "react-i18next";
import { Link, useSearchParams } from "react-router-dom";
import { ActLink } from "#components/ui/act.tsx";
import { EmptyNote, LoadingNote, ProblemNote } from "#components/ui/list-states.tsx";
import { PageHead } from "#components/ui/page-head.tsx";
import { Pager } from "#components/ui/pager.tsx";
import { SearchField } from "#components/ui/search-field.tsx";
import { callApi } from "#lib/api-client.ts";
import { paths } from "#lib/paths.ts";
import { useSession } from "#lib/session.tsx";

const PAGE_SIZE = 25;

/** All customers, found by name, e-mail, address or town. Search and page stand in the address. */
export function CustomersScreen() {
  const { t } = useTranslation();
  const { can } = useSession();
  const [params, setParams] = useSearchParams();
  const search = params.get("search") ?? "";
  const page = Math.max(1, Math.trunc(Number(params.get("page") ?? 1)) || 1);
  const query = { search: search.trim() || undefined, page, pageSize: PAGE_SIZE };
  const customers = useQuery({
    queryKey: ["customers", query],
    queryFn: ({ signal }) => callApi(listCustomers, { query, signal }),
    placeholderData: (before) => before,
  });
  return (
    <>
      <PageHead
        title={t("desk:customers.title")}
        line={customers.data && t("desk:customers.count", { count: customers.data.total })}
        acts={can("customer:write") && <ActLink to={paths.newCustomer}>{t("desk:customers.new")}</ActLink>}
      />
      <div className="border-b border-hair px-4 py-3 desk:px-6">
        <SearchField
          label={t("desk:customers.search")}
          text={search}
          onChange={(text) => setParams(text ? { search: text } : {}, { replace: true })}
        />
      </div>
      {customers.isPending && <LoadingNote />}
      {customers.isError && (
        <ProblemNote problem={customers.error} onRetry={() => void customers.refetch()} />
      )}
      {customers.data?.items.length === 0 && (
        <EmptyNote
          title={t(search ? "desk:customers.noneFound" : "desk:customers.none")}
          note={t(search ? "desk:customers.noneFoundNote" : "desk:customers.noneNote")}
        />
      )}
      <ul>
        {customers.data?.items.map((customer) => (
          <li
            key={customer.id}
            className="relative grid grid-cols-1 gap-x-6 border-b border-hair px-4 py-3 hover:bg-surface desk:grid-cols-[2fr_2fr_1fr_1fr] desk:items-center desk:px-6"
          >
            {/* The whole row is the target. */}
            <Link
              to={paths.customer(customer.id)}
              aria-labelledby={`customer-${customer.id}`}
              className="absolute inset-0 -outline-offset-3"
            />
            <span id={`customer-${customer.id}`} className="text-field font-semibold desk:text-desk">
              {[customer.firstName, customer.lastName].filter(Boolean).join(" ")}
            </span>
            <span className="text-field break-words text-quiet desk:text-desk">
              {customer.email ?? t("desk:customers.noEmail")}
            </span>
            <span className="numeric text-field text-quiet desk:text-desk">{customer.phone}</span>
            <span className="text-field text-quiet desk:text-desk">
              {t("desk:customers.siteCount", { count: customer.siteCount })}
            </span>
          </li>
        ))}
      </ul>
      {customers.data && (
        <Pager page={customers.data.page} pageSize={customers.data.pageSize} total={customers.data.total} />
      )}
    </>
  );
}
