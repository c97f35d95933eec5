import { listCustomers, readCustomer } from "@emberladder/contract";
import { useQuery } from "@tanstack/react-query";
import { useDeferredValue, useState } from "react";
import { useTranslation } from "react-i18next";
import { ActButton, ActLink } from "#components/ui/act.tsx";
import { EmptyNote, LoadingNote, ProblemNote } from "#components/ui/list-states.tsx";
import { SearchField } from "#components/ui/search-field.tsx";
import { callApi } from "#lib/api-client.ts";
import { paths } from "#lib/paths.ts";

const row =
  "flex min-h-14 w-full flex-wrap items-center gap-x-3 border-b border-hair px-2 py-2 text-left text-field hover:bg-sunk desk:min-h-12 desk:text-desk";

/** Finds a unit by its customer: search, then one of the units at the customer's sites. */
export function PickUnit({
  customerId,
  onCustomer,
  onUnit,
}: {
  customerId: string | undefined;
  onCustomer: (customerId: string | undefined) => void;
  onUnit: (unitId: string) => void;
}) {
  return customerId ? (
    <UnitsOfCustomer customerId={customerId} onUnit={onUnit} onBack={() => onCustomer(undefined)} />
  ) : (
    <FindCustomer onCustomer={onCustomer} />
  );
}

function FindCustomer({ onCustomer }: { onCustomer: (customerId: string) => void }) {
  const { t } = useTranslation();
  const [text, setText] = useState("");
  const search = useDeferredValue(text.trim());
  const customers = useQuery({
    queryKey: ["customers", { search, page: 1, pageSize: 10 }],
    queryFn: ({ signal }) =>
      callApi(listCustomers, { query: { search: search || undefined, pageSize: 10 }, signal }),
    placeholderData: (before) => before,
  });
  return (
    <div className="flex max-w-150 flex-col gap-3">
      <SearchField label={t("desk:newCall.findCustomer")} text={text} onChange={setText} />
      {customers.isError && (
        <ProblemNote problem={customers.error} onRetry={() => void customers.refetch()} />
      )}
      {customers.data?.items.length === 0 && (
        <EmptyNote
          title={t("desk:customers.noneFound")}
          act={<ActLink to={paths.newCustomer}>{t("desk:customers.new")}</ActLink>}
        />
      )}
      <ul>
        {customers.data?.items.map((customer) => (
          <li key={customer.id}>
            <button type="button" className={row} onClick={() => onCustomer(customer.id)}>
              <span className="font-semibold">
                {[customer.firstName, customer.lastName].filter(Boolean).join(" ")}
              </span>
              <span className="text-quiet">
                {t("desk:customers.siteCount", { count: customer.siteCount })}
              </span>
            </button>
          </li>
        ))}
      </ul>
    </div>
  );
}

function UnitsOfCustomer({
  customerId,
  onUnit,
  onBack,
}: {
  customerId: string;
  onUnit: (unitId: string) => void;
  onBack: () => void;
}) {
  const { t } = useTranslation();
  const customer = useQuery({
    queryKey: ["customer", customerId],
    queryFn: ({ signal }) => callApi(readCustomer, { params: { customerId }, signal }),
  });
  if (customer.isPending) return <LoadingNote />;
  if (customer.isError)
    return <ProblemNote problem={customer.error} onRetry={() => void customer.refetch()} />;
  const { firstName, lastName, sites } = customer.data;
  return (
    <div className="flex max-w-150 flex-col gap-3">
      <div className="flex flex-wrap items-center justify-between gap-3">
        <p className="text-field font-semibold">{[firstName, lastName].filter(Boolean).join(" ")}</p>
        <ActButton onClick={onBack}>{t("desk:newCall.anotherCustomer")}</ActButton>
      </div>
      {sites.map((site) => (
        <section key={site.id}>
          <h3 className="text-field text-quiet desk:text-desk">
            {site.address}, {site.town}
          </h3>
          <ul>
            {site.units.map((unit) => (
              <li key={unit.id}>
                <button type="button" className={row} onClick={() => onUnit(unit.id)}>
                  <span className="font-semibold">{unit.name}</span>
                </button>
              </li>
            ))}
          </ul>
          <ActLink kind="words" to={paths.newUnit(site.id)}>
            {t("desk:unit.addTo", { address: site.address })}
          </ActLink>
        </section>
      ))}
      {sites.length === 0 && (
        <p className="text-field text-quiet desk:text-desk">{t("desk:customer.noSites")}</p>
      )}
    </div>
  );
}
