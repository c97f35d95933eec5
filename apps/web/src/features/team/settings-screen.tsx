import { companySettingsSchema, readCompany, updateCompany } from "@emberladder/contract";
import { useQuery, useQueryClient } from "@tanstack/react-query";
import { useState } from "react";
import { useTranslation } from "react-i18next";
import { CompanyFields } from "#components/forms/company-fields.tsx";
import { Form } from "#components/forms/form.tsx";
import { Facts } from "#components/ui/facts.tsx";
import { LoadingNote, ProblemNote } from "#components/ui/list-states.tsx";
import { PageHead } from "#components/ui/page-head.tsx";
import { StatusNote } from "#components/ui/status-note.tsx";
import { callApi } from "#lib/api-client.ts";
import { paths } from "#lib/paths.ts";
import { useSession } from "#lib/session.tsx";

/** The settings of the company; those who may not change them can read them. */
export function SettingsScreen() {
  const { t } = useTranslation();
  const { can, me, set } = useSession();
  const client = useQueryClient();
  const [done, setDone] = useState<string | null>(null);
  const company = useQuery({
    queryKey: ["company"],
    queryFn: ({ signal }) => callApi(readCompany, { signal }),
  });
  if (company.isPending) return <LoadingNote />;
  if (company.isError) return <ProblemNote problem={company.error} onRetry={() => void company.refetch()} />;
  const { name, timeZone, altitudeRule, unitsShown } = company.data;
  return (
    <>
      <PageHead
        back={can("person:list") ? { to: paths.team, label: t("desk:team.title") } : undefined}
        title={t("desk:settings.title")}
      />
      <div className="flex max-w-150 flex-col gap-4 px-4 py-5 desk:px-6">
        <StatusNote words={done} />
        {can("company:update") ? (
          <Form
            schema={companySettingsSchema}
            defaults={{ name, timeZone, altitudeRule, unitsShown }}
            submitLabel={t("desk:settings.save")}
            onSubmit={async (body) => {
              setDone(null);
              const changed = await callApi(updateCompany, { body });
              client.setQueryData(["company"], changed);
              if (me) set({ ...me, company: changed });
              setDone(t("desk:settings.saved"));
            }}
          >
            <CompanyFields />
          </Form>
        ) : (
          <Facts
            rows={[
              { name: t("desk:company.name"), value: name },
              { name: t("desk:company.timeZone"), value: timeZone },
              { name: t("desk:company.altitudeRule"), value: t(`desk:altitudeRules.${altitudeRule}`) },
              { name: t("desk:company.unitsShown"), value: t(`desk:unitSystems.${unitsShown}`) },
            ]}
          />
        )}
      </div>
    </>
  );
}
