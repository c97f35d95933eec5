import { z } from "zod";
import type { Outcome } from "./codes.ts";
import type { PlateFigures } from "./profile.ts";

/**
 * A chain of classes and edges, read from the lowest value to the highest: `F < 108 <= M < 110 <= G`. Each edge
 * belongs to one of its two classes, so every value is in exactly one class. An edge may be a plate figure of
 * the unit with an offset or a factor; what the plate does not state falls back to a default, and where there
 * is none the chain has no meaning for that unit.
 *
 * @example
 * chain(FAIL, below(0.5), MARGINAL, below(2), GOOD) // 0.5 uA is marginal, 2 uA is good
 */
export interface Chain {
  readonly classes: readonly BandClass[];
  /** One fewer than the classes. */
  readonly edges: readonly Edge[];
}

/** A class of a chain; `stop` counts as failed and stops work. */
export type BandClass = Outcome | "stop";

/** The numeric fields of a plate. */
export type PlateFigure = {
  [K in keyof PlateFigures]-?: NonNullable<PlateFigures[K]> extends number ? K : never;
}[keyof PlateFigures];

/** An edge that follows a plate figure: (figure or fallback) times `times` plus `plus`. */
export interface PlateLimit {
  readonly plate: PlateFigure;
  readonly fallback?: number;
  readonly times?: number;
  readonly plus?: number;
}

export interface Edge {
  readonly at: number | PlateLimit;
  /** The class that the edge value itself belongs to. */
  readonly belongsTo: "lower" | "upper";
}

export const GOOD = "good";
export const MARGINAL = "marginal";
export const FAIL = "fail";
export const STOP = "stop";

/** An edge whose value belongs to the class above it: the class before holds everything below it. */
export const below = (at: number | PlateLimit): Edge => ({ at, belongsTo: "upper" });
/** An edge whose value belongs to the class before it. */
export const upTo = (at: number | PlateLimit): Edge => ({ at, belongsTo: "lower" });
/** A plate figure as an edge. */
export const plate = (figure: PlateFigure, fallback?: number): PlateLimit => ({ plate: figure, fallback });
/** The same plate figure with an offset. */
export const plus = (limit: PlateLimit, offset: number): PlateLimit => ({
  ...limit,
  plus: (limit.plus ?? 0) + offset,
});
/** The same plate figure multiplied. */
export const times = (limit: PlateLimit, factor: number): PlateLimit => ({
  ...limit,
  times: (limit.times ?? 1) * factor,
});

/**
 * Builds a chain from classes and edges in turn.
 * @throws where they do not take turns or the chain does not begin and end with a class.
 */
export function chain(...terms: (BandClass | Edge)[]): Chain {
  const classes = terms.filter((_, index) => index % 2 === 0);
  const edges = terms.filter((_, index) => index % 2 === 1);
  const isClass = (term: BandClass | Edge): term is BandClass => typeof term === "string";
  const isEdge = (term: BandClass | Edge): term is Edge => typeof term !== "string";
  if (terms.length % 2 === 0 || !classes.every(isClass) || !edges.every(isEdge)) {
    throw new Error("A chain takes classes and edges in turn.");
  }
  return { classes, edges };
}

const LETTERS: Record<string, BandClass> = { G: "good", M: "marginal", F: "fail", STOP: "stop" };
const LETTER_OF: Record<BandClass, string> = { good: "G", marginal: "M", fail: "F", stop: "STOP" };

export type ParsedChain = { ok: true; chain: Chain } | { ok: false; message: string };

/**
 * Reads a chain in its written form, such as `F < 108 <= M < 110 <= G`: classes G, M, F and STOP, numbers that
 * rise from left to right, and for each number one `<` and one `<=`, the `<=` on the side it belongs to.
 */
export function parseChain(text: string): ParsedChain {
  const tokens = text.trim().replaceAll("≤", "<=").split(/\s+/);
  const refuse = (message: string): ParsedChain => ({ ok: false, message });
  const classes: BandClass[] = [];
  const edges: Edge[] = [];
  let last = -Infinity;
  for (let i = 0; i < tokens.length; i += 4) {
    const cls = LETTERS[tokens[i] ?? ""];
    if (!cls) return refuse(`Write a class here: G, M, F or STOP, not "${tokens[i] ?? ""}".`);
    classes.push(cls);
    if (i + 1 >= tokens.length) break;
    const [before, number, after] = [tokens[i + 1], tokens[i + 2], tokens[i + 3]];
    if (number === undefined || after === undefined)
      return refuse("The chain ends in the middle. End it with a class.");
    const at = /^-?\d+(\.\d+)?$/.test(number) ? Number(number) : Number.NaN;
    if (Number.isNaN(at)) return refuse(`"${number}" is not a number.`);
    if (at <= last) return refuse(`Numbers must rise from left to right; ${number} does not.`);
    last = at;
    if (before === "<" && after === "<=") edges.push(below(at));
    else if (before === "<=" && after === "<") edges.push(upTo(at));
    else return refuse(`Beside ${number} write one "<" and one "<=", so that it belongs to one class.`);
  }
  if (classes.length !== edges.length + 1) return refuse("End the chain with a class.");
  if (classes.length < 2) return refuse("A chain has at least two classes.");
  if (classes.some((cls, index) => index > 0 && cls === classes[index - 1])) {
    return refuse("Two neighbouring classes are the same.");
  }
  return { ok: true, chain: { classes, edges } };
}

