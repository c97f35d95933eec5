import { CONTROLS, DRAFTS, FUELS, IGNITIONS, LOCATIONS, OPTION_FLAGS, STAGINGS } from "./codes.ts";
import { all, and, not, or } from "./variant.ts";
import type { Axis, VariantExpr } from "./variant.ts";

/**
 * Reads a variant expression in its written form:
 *
 *     expr   = term { "|" term }
 *     term   = factor { "&" factor }
 *     factor = "all" | [ "!" ] atom | [ "!" ] "(" expr ")"
 *     atom   = axis ":" CODE { "," CODE } | axis "!=" CODE | "opt:" flag
 *
 * @example parseVariant("ign:HSI & draft:IDP & ctl:IFC")
 */

const AXES: Record<string, { axis: Axis; codes: readonly string[] }> = {
  ign: { axis: "ignition", codes: IGNITIONS },
  draft: { axis: "draft", codes: DRAFTS },
  stg: { axis: "staging", codes: STAGINGS },
  loc: { axis: "location", codes: LOCATIONS },
  ctl: { axis: "control", codes: CONTROLS },
  fuel: { axis: "fuel", codes: FUELS },
};

/** A written expression that cannot be read; `at` is the character where it goes wrong. */
export class VariantSyntaxError extends Error {
  readonly at: number;
  constructor(message: string, at: number) {
    super(message);
    this.name = "VariantSyntaxError";
    this.at = at;
  }
}

/**
 * Parses a written variant expression.
 * @throws VariantSyntaxError naming what was expected and where.
 */
export function parseVariant(text: string): VariantExpr {
  const tokens = [...text.matchAll(/\s*([|&!()]|[a-z]+(?:!=|:)[A-Za-z0-9-]+(?:,[A-Za-z0-9-]+)*|[a-z]+)/gy)];
  const consumed = tokens.reduce((length, token) => length + token[0].length, 0);
  if (text.slice(consumed).trim() !== "")
    throw new VariantSyntaxError("This is not a code or a sign of the grammar.", consumed);
  let position = 0;
  const peek = () => tokens[position]?.[1];
  const where = () => tokens[position]?.index ?? text.length;

  const readTerm = (): VariantExpr => readList("&", readFactor, and);
  const readExpr = (): VariantExpr => readList("|", readTerm, or);

  function readList(
    sign: string,
    read: () => VariantExpr,
    join: (...terms: VariantExpr[]) => VariantExpr,
  ): VariantExpr {
    const terms = [read()];
    while (peek() === sign) {
      position++;
      terms.push(read());
    }
    return terms.length === 1 ? (terms[0] as VariantExpr) : join(...terms);
  }

  function readFactor(): VariantExpr {
    const token = peek();
    if (token === "!") {
      position++;
      return not(readFactor());
    }
    if (token === "(") {
      position++;
      const inner = readExpr();
      if (peek() !== ")") throw new VariantSyntaxError("A closing bracket is missing.", where());
      position++;
      return inner;
    }
    return readAtom(token);
  }

  function readAtom(token: string | undefined): VariantExpr {
    const at = where();
    if (token === undefined) throw new VariantSyntaxError("A code is missing.", at);
    position++;
    if (token === "all") return all;
    const match = /^([a-z]+)(!=|:)(.+)$/.exec(token);
    if (!match) throw new VariantSyntaxError(`"${token}" is not a code.`, at);
    const [, name = "", sign, rest = ""] = match;
    if (name === "opt") {
      const flag = OPTION_FLAGS.find((candidate) => candidate === rest);
      if (!flag || sign !== ":") throw new VariantSyntaxError(`"${rest}" is not an option.`, at);
      return { opt: flag };
    }
    const axis = AXES[name];
    const codes = rest.split(",");
    if (!axis) throw new VariantSyntaxError(`"${name}" is not an axis.`, at);
    const wrong = codes.find((code) => !axis.codes.includes(code));
    if (wrong) throw new VariantSyntaxError(`"${wrong}" is not a code of ${name}.`, at);
    if (sign === "!=" && codes.length > 1) throw new VariantSyntaxError('"!=" takes one code.', at);
    return { axis: axis.axis, codes, negated: sign === "!=" };
  }

  const expr = readExpr();
  if (position < tokens.length) throw new VariantSyntaxError("Something follows the end.", where());
  return expr;
}
