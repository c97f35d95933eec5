import type {
  Control,
  Draft,
  Fuel,
  Ignition,
  Location,
  OptionFlag,
  Options,
  Staging,
  VariantCodes,
} from "./codes.ts";
import type { FoundState, Severity } from "./codes.ts";

/**
 * Variant expressions: to which units a fault, check or stage applies.
 *
 * They are built from typed atoms, so that a code that does not exist does not compile, and are evaluated in
 * three values: an option the unit does not state is unknown, and unknown keeps a fault a candidate.
 *
 * @example
 * // induced draft with a run capacitor on the inducer
 * and(draft.not("ND"), opt("psc-inducer"))
 */
export type VariantExpr =
  | { readonly all: true }
  | { readonly axis: Axis; readonly codes: readonly string[]; readonly negated: boolean }
  | { readonly opt: OptionFlag }
  | { readonly sev: Severity }
  | { readonly found: FoundState }
  | { readonly not: VariantExpr }
  | { readonly and: readonly VariantExpr[] }
  | { readonly or: readonly VariantExpr[] };

export type Axis = keyof VariantCodes;

/** Three-valued truth. */
export type Tri = true | false | "unknown";

/** What an expression is judged against; severity and found state only matter in last-stage conditions. */
export interface VariantContext {
  codes: VariantCodes;
  options: Options;
  severity?: Severity;
  found?: FoundState;
}

interface AxisAtom<C extends string> {
  (...codes: C[]): VariantExpr;
  /** Any code of the axis but this one. */
  not(code: C): VariantExpr;
}

function axisAtom<C extends string>(axis: Axis): AxisAtom<C> {
  const is = (...codes: C[]): VariantExpr => ({ axis, codes, negated: false });
  return Object.assign(is, { not: (code: C): VariantExpr => ({ axis, codes: [code], negated: true }) });
}

export const ign = axisAtom<Ignition>("ignition");
export const draft = axisAtom<Draft>("draft");
export const stg = axisAtom<Staging>("staging");
export const loc = axisAtom<Location>("location");
export const ctl = axisAtom<Control>("control");
export const fuel = axisAtom<Fuel>("fuel");

/** Every unit. */
export const all: VariantExpr = { all: true };
/** The unit has this option. */
export const opt = (flag: OptionFlag): VariantExpr => ({ opt: flag });
/** The fault has gone this far (last-stage conditions only). */
export const sev = (severity: Severity): VariantExpr => ({ sev: severity });
/** A manual-reset device met tripped, or tripping after a supervised reset (last-stage conditions only). */
export const found = (state: FoundState): VariantExpr => ({ found: state });
export const not = (expr: VariantExpr): VariantExpr => ({ not: expr });
export const and = (...terms: VariantExpr[]): VariantExpr => ({ and: terms });
export const or = (...terms: VariantExpr[]): VariantExpr => ({ or: terms });

/**
 * The options of a unit with the defaults that the control type implies filled in.
 * Only `start-check` has a default: an integrated board checks that the draft switch is open before start,
 * a separate module does not. Common practice; the unit's diagram outranks it.
 */
export function withOptionDefaults(codes: VariantCodes, options: Options): Options {
  if (options["start-check"] !== undefined) return options;
  if (codes.control === "IFC") return { ...options, "start-check": true };
  if (codes.control === "MOD-S") return { ...options, "start-check": false };
  return options;
}

/** Evaluates an expression for a unit; an option the unit does not state makes its atom unknown. */
export function evaluateVariant(expr: VariantExpr, context: VariantContext): Tri {
  if ("all" in expr) return true;
  if ("axis" in expr) return expr.codes.includes(context.codes[expr.axis]) !== expr.negated;
  if ("opt" in expr) return withOptionDefaults(context.codes, context.options)[expr.opt] ?? "unknown";
  if ("sev" in expr) return context.severity === undefined ? "unknown" : context.severity === expr.sev;
  if ("found" in expr) return context.found === undefined ? "unknown" : context.found === expr.found;
  if ("not" in expr) {
    const inner = evaluateVariant(expr.not, context);
    return inner === "unknown" ? "unknown" : !inner;
  }
  const isAnd = "and" in expr;
  const values = (isAnd ? expr.and : expr.or).map((term) => evaluateVariant(term, context));
  const decisive = !isAnd;
  if (values.includes(decisive)) return decisive;
  return values.includes("unknown") ? "unknown" : !decisive;
}

/** Whether an expression may hold for a unit: unknown counts as may. */
export function mayApply(expr: VariantExpr, codes: VariantCodes, options: Options): boolean {
  return evaluateVariant(expr, { codes, options }) !== false;
}

/** The expression in its written form, as the trade references in `docs/` print it. */
export function formatVariant(expr: VariantExpr): string {
  const short: Record<Axis, string> = {
    ignition: "ign",
    draft: "draft",
    staging: "stg",
    location: "loc",
    control: "ctl",
    fuel: "fuel",
  };
  if ("all" in expr) return "all";
  if ("axis" in expr) return `${short[expr.axis]}${expr.negated ? "!=" : ":"}${expr.codes.join(",")}`;
  if ("opt" in expr) return `opt:${expr.opt}`;
  if ("sev" in expr) return `sev:${expr.sev}`;
  if ("found" in expr) return expr.found;
  if ("not" in expr)
    return "or" in expr.not || "and" in expr.not
      ? `!(${formatVariant(expr.not)})`
      : `!${formatVariant(expr.not)}`;
  if ("and" in expr)
    return expr.and.map((t) => ("or" in t ? `(${formatVariant(t)})` : formatVariant(t))).join(" & ");
  return expr.or.map(formatVariant).join(" | ");
}
