import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { parseReading } from "../../../apps/web/src/lib/parse-reading.ts";

/** A typed reading. UX-16. */
describe("a typed reading", () => {
  const figure = fc
    .tuple(fc.integer({ min: -99_999, max: 99_999 }), fc.integer({ min: 0, max: 3 }))
    .map(([digits, decimals]) => (digits / 10 ** decimals).toFixed(decimals));

  it("means the number that was written, with a point as in English or a comma as in Spanish", () => {
    fc.assert(
      fc.property(figure, fc.constantFrom(".", ","), (written, mark) => {
        expect(parseReading(written.replace(".", mark))).toEqual({ ok: true, value: Number(written) });
      }),
    );
  });

  it("may have spaces anywhere, a plus, or a true minus sign", () => {
    fc.assert(
      fc.property(figure, fc.nat(6), fc.constantFrom(" ", "\u00a0"), (written, place, space) => {
        const spaced = written.slice(0, place) + space + written.slice(place);
        expect(parseReading(spaced.replace("-", "\u2212"))).toEqual({ ok: true, value: Number(written) });
      }),
    );
    expect(parseReading("+3.5")).toEqual({ ok: true, value: 3.5 });
  });

  it("beyond the range of the meter is OL, however it is written", () => {
    for (const text of ["OL", "ol", "O.L.", " Ol "])
      expect(parseReading(text)).toEqual({ ok: true, value: "OL" });
  });

  it.each(["", "  ", "abc", "1.2.3", "1e5", "--4", "0x10", "Infinity", "NaN", "3.5 in"])(
    "%j is not guessed at",
    (text) => {
      expect(parseReading(text).ok).toBe(false);
    },
  );
});
