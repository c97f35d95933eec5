import {
  flexRender,
  getCoreRowModel,
  getFilteredRowModel,
  getPaginationRowModel,
  getSortedRowModel,
  useReactTable,
} from "@tanstack/react-table";
import type { ColumnDef } from "@tanstack/react-table";
import { useTranslation } from "react-i18next";
import { ActButton } from "#components/ui/act.tsx";
import { Pager } from "#components/ui/pager.tsx";
import { SearchField } from "#components/ui/search-field.tsx";
import { toCsv } from "#lib/csv.ts";
import type { CsvCell } from "#lib/csv.ts";
import { saveFile } from "#lib/save-file.ts";
import { useTableParams } from "./use-table-params.ts";

const PAGE_SIZE = 20;

/**
 * A ruled table that sorts, filters, pages and exports. What is chosen stands in the address under `name`, so that
 * a view can be kept and sent; the export has every row that the filter leaves, in the order shown. On narrow
 * screens the table scrolls inside its own box.
 */
export function DataTable<Row>({
  name,
  caption,
  columns,
  rows,
  fileName,
  toFileRow,
}: {
  /** Prefix of this table's entries in the address. */
  name: string;
  caption: string;
  columns: ColumnDef<Row>[];
  rows: Row[];
  fileName: string;
  /** One row of the export; texts are made safe for spreadsheets. */
  toFileRow: (row: Row) => CsvCell[];
}) {
  const { t } = useTranslation();
  const view = useTableParams(name);
  const table = useReactTable({
    data: rows,
    columns,
    state: {
      sorting: view.sorting,
      globalFilter: view.filter,
      pagination: { pageIndex: view.page - 1, pageSize: PAGE_SIZE },
    },
    globalFilterFn: "includesString",
    getColumnCanGlobalFilter: () => true,
    autoResetPageIndex: false,
    getCoreRowModel: getCoreRowModel(),
    getSortedRowModel: getSortedRowModel(),
    getFilteredRowModel: getFilteredRowModel(),
    getPaginationRowModel: getPaginationRowModel(),
  });
  const headers = table.getFlatHeaders();
  const left = table.getSortedRowModel().rows;
  const save = () => {
    const head = headers.map((header) => String(header.column.columnDef.header ?? ""));
    saveFile(fileName, "text/csv", toCsv([head, ...left.map((row) => toFileRow(row.original))]));
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
              {headers.map((header) => {
                const sorted = header.column.getIsSorted();
                return (
                  <th
                    key={header.id}
                    scope="col"
                    aria-sort={sorted === "asc" ? "ascending" : sorted === "desc" ? "descending" : "none"}
                    className="p-0"
                  >
                    <button
                      type="button"
                      onClick={() => view.toggleSort(header.column.id)}
                      className="flex min-h-12 w-full items-center gap-2 px-2 text-left font-semibold whitespace-nowrap"
                    >
                      {flexRender(header.column.columnDef.header, header.getContext())}
                      <SortMark sorted={sorted} />
                    </button>
                  </th>
                );
              })}
            </tr>
          </thead>
          <tbody>
            {table.getRowModel().rows.map((row) => (
              <tr key={row.id} className="border-b border-hair last:border-b-0">
                {row.getVisibleCells().map((cell) => (
                  <td key={cell.id} className="px-2 py-2 align-top">
                    {flexRender(cell.column.columnDef.cell, cell.getContext())}
                  </td>
                ))}
              </tr>
            ))}
            {left.length === 0 && (
              <tr>
                <td colSpan={headers.length} className="px-2 py-4 text-quiet">
                  {t(rows.length === 0 ? "desk:table.empty" : "desk:table.noneLeft")}
                </td>
              </tr>
            )}
          </tbody>
        </table>
      </div>
      <Pager name={view.pageParam} page={view.page} pageSize={PAGE_SIZE} total={left.length} />
    </div>
  );
}

function SortMark({ sorted }: { sorted: false | "asc" | "desc" }) {
  return (
    <svg viewBox="0 0 12 16" width={10} height={14} aria-hidden="true">
      {sorted !== "desc" && (
        <path d="M6 1l5 6H1z" fill={sorted ? "var(--ink)" : "none"} stroke="var(--rule)" />
      )}
      {sorted !== "asc" && (
        <path d="M6 15l5-6H1z" fill={sorted ? "var(--ink)" : "none"} stroke="var(--rule)" />
      )}
    </svg>
  );
}
