import {
  createSite,
  customerFieldsSchema,
  readCustomer,
  siteFieldsSchema,
  updateCustomer,
  updateSite,
} from "@emberladder/contract";
import type { AnswerOf, Site } from "@emberladder/contract";
import { useQuery, useQueryClient } from "@tanstack/react-query";
import { useState } from "react";
import { useTranslation } from "react-i18next";
import { Link, useParams } from "react-router-dom";
import { Form } from "#components/forms/form.tsx";
import { ActButton, ActLink } from "#components/ui/act.tsx";
import { Facts } from "#components/ui/facts.tsx";
import { LoadingNote, ProblemNote } from "#components/ui/list-states.tsx";
import { PageHead, Section } from "#components/ui/page-head.tsx";
import { callApi } from "#lib/api-client.ts";
import { paths } from "#lib/paths.ts";
import { useSession } from "#lib/session.tsx";
import { CustomerFields } from "./customer-fields.tsx";
import { EMPTY_SITE, SiteFields } from "./site-fields.tsx";

type CustomerDetail = AnswerOf<typeof readCustomer>;
type SiteDetail = CustomerDetail["sites"][number];

/** One customer with sites and units; each part is changed in its place. */
export function CustomerScreen() {
  const { t } = useTranslation();
  const { customerId = "" } = useParams();
  const { can } = useSession();
  const [isAdding, setAdding] = useState(false);
  const customer = useQuery({
    queryKey: ["customer", customerId],
    queryFn: ({ signal }) => callApi(readCustomer, { params: { customerId }, signal }),
  });
  if (customer.isPending) return <LoadingNote />;
  if (customer.isError)
    return <ProblemNote problem={customer.error} onRetry={() => void customer.refetch()} />;
  const { firstName, lastName, sites } = customer.data;
  return (
    <>
      <PageHead
        back={{ to: paths.customers, label: t("desk:customers.title") }}
        title={[firstName, lastName].filter(Boolean).join(" ")}
      />
      <Reach customer={customer.data} />
      {sites.map((site) => (
        <SiteSection key={site.id} site={site} />
      ))}
      {sites.length === 0 && (
        <p className="px-4 py-4 text-field text-quiet desk:px-6 desk:text-desk">
          {t("desk:customer.noSites")}
        </p>
      )}
      {can("customer:write") && (
        <div className="px-4 py-5 desk:px-6">
          {isAdding ? (
            <AddSite customerId={customerId} onClose={() => setAdding(false)} />
          ) : (
            <ActButton onClick={() => setAdding(true)}>{t("desk:site.add")}</ActButton>
          )}
        </div>
      )}
    </>
  );
}

function Reach({ customer }: { customer: CustomerDetail }) {
  const { t } = useTranslation();
  const { can } = useSession();
  const client = useQueryClient();
  const [isChanging, setChanging] = useState(false);
  const { id, firstName, lastName, email, phone } = customer;
  return (
    <Section
      title={t("desk:customer.reach")}
      acts={
        can("customer:write") &&
        !isChanging && (
          <ActButton kind="words" onClick={() => setChanging(true)}>
            {t("desk:form.change")}
          </ActButton>
        )
      }
    >
      {isChanging ? (
        <div className="max-w-150">
          <Form
            schema={customerFieldsSchema}
            defaults={{ firstName, lastName, email, phone }}
            submitLabel={t("desk:form.save")}
            onSubmit={async (body) => {
              const changed = await callApi(updateCustomer, { params: { customerId: id }, body });
              client.setQueryData(["customer", id], changed);
              setChanging(false);
            }}
            aside={
              <ActButton kind="words" onClick={() => setChanging(false)}>
                {t("desk:form.leave")}
              </ActButton>
            }
          >
            <CustomerFields />
          </Form>
        </div>
      ) : (
        <Facts
          rows={[
            { name: t("desk:signIn.email"), value: email ?? t("desk:customers.noEmail") },
            { name: t("desk:customer.phoneGiven"), value: phone ?? t("desk:form.notGiven") },
          ]}
        />
      )}
    </Section>
  );
}

function SiteSection({ site }: { site: SiteDetail }) {
  const { t } = useTranslation();
  const { can } = useSession();
  const [isChanging, setChanging] = useState(false);
  const { units, ...fields } = site;
  return (
    <Section
      title={`${site.address}, ${site.town}`}
      acts={
        can("customer:write") &&
        !isChanging && (
          <ActButton
            kind="words"
            aria-label={t("desk:site.changeOf", { address: site.address })}
            onClick={() => setChanging(true)}
          >
            {t("desk:form.change")}
          </ActButton>
        )
      }
    >
      {isChanging ? (
        <ChangeSite site={fields} onClose={() => setChanging(false)} />
      ) : (
        site.accessNote && (
          <p className="mb-3 border-l-4 border-ink pl-3 text-field font-semibold desk:text-desk">
            {site.accessNote}
          </p>
        )
      )}
      <ul className="mb-3 border-t border-hair">
        {units.map((unit) => (
          <li key={unit.id} className="border-b border-hair">
            <Link
              to={paths.unit(unit.id)}
              className="flex min-h-14 items-center text-field font-medium desk:min-h-12 desk:text-desk"
            >
              {unit.name}
            </Link>
          </li>
        ))}
        {units.length === 0 && (
          <li className="py-3 text-field text-quiet desk:text-desk">{t("desk:site.noUnits")}</li>
        )}
      </ul>
      {can("unit:write") && (
        <ActLink to={paths.newUnit(site.id)} aria-label={t("desk:unit.addTo", { address: site.address })}>
          {t("desk:unit.newTitle")}
        </ActLink>
      )}
    </Section>
  );
}

function ChangeSite({ site, onClose }: { site: Site; onClose: () => void }) {
  const { t } = useTranslation();
  const client = useQueryClient();
  const { id, customerId, ...fields } = site;
  return (
    <div className="mb-5 max-w-150">
      <Form
        schema={siteFieldsSchema}
        defaults={fields}
        submitLabel={t("desk:form.save")}
        onSubmit={async (body) => {
          await callApi(updateSite, { params: { siteId: id }, body });
          await client.invalidateQueries({ queryKey: ["customer", customerId] });
          onClose();
        }}
        aside={
          <ActButton kind="words" onClick={onClose}>
            {t("desk:form.leave")}
          </ActButton>
        }
      >
        <SiteFields />
      </Form>
    </div>
  );
}

function AddSite({ customerId, onClose }: { customerId: string; onClose: () => void }) {
  const { t } = useTranslation();
  const client = useQueryClient();
  return (
    <div className="max-w-150">
      <h2 className="mb-3 text-[1.1875rem] font-semibold">{t("desk:site.add")}</h2>
      <Form
        schema={siteFieldsSchema}
        defaults={EMPTY_SITE}
        submitLabel={t("desk:site.add")}
        onSubmit={async (body) => {
          await callApi(createSite, { params: { customerId }, body });
          await client.invalidateQueries({ queryKey: ["customer", customerId] });
          onClose();
        }}
        aside={
          <ActButton kind="words" onClick={onClose}>
            {t("desk:form.leave")}
          </ActButton>
        }
      >
        <SiteFields />
      </Form>
    </div>
  );
}
