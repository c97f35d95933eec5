import { createCustomer, customerFieldsSchema, siteFieldsSchema } from "@emberladder/contract";
import { useQueryClient } from "@tanstack/react-query";
import { useTranslation } from "react-i18next";
import { useNavigate } from "react-router-dom";
import { Form } from "#components/forms/form.tsx";
import { PageHead } from "#components/ui/page-head.tsx";
import { callApi } from "#lib/api-client.ts";
import { paths } from "#lib/paths.ts";
import { CustomerFields } from "./customer-fields.tsx";
import { EMPTY_SITE, SiteFields } from "./site-fields.tsx";

const schema = customerFieldsSchema.extend({ site: siteFieldsSchema });

/** Adds a customer with the site that is called for. */
export function NewCustomerScreen() {
  const { t } = useTranslation();
  const navigate = useNavigate();
  const client = useQueryClient();
  return (
    <>
      <PageHead
        back={{ to: paths.customers, label: t("desk:customers.title") }}
        title={t("desk:customers.new")}
      />
      <div className="max-w-150 px-4 py-5 desk:px-6">
        <Form
          schema={schema}
          defaults={{ firstName: "", lastName: null, email: null, phone: null, site: EMPTY_SITE }}
          submitLabel={t("desk:customer.add")}
          onSubmit={async (body) => {
            const made = await callApi(createCustomer, { body });
            await client.invalidateQueries({ queryKey: ["customers"] });
            await navigate(paths.customer(made.id), { replace: true });
          }}
        >
          <CustomerFields />
          <h2 className="border-t-2 border-ink pt-4 text-[1.1875rem] font-semibold">
            {t("desk:site.first")}
          </h2>
          <SiteFields prefix="site." />
        </Form>
      </div>
    </>
  );
}
