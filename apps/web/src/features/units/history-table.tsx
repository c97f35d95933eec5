import type { DiagnosisSummary } from "@emberladder/contract";
import type { ColumnDef } from "@tanstack/react-table";
import { useMemo } from "react";
import { useTranslation } from "react-i18next";
import { Link } from "react-router-dom";
import { DataTable } from "#components/tables/data-table.tsx";
import { paths } from "#lib/paths.ts";
import { formatMoment } from "#lib/site-time.ts";

/** Every diagnosis on a unit: when, by whom, how it ended. */
export function HistoryTable({
  history,
  unitName,
  timeZone,
}: {
  history: DiagnosisSummary[];
  unitName: string;
  timeZone: string;
}) {
  const { t } = useTranslation();
  const columns = useMemo<ColumnDef<DiagnosisSummary>[]>(
    () => [
      {
        id: "openedAt",
        header: t("desk:history.opened"),
        accessorFn: (row) => row.openedAt,
        cell: ({ row }) => (
          <Link
            to={paths.reviewOf(row.original.id)}
            className="numeric inline-flex min-h-12 items-center whitespace-nowrap desk:min-h-8"
          >
            {formatMoment(row.original.openedAt, timeZone)}
          </Link>
        ),
      },
      {
        id: "call",
        header: t("desk:history.call"),
        accessorFn: (row) => row.callNumber,
        cell: ({ row }) => <span className="numeric">{row.original.callNumber}</span>,
      },
      { id: "technician", header: t("desk:history.technician"), accessorFn: (row) => row.technician.name },
      {
        id: "outcome",
        header: t("desk:history.outcome"),
        accessorFn: (row) => t(`desk:outcomes.${row.outcome ?? "open"}`),
      },
      {
        id: "lastStage",
        header: t("desk:history.lastStage"),
        accessorFn: (row) => (row.lastStage ? t(`trade:stages.${row.lastStage}.name`) : ""),
      },
      {
        id: "flags",
        header: t("desk:history.flags"),
        accessorFn: (row) => row.flags,
        cell: ({ row }) => <span className="numeric">{row.original.flags}</span>,
      },
    ],
    [t, timeZone],
  );
  return (
    <DataTable
      name="history"
      caption={t("desk:history.caption", { unit: unitName })}
      columns={columns}
      rows={history}
      fileName="unit-history.csv"
      toFileRow={(row) => [
        row.openedAt,
        row.callNumber,
        row.technician.name,
        t(`desk:outcomes.${row.outcome ?? "open"}`),
        row.lastStage ? t(`trade:stages.${row.lastStage}.name`) : "",
        row.flags,
      ]}
    />
  );
}
