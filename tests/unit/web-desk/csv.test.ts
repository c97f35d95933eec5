import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { toCsv } from "../../../apps/web/src/lib/csv.ts";

/** Reads CSV back by RFC 4180, written apart from the code under test. */
function parseCsv(text: string): string[][] {
  const rows: string[][] = [[]];
  let cell = "";
  let isQuoted = false;
  for (let i = 0; i < text.length; i++) {
    const char = text[i] ?? "";
    if (isQuoted) {
      if (char === '"' && text[i + 1] === '"') {
        cell += '"';
        i++;
      } else if (char === '"') isQuoted = false;
      else cell += char;
    } else if (char === '"') isQuoted = true;
    else if (char === ",") {
      rows.at(-1)?.push(cell);
      cell = "";
    } else if (char === "\r" && text[i + 1] === "\n") {
      rows.at(-1)?.push(cell);
      cell = "";
      rows.push([]);
      i++;
    } else cell += char;
  }
  return rows.slice(0, -1);
}

describe("a table saved as CSV", () => {
  // Starts of a formula by OWASP's page on CSV injection, from memory.
  it.each(["=1+1", "+cmd|' /C calc'!A0", "-2+3", "@SUM(A1)", "\t=1", "\r=1", "  =1", "\uFF1D1+1"])(
    "puts an apostrophe before a text that a spreadsheet would run: %j",
    (text) => {
      expect(parseCsv(toCsv([[text]]))).toEqual([[`'${text}`]]);
    },
  );

  it("leaves numbers as numbers, also negative ones and those typed as text", () => {
    expect(toCsv([[-0.45, "-0.45", "+3", 12]])).toBe("-0.45,-0.45,+3,12\r\n");
  });

  it("writes nothing for what is not there and for what is no number", () => {
    expect(toCsv([[null, undefined, Number.NaN, ""]])).toBe(",,,\r\n");
  });

  it("comes back whole by RFC 4180 whatever the texts are", () => {
    const text = fc
      .string({ unit: "binary" })
      .filter((cell) => !/^[\s]*[=+\-@\uFF0B\uFF0D\uFF1D\uFF20]|^[\t\r]/.test(cell));
    fc.assert(
      fc.property(fc.array(fc.array(text, { minLength: 1 }), { minLength: 1 }), (rows) => {
        expect(parseCsv(toCsv(rows))).toEqual(rows);
      }),
    );
  });

  it("never gives a cell that begins as a formula", () => {
    fc.assert(
      fc.property(fc.constantFrom("=", "+", "-", "@"), fc.string(), (start, rest) => {
        const cell = parseCsv(toCsv([[start + rest]]))[0]?.[0] ?? "";
        expect(cell.startsWith("'") || /^[+-]?\d+([.,]\d+)?$/.test(cell)).toBe(true);
      }),
    );
  });
});
