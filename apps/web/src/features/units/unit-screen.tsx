import { readUnit } from "@emberladder/contract";
import type { UnitDetail } from "@emberladder/contract";
import { useTranslation } from "react-i18next";
import { Link, useParams } from "react-router-dom";
import { ActLink } from "#components/ui/act.tsx";
import { KeptNote, LoadingNote, ProblemNote } from "#components/ui/list-states.tsx";
import { PageHead, Section } from "#components/ui/page-head.tsx";
import { ShutOffLabel } from "#components/ui/shut-off-label.tsx";
import { UnitSummaryFacts } from "#components/units/unit-summary-facts.tsx";
import { callApi } from "#lib/api-client.ts";
import { useKeptQuery } from "#lib/kept-query.ts";
import { paths } from "#lib/paths.ts";
import { useMe, useSession } from "#lib/session.tsx";
import { formatMoment } from "#lib/site-time.ts";
import { useRecordPath } from "#lib/use-record-path.ts";
import { BandList } from "./band-list.tsx";
import { ChainList } from "./chain-list.tsx";
import { HistoryTable } from "./history-table.tsx";
import { OptionList } from "./option-list.tsx";
import { PlateFacts } from "./plate-facts.tsx";

/** One unit: what it is, what its plate says, how its safeties are wired, and everything that was done on it. */
export function UnitScreen() {
  const { unitId = "" } = useParams();
  const { company } = useMe();
  const unit = useKeptQuery(`unit:${unitId}`, (signal) => callApi(readUnit, { params: { unitId }, signal }));
  if (unit.isPending) return <LoadingNote />;
  if (unit.isError) return <ProblemNote problem={unit.error} onRetry={() => void unit.refetch()} />;
  const { value, keptAt } = unit.data;
  return (
    <>
      {keptAt !== undefined && <KeptNote at={formatMoment(keptAt, company.timeZone)} />}
      <UnitPage unit={value} />
    </>
  );
}

function UnitPage({ unit }: { unit: UnitDetail }) {
  const { t } = useTranslation();
  const { can } = useSession();
  const { company } = useMe();
  const recordPath = useRecordPath();
  const { profile, site } = unit;
  const timeZone = site.timeZone ?? company.timeZone;
  return (
    <>
      <PageHead
        back={
          can("customer:read")
            ? { to: paths.customer(site.customerId), label: unit.customerFirstName }
            : { to: paths.calls, label: t("desk:call.back") }
        }
        title={unit.name}
        line={`${unit.customerFirstName}, ${site.address}, ${site.town}`}
        acts={
          <>
            {can("call:create") && (
              <ActLink to={`${paths.newCall}?unit=${unit.id}`}>{t("desk:unit.newCall")}</ActLink>
            )}
            {can("unit:write") && <ActLink to={paths.editUnit(unit.id)}>{t("desk:unit.correct")}</ActLink>}
          </>
        }
      />
      {unit.openShutOff && (
        <div className="px-4 py-3 desk:px-6">
          <ShutOffLabel record={unit.openShutOff} timeZone={timeZone} />
          <Link
            to={recordPath(unit.openShutOff.diagnosisId)}
            className="inline-flex min-h-12 items-center text-field font-medium desk:text-desk"
          >
            {t("desk:shutOff.read")}
          </Link>
        </div>
      )}
      <Section title={t("desk:unit.history")}>
        <HistoryTable history={unit.history} unitName={unit.name} timeZone={timeZone} />
      </Section>
      <div className="desk:grid desk:grid-cols-2">
        <Section title={t("desk:unit.kind")}>
          <UnitSummaryFacts profile={profile} />
        </Section>
        <Section title={t("desk:unit.plate")} note={t("desk:unit.plateNote")}>
          <PlateFacts profile={profile} />
        </Section>
        <Section title={t("desk:unit.chain")} note={t("desk:unit.chainNote")}>
          <ChainList chain={profile.chain} />
        </Section>
        <Section title={t("desk:unit.options")}>
          <OptionList options={profile.options} />
        </Section>
      </div>
      <Section title={t("desk:unit.bands")} note={t("desk:unit.bandsNote")}>
        <BandList bands={profile.bands} />
      </Section>
    </>
  );
}
