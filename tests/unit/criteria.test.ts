import { existsSync, readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";

const root = new URL("../../", import.meta.url);

/** The rows the product is bound to, as docs/criteria.md has to hold them. */
const range = (kind: string, ...numbers: number[]) =>
  numbers.map((number) => `${kind}-${String(number).padStart(2, "0")}`);
const BOUND = [
  ...range("SEC", 1, 2, 3, 4, 5, 6, 7, 8, 10, 11, 12, 13, 14, 17, 18, 20, 21, 22, 24, 26),
  ...range("UX", ...Array.from({ length: 20 }, (_, index) => index + 1)),
  ...range("UX", 22, 23, 24, 26, 27, 28, 29, 33, 36, 37, 39, 40),
];

interface Row {
  id: string;
  words: string;
  files: string[];
}

const rows: Row[] = readFileSync(new URL("docs/criteria.md", root), "utf8")
  .split("\n")
  .map((line) => line.split("|").map((cell) => cell.trim()))
  .filter(([, id = ""]) => /^[A-Z]+-\d+$/.test(id))
  .map(([, id = "", words = "", tests = ""]) => ({
    id,
    words,
    files: [...tests.matchAll(/`([^`]+)`/g)].map(([, file = ""]) => file),
  }));

describe("docs/criteria.md", () => {
  it("has every bound row once and no other", () => {
    expect(rows.map(({ id }) => id)).toEqual(BOUND);
  });

  it("says of each row what holds", () => {
    expect(rows.filter(({ words }) => words.length < 20)).toEqual([]);
  });

  it.each(rows)("$id is proved by tests that are there and name it", ({ id, files }) => {
    expect(files, `${id} has no test`).not.toEqual([]);
    for (const file of files) {
      const url = new URL(file, root);
      expect(existsSync(url), `${file} is not there`).toBe(true);
      expect(readFileSync(url, "utf8"), `${file} does not name ${id}`).toMatch(new RegExp(`\\b${id}\\b`));
    }
  });
});
