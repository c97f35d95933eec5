import {
  createTable,
  getCoreRowModel,
  getFilteredRowModel,
  getPaginationRowModel,
  getSortedRowModel,
} from "@tanstack/react-table";
import type { ReactNode } from "react";

/** One column: what it is called, what a row has in it, and how that is drawn where words are not enough. */
export interface Column<Row> {
  id: string;
  header: string;
  value: (row: Row) => string | number;
  renderCell?: (row: Row) => ReactNode;
}

/** What is shown of the rows. */
export interface TableState {
  sorting: { id: string; desc: boolean }[];
  filter: string;
  /** From 1. */
  page: number;
  pageSize: number;
}

/**
 * Sorts, filters and pages rows. The filter looks into every column, without regard to case.
 * @returns the rows of the page, and all that the filter leaves, both in the order of the sorting.
 */
export function buildTable<Row>(
  rows: Row[],
  columns: readonly Column<Row>[],
  state: TableState,
): { page: Row[]; all: Row[] } {
  const table = createTable<Row>({
    data: rows,
    columns: columns.map(({ id, header, value }) => ({
      id,
      header,
      accessorFn: value,
      sortUndefined: "last",
      sortingFn: "alphanumeric",
    })),
    state: {},
    onStateChange: () => undefined,
    renderFallbackValue: null,
    globalFilterFn: "includesString",
    getColumnCanGlobalFilter: () => true,
    getCoreRowModel: getCoreRowModel(),
    getSortedRowModel: getSortedRowModel(),
    getFilteredRowModel: getFilteredRowModel(),
    getPaginationRowModel: getPaginationRowModel(),
  });
  table.setOptions((options) => ({
    ...options,
    state: {
      ...table.initialState,
      sorting: state.sorting.filter(({ id }) => columns.some((column) => column.id === id)),
      globalFilter: state.filter,
      pagination: { pageIndex: state.page - 1, pageSize: state.pageSize },
    },
  }));
  const originals = (model: { rows: { original: Row }[] }) => model.rows.map((row) => row.original);
  return { page: originals(table.getRowModel()), all: originals(table.getSortedRowModel()) };
}
