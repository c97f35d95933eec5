/** Small helpers that the generators of `docs/trade` share. */

/** Says at the top of a generated file that it is one, and keeps the formatter from padding its tables. */
export const GENERATED_HEAD =
  "<!-- Made by tests/docs/write-trade-docs.ts from the product itself. Change the product, then run it again. -->\n\n<!-- prettier-ignore-start -->\n\n";
export const GENERATED_FOOT = "\n<!-- prettier-ignore-end -->\n";

/** One cell: bars and line breaks would end it. */
export function cell(text: string | number | undefined): string {
  return String(text ?? "")
    .replaceAll("|", "\\|")
    .replaceAll("\n", " ");
}

/** A table in Markdown. */
export function table(
  heads: readonly string[],
  rows: readonly (readonly (string | number | undefined)[])[],
): string {
  const line = (cells: readonly (string | number | undefined)[]) => `| ${cells.map(cell).join(" | ")} |`;
  return [line(heads), line(heads.map(() => "---")), ...rows.map(line), ""].join("\n");
}
