import { createUnit } from "@emberladder/contract";
import { useQueryClient } from "@tanstack/react-query";
import { useTranslation } from "react-i18next";
import { useNavigate, useParams } from "react-router-dom";
import { PageHead } from "#components/ui/page-head.tsx";
import { callApi } from "#lib/api-client.ts";
import { paths } from "#lib/paths.ts";
import { useMe, useSession } from "#lib/session.tsx";
import { UnitForm } from "./unit-form.tsx";
import type { UnitDraft } from "./unit-form.tsx";

/** Adds a unit to a site. It begins as the commonest kind; the plate decides. */
export function NewUnitScreen() {
  const { t } = useTranslation();
  const { siteId = "" } = useParams();
  const { company } = useMe();
  const { can } = useSession();
  const navigate = useNavigate();
  const client = useQueryClient();
  const draft: UnitDraft = {
    name: "",
    profile: {
      codes: { ignition: "HSI", draft: "IDP", staging: "1S", location: "IND", control: "IFC", fuel: "NG" },
      options: {},
      plate: {},
      timings: {},
      altitudeRule: company.altitudeRule,
      bands: [],
    },
  };
  const add = async (unit: UnitDraft) => {
    const made = await callApi(createUnit, { body: { siteId, ...unit } });
    await client.invalidateQueries();
    await navigate(paths.unit(made.id), { replace: true });
  };
  return (
    <>
      <PageHead
        back={
          can("customer:read")
            ? { to: paths.customers, label: t("desk:customers.title") }
            : { to: paths.calls, label: t("desk:call.back") }
        }
        title={t("desk:unit.newTitle")}
      />
      <UnitForm draft={draft} submitLabel={t("desk:unit.add")} onSubmit={add} />
    </>
  );
}
