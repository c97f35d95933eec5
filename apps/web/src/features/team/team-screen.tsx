import { listPeople } from "@emberladder/contract";
import type { Person } from "@emberladder/contract";
import { useQuery } from "@tanstack/react-query";
import { useTranslation } from "react-i18next";
import { useSearchParams } from "react-router-dom";
import type { Column } from "#components/tables/build-table.ts";
import { DataTable } from "#components/tables/data-table.tsx";
import { ActButton, ActLink } from "#components/ui/act.tsx";
import { LoadingNote, ProblemNote } from "#components/ui/list-states.tsx";
import { PageHead } from "#components/ui/page-head.tsx";
import { callApi } from "#lib/api-client.ts";
import { paths } from "#lib/paths.ts";
import { useMe, useSession } from "#lib/session.tsx";
import { formatMoment } from "#lib/site-time.ts";
import { InviteForm } from "./invite-form.tsx";
import { PersonPanel } from "./person-panel.tsx";

/** The people of the company: the table, and beside it one person or the invitation of a new one. */
export function TeamScreen() {
  const { t } = useTranslation();
  const { can } = useSession();
  const { company } = useMe();
  const [search, setSearch] = useSearchParams();
  const people = useQuery({ queryKey: ["people"], queryFn: ({ signal }) => callApi(listPeople, { signal }) });
  const open = search.get("person");
  const isInviting = search.get("invite") !== null;
  const show = (change: { person?: string; invite?: string }) =>
    setSearch((before) => {
      const next = new URLSearchParams(before);
      for (const name of ["person", "invite"] as const) {
        const value = change[name];
        if (value) next.set(name, value);
        else next.delete(name);
      }
      return next;
    });
  const columns: Column<Person>[] = [
    {
      id: "name",
      header: t("desk:team.name"),
      value: (row) => row.name,
      renderCell: (row) =>
        can("person:manage") ? (
          <button
            type="button"
            aria-pressed={open === row.id}
            className="min-h-12 text-left font-semibold text-link underline underline-offset-4 aria-pressed:text-ink desk:min-h-9"
            onClick={() => show({ person: row.id })}
          >
            {row.name}
          </button>
        ) : (
          row.name
        ),
    },
    { id: "email", header: t("desk:signIn.email"), value: (row) => row.email },
    { id: "role", header: t("desk:team.role"), value: (row) => t(`desk:roles.${row.role}`) },
    { id: "state", header: t("desk:team.state"), value: (row) => t(`desk:personStates.${row.state}`) },
    {
      id: "twoStep",
      header: t("desk:team.twoStep"),
      value: (row) => t(row.hasTwoStep ? "desk:form.yes" : "desk:form.no"),
    },
    {
      id: "lastSeen",
      header: t("desk:team.lastSeen"),
      value: (row) => row.lastSeenAt ?? "",
      renderCell: (row) => (
        <span className="numeric whitespace-nowrap">
          {row.lastSeenAt ? formatMoment(row.lastSeenAt, company.timeZone) : t("desk:team.never")}
        </span>
      ),
    },
  ];
  if (people.isPending) return <LoadingNote />;
  if (people.isError) return <ProblemNote problem={people.error} onRetry={() => void people.refetch()} />;
  const person = people.data.items.find((one) => one.id === open);
  const hasPanel = person !== undefined || isInviting;
  return (
    <>
      <PageHead
        title={t("desk:team.title")}
        line={t("desk:team.count", { count: people.data.items.length })}
        acts={
          <>
            {can("company:update") && <ActLink to={paths.settings}>{t("desk:settings.title")}</ActLink>}
            {can("person:manage") && (
              <ActButton onClick={() => show({ invite: "yes" })}>{t("desk:team.invite")}</ActButton>
            )}
          </>
        }
      />
      <div className={`grow ${hasPanel ? "grid desk:grid-cols-[minmax(0,1fr)_26rem]" : ""}`}>
        <div className="min-w-0 px-4 py-4 desk:px-6">
          <DataTable
            name="people"
            caption={t("desk:team.title")}
            columns={columns}
            rows={people.data.items}
            fileName="team.csv"
          />
        </div>
        {hasPanel && (
          <aside className="border-t-2 border-ink bg-surface desk:border-t-0 desk:border-l-2">
            {isInviting && <InviteForm onClose={() => show({})} />}
            {person && <PersonPanel key={person.id} person={person} onClose={() => show({})} />}
          </aside>
        )}
      </div>
    </>
  );
}