/** A zod string that holds a readable chain; its message says what is wrong and where. */
export const chainTextSchema = z
  .string()
  .max(200)
  .superRefine((text, context) => {
    const parsed = parseChain(text);
    if (!parsed.ok) context.addIssue({ code: "custom", message: parsed.message });
  });

/** A chain in its written form; plate figures are written by name. */
export function formatChain(written: Chain): string {
  const words: string[] = [];
  written.classes.forEach((cls, index) => {
    words.push(LETTER_OF[cls]);
    const edge = written.edges[index];
    if (!edge) return;
    const at = typeof edge.at === "number" ? String(edge.at) : formatPlateLimit(edge.at);
    words.push(...(edge.belongsTo === "upper" ? ["<", at, "<="] : ["<=", at, "<"]));
  });
  return words.join(" ");
}

function formatPlateLimit(limit: PlateLimit): string {
  const factor = limit.times === undefined ? "" : `${roundLimit(limit.times)}*`;
  const offset =
    limit.plus === undefined ? "" : `${limit.plus < 0 ? "-" : "+"}${Math.abs(roundLimit(limit.plus))}`;
  return `${factor}${limit.plate}${offset}`;
}

/** Rounds away what binary fractions add: limits are printed and compared as they are written. */
export function roundLimit(value: number): number {
  return Math.round(value * 1e6) / 1e6;
}

/** One class of a resolved chain, in numbers. The ends are infinite and included, so that OL has a class. */
export interface Segment {
  readonly outcome: BandClass;
  readonly from: number;
  readonly fromInclusive: boolean;
  readonly to: number;
  readonly toInclusive: boolean;
}

/** The value of a limit for one plate, or undefined where the plate does not state it and nothing stands in. */
export function resolveLimit(limit: number | PlateLimit, figures: PlateFigures): number | undefined {
  if (typeof limit === "number") return limit;
  const figure = figures[limit.plate] ?? limit.fallback;
  if (typeof figure !== "number") return undefined;
  return roundLimit(figure * (limit.times ?? 1) + (limit.plus ?? 0));
}

/**
 * The segments of a chain for one plate, lowest first; undefined where a figure it needs is not stated. A plate
 * figure that lies beyond a default edge pushes that edge along, so the segments always part the whole line.
 */
export function resolveChain(written: Chain, figures: PlateFigures): Segment[] | undefined {
  const at: number[] = [];
  const isPlate = written.edges.map((edge) => typeof edge.at !== "number");
  for (const edge of written.edges) {
    const value = resolveLimit(edge.at, figures);
    if (value === undefined) return undefined;
    at.push(value);
  }
  // A plate figure outranks a default number on either side of it.
  for (let i = at.length - 2; i >= 0; i--) {
    if (!isPlate[i])
      at[i] = Math.min(at[i] as number, ...at.slice(i + 1).filter((_, k) => isPlate[i + 1 + k]));
  }
  for (let i = 1; i < at.length; i++) at[i] = Math.max(at[i] as number, at[i - 1] as number);
  const upper = written.edges.map((edge) => edge.belongsTo === "upper");
  for (let i = 1; i < at.length; i++) {
    // Two edges on one value: it belongs to the first class that claims it.
    if (at[i] === at[i - 1] && !upper[i - 1]) upper[i] = false;
  }
  return written.classes
    .map((outcome, index): Segment => ({
      outcome,
      from: at[index - 1] ?? -Infinity,
      fromInclusive: index === 0 || upper[index - 1] === true,
      to: at[index] ?? Infinity,
      toInclusive: index === written.classes.length - 1 || upper[index] === false,
    }))
    .filter(({ from, to, fromInclusive, toInclusive }) => from < to || (fromInclusive && toInclusive));
}

/** Whether a value lies in a segment. */
export function isInSegment(segment: Segment, value: number): boolean {
  const aboveFrom = segment.fromInclusive ? value >= segment.from : value > segment.from;
  const belowTo = segment.toInclusive ? value <= segment.to : value < segment.to;
  return aboveFrom && belowTo;
}
