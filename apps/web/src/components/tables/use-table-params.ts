import { useSearchParams } from "react-router-dom";

/** What one table shows, as the address says it. */
export interface TableView {
  sorting: { id: string; desc: boolean }[];
  filter: string;
  /** From 1. */
  page: number;
  pageParam: string;
  setFilter: (filter: string) => void;
  /** Sorts by a column upwards, then downwards, then not at all. */
  toggleSort: (column: string) => void;
}

/** Keeps the sorting, the filter and the page of a table in the address, under names that begin with `name`. */
export function useTableParams(name: string): TableView {
  const [search, setSearch] = useSearchParams();
  const [sortParam, filterParam, pageParam] = [`${name}-sort`, `${name}-filter`, `${name}-page`];
  const sort = search.get(sortParam) ?? "";
  const page = Number(search.get(pageParam) ?? 1);
  const change = (param: string, value: string) =>
    setSearch(
      (before) => {
        const next = new URLSearchParams(before);
        if (value) next.set(param, value);
        else next.delete(param);
        next.delete(pageParam);
        return next;
      },
      { replace: true },
    );
  return {
    sorting: sort ? [{ id: sort.replace(/^-/, ""), desc: sort.startsWith("-") }] : [],
    filter: search.get(filterParam) ?? "",
    page: Number.isInteger(page) && page > 0 ? page : 1,
    pageParam,
    setFilter: (filter) => change(filterParam, filter),
    toggleSort: (column) =>
      change(sortParam, sort === column ? `-${column}` : sort === `-${column}` ? "" : column),
  };
}
