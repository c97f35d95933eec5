import type { DiagnosisSummary } from "@emberladder/contract";
import { useTranslation } from "react-i18next";
import { Link } from "react-router-dom";
import type { Column } from "#components/tables/build-table.ts";
import { DataTable } from "#components/tables/data-table.tsx";
import { formatMoment } from "#lib/site-time.ts";
import { useRecordPath } from "#lib/use-record-path.ts";

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
  const recordPath = useRecordPath();
  const columns: Column<DiagnosisSummary>[] = [
    {
      id: "opened",
      header: t("desk:history.opened"),
      value: (row) => row.openedAt,
      renderCell: (row) => (
        <Link
          to={recordPath(row.id)}
          className="numeric inline-flex min-h-12 items-center whitespace-nowrap desk:min-h-9"
        >
          {formatMoment(row.openedAt, timeZone)}
        </Link>
      ),
    },
    { id: "call", header: t("desk:history.call"), value: (row) => row.callNumber },
    { id: "technician", header: t("desk:history.technician"), value: (row) => row.technician.name },
    {
      id: "outcome",
      header: t("desk:history.outcome"),
      value: (row) => t(`desk:outcomes.${row.outcome ?? "open"}`),
    },
    {
      id: "lastStage",
      header: t("desk:history.lastStage"),
      value: (row) => (row.lastStage ? t(`trade:stages.${row.lastStage}.name`) : ""),
    },
    { id: "flags", header: t("desk:history.flags"), value: (row) => row.flags },
  ];
  return (
    <DataTable
      name="history"
      caption={t("desk:history.caption", { unit: unitName })}
      columns={columns}
      rows={history}
      fileName="unit-history.csv"
    />
  );
}
