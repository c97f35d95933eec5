import { readdirSync, readFileSync } from "node:fs";
import { createRequire } from "node:module";
import { dirname, join } from "node:path";
import { fileURLToPath } from "node:url";
import { PDF_FONTS, PDF_WORDS } from "@emberladder/api/src/modules/reports/report-pdf.ts";
import * as reportWords from "@emberladder/api/src/modules/reports/report-words.ts";
import { formatMoment } from "@emberladder/api/src/modules/mail/format-moment.ts";
import { demoCalls, demoCompanies, referenceCalls } from "@emberladder/db/seed";
import { hotSurfaceInducedTree } from "@emberladder/trees";
import { en } from "@emberladder/words";
import { openSync } from "fontkit";
import type { Font } from "fontkit";
import { parseSync, Visitor } from "oxc-parser";
import { describe, expect, it } from "vitest";

/*
 * A character without a glyph is drawn in another font on a screen, and left out without a word in a PDF. Which
 * characters a font file has is read from its own cmap table (OpenType).
 */
const root = fileURLToPath(new URL("../../", import.meta.url));
const web = join(root, "apps/web");
const requireFromWeb = createRequire(join(web, "package.json"));

/** Every text in a value, however deep. */
const textsOf = (value: unknown): string[] => {
  if (typeof value === "string") return [value];
  if (typeof value !== "object" || value === null) return [];
  return Object.values(value).flatMap(textsOf);
};

/** Every text that a source file spells out: strings, templates and the text of elements, no comments. */
const literalsOf = (path: string): string[] => {
  const found: string[] = [];
  const { program, errors } = parseSync(path, readFileSync(path, "utf8"));
  if (errors.length > 0) throw new Error(`${path} cannot be read.`);
  new Visitor({
    Literal: (node) => {
      if (typeof node.value === "string") found.push(node.value);
    },
    TemplateElement: (node) => void found.push(node.value.cooked ?? node.value.raw),
    JSXText: (node) => void found.push(node.value),
  }).visit(program);
  return found;
};
const sourcesIn = (folder: string): string[] =>
  readdirSync(join(root, folder), { recursive: true, encoding: "utf8" })
    .filter((name) => /\.tsx?$/.test(name) && !/\.test\.tsx?$/.test(name))
    .map((name) => join(root, folder, name));

/** The characters of some texts that are drawn: line ends are not, nor the mark that opens a CSV file in UTF-8. */
const charactersOf = (texts: readonly string[]): string[] =>
  [...new Set(texts.join(""))].filter((character) => !/[\n\r\t\uFEFF]/.test(character)).toSorted();
const nameOf = (character: string) =>
  `U+${(character.codePointAt(0) ?? 0).toString(16).toUpperCase().padStart(4, "0")} ${character}`;
const missingIn = (font: Font, characters: readonly string[]) =>
  characters
    .filter((character) => !font.hasGlyphForCodePoint(character.codePointAt(0) ?? 0))
    .map((character) => nameOf(character));

const open = (path: string): Font => {
  const font = openSync(path);
  if (!("hasGlyphForCodePoint" in font)) throw new Error(`${path} is not one font.`);
  return font;
};

/** The font files that the style sheet imports, with the characters for which the browser uses each. */
const webFaces = readFileSync(join(web, "src/styles/index.css"), "utf8")
  .split("\n")
  .flatMap((line) => /@import "(@fontsource\/[^"]+)"/.exec(line)?.[1] ?? [])
  .flatMap((sheet) => {
    const path = requireFromWeb.resolve(sheet);
    const css = readFileSync(path, "utf8");
    return [...css.matchAll(/@font-face\s*\{[^}]*\}/g)].map(([face]) => ({
      sheet,
      file: join(dirname(path), /url\(([^)]+\.woff2)\)/.exec(face)?.[1] ?? ""),
      ranges: (/unicode-range:([^;]+);/.exec(face)?.[1] ?? "U+0-10FFFF").split(",").map((range) => {
        const [from = "0", to = from] = range.trim().replace("U+", "").split("-");
        return [Number.parseInt(from, 16), Number.parseInt(to, 16)] as const;
      }),
    }));
  });

const trade = textsOf([en, hotSurfaceInducedTree]);
const invented = textsOf([referenceCalls, demoCalls, demoCompanies]);
const ofReport = charactersOf([
  ...textsOf([PDF_WORDS, reportWords, en, invented]),
  formatMoment(new Date("2026-01-12T15:40:00Z"), "America/Denver"),
  formatMoment(new Date("2026-07-12T23:05:00Z"), "Europe/Vienna"),
]);
const ofScreens = charactersOf([
  ...trade,
  ...invented,
  ...textsOf([PDF_WORDS, reportWords]),
  ...sourcesIn("apps/web/src").flatMap(literalsOf),
  ...sourcesIn("packages/field-math/src").flatMap(literalsOf),
]);

describe("every character that the product writes", () => {
  it("is collected: letters, digits and signs of the trade", () => {
    expect(ofScreens.length).toBeGreaterThan(80);
    expect(ofReport.join("")).toContain("%");
  });

  it.each(webFaces)("has a glyph in the screens' font $sheet", ({ file, ranges }) => {
    expect(missingIn(open(file), ofScreens)).toEqual([]);
    const unused = ofScreens.filter((character) => {
      const code = character.codePointAt(0) ?? 0;
      return !ranges.some(([from, to]) => code >= from && code <= to);
    });
    expect(unused.map((character) => nameOf(character))).toEqual([]);
  });

  it("is looked for in every weight that the style sheet imports", () =>
    expect(webFaces.length).toBeGreaterThan(4));

  it.each(Object.entries(PDF_FONTS))("has a glyph in the printed report's font %s", (_name, file) => {
    expect(missingIn(open(file), ofReport)).toEqual([]);
  });

  it("is missed where a font does not have it", () => {
    // These the Latin files do not have: an ohm sign, a Cyrillic letter, an arrow.
    const [face] = webFaces;
    expect(missingIn(open(face?.file ?? ""), ["A", "\u2126", "\u0416", "\u21D2"])).toHaveLength(3);
  });
});
