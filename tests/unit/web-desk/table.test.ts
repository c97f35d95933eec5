import { describe, expect, it } from "vitest";
import { buildTable } from "../../../apps/web/src/components/tables/build-table.ts";
import type { Column } from "../../../apps/web/src/components/tables/build-table.ts";

interface Row {
  id: string;
  name: string;
  call: number;
}
const rows: Row[] = [
  { id: "a", name: "Ransom", call: 1110 },
  { id: "b", name: "Ibby", call: 1108 },
  { id: "c", name: "Ibby", call: 992 },
];
const columns: Column<Row>[] = [
  { id: "name", header: "Technician", value: (row) => row.name },
  { id: "call", header: "Call", value: (row) => row.call },
];
const plain = { sorting: [], filter: "", page: 1, pageSize: 20 };
const ids = (list: Row[]) => list.map((row) => row.id).join("");

describe("a table of the desk", () => {
  it("keeps the order it was given until a column is chosen", () => {
    expect(ids(buildTable(rows, columns, plain).page)).toBe("abc");
  });

  it("sorts numbers by size, not by their digits", () => {
    expect(ids(buildTable(rows, columns, { ...plain, sorting: [{ id: "call", desc: false }] }).page)).toBe(
      "cba",
    );
    expect(ids(buildTable(rows, columns, { ...plain, sorting: [{ id: "call", desc: true }] }).page)).toBe(
      "abc",
    );
  });

  it("finds a text in any column without regard to case", () => {
    expect(ids(buildTable(rows, columns, { ...plain, filter: "ibby" }).all)).toBe("bc");
    expect(ids(buildTable(rows, columns, { ...plain, filter: "992" }).all)).toBe("c");
  });

  it("shows one page and still gives every row that the filter leaves for the export", () => {
    const shown = buildTable(rows, columns, { ...plain, page: 2, pageSize: 2 });
    expect(ids(shown.page)).toBe("c");
    expect(ids(shown.all)).toBe("abc");
  });

  it("does not fail on a column that an old address names", () => {
    expect(ids(buildTable(rows, columns, { ...plain, sorting: [{ id: "gone", desc: true }] }).page)).toBe(
      "abc",
    );
  });
});
