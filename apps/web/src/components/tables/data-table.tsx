import { useTranslation } from "react-i18next";
import { ActButton } from "#components/ui/act.tsx";
import { Pager } from "#components/ui/pager.tsx";
import { SearchField } from "#components/ui/search-field.tsx";
import { toCsv } from "#lib/csv.ts";
import { saveFile } from "#lib/save-file.ts";
import { buildTable } from "./build-table.ts";
import type { Column } from "./build-table.ts";
import { useTableParams } from "./use-table-params.ts";

const PAGE_SIZE = 20;

/**
 * A ruled table that sorts, filters, pages and exports. What is chosen stands in the address under `name`, so that
 * a view can be kept and sent; the export has every row that the filter leaves, in the order shown, with the values
 * of the columns. On narrow screens the table scrolls inside its own box.
 */
export function DataTable<Row extends { id: string }>({
  name,
  caption,
  columns,
  rows,
  fileName,
}: {
  /** Prefix of this table's entries in the address. */
  name: string;
  caption: string;
  columns: readonly Column<Row>[];
  rows: Row[];
  fileName: string;
}) {
  const { t } = useTranslation();
  const view = useTableParams(name);
  if (rows.length === 0) {
    return <p className="text-field text-quiet desk:text-desk">{t("desk:table.empty")}</p>;
  }
  const shown = buildTable(rows, columns, { ...view, pageSize: PAGE_SIZE });
  const save = () => {
    const cells = shown.all.map((row) => columns.map((column) => column.value(row)));
    saveFile(fileName, "text/csv", toCsv([columns.map((column) => column.header), ...cells]));
  };
  return (
    <div>
      <div className="mb-3 flex flex-wrap items-end justify-between gap-3">
        <SearchField label={t("desk:table.filter")} text={view.filter} onChange={view.setFilter} />
        <ActButton onClick={save}>{t("desk:table.csv")}</ActButton>
      </div>
      <div role="region" aria-label={caption} tabIndex={0} className="overflow-x-auto border-y-2 border-ink">
        <table className="w-full border-collapse text-field desk:text-desk">
          <caption className="sr-only">{caption}</caption>
          <thead>
            <tr className="border-b-2 border-ink text-left">
              {columns.map((column) => (
                <SortHeader
                  key={column.id}
                  label={column.header}
                  sorted={view.sorting.find((sort) => sort.id === column.id)}
                  onSort={() => view.toggleSort(column.id)}
                />
              ))}
            </tr>
          </thead>
          <tbody>
            {shown.page.map((row) => (
              <tr key={row.id} className="border-b border-hair last:border-b-0">
                {columns.map((column) => (
                  <td key={column.id} className="px-2 py-2 align-middle">
                    {column.renderCell ? column.renderCell(row) : column.value(row)}
                  </td>
                ))}
              </tr>
            ))}
            {shown.all.length === 0 && (
              <tr>
                <td colSpan={columns.length} className="px-2 py-4 text-quiet">
                  {t("desk:table.noneLeft")}
                </td>
              </tr>
            )}
          </tbody>
        </table>
      </div>
      <Pager name={view.pageParam} page={view.page} pageSize={PAGE_SIZE} total={shown.all.length} />
    </div>
  );
}

function SortHeader({
  label,
  sorted,
  onSort,
}: {
  label: string;
  sorted?: { desc: boolean };
  onSort: () => void;
}) {
  const order = sorted ? (sorted.desc ? "descending" : "ascending") : "none";
  return (
    <th scope="col" aria-sort={order} className="p-0">
      <button
        type="button"
        onClick={onSort}
        className="flex min-h-12 w-full items-center gap-2 px-2 text-left font-semibold whitespace-nowrap outline-offset-[-3px]"
      >
        {label}
        <svg viewBox="0 0 12 16" width={10} height={14} aria-hidden="true">
          {order !== "descending" && (
            <path d="M6 1l5 6H1z" fill={sorted ? "var(--ink)" : "none"} stroke="var(--rule)" />
          )}
          {order !== "ascending" && (
            <path d="M6 15l5-6H1z" fill={sorted ? "var(--ink)" : "none"} stroke="var(--rule)" />
          )}
        </svg>
      </button>
    </th>
  );
}
