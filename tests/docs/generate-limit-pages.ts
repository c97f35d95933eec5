import {
  CHECKS,
  STOP_RULES,
  STOP_RULE_CODES,
  STOP_RULE_IDS,
  STOP_TRIGGERS,
  bandsOf,
  formatChain,
  formatVariant,
  resolveChain,
} from "@emberladder/furnace";
import type { Band, Chain, StopAct, StopTrigger } from "@emberladder/furnace";
import { en } from "@emberladder/words";
import { GENERATED_FOOT, GENERATED_HEAD, table } from "./markdown.ts";

/** The circumstances under which a band holds, in a few words. */
function circumstances(band: Band): string {
  return [
    band.when && formatVariant(band.when),
    band.way && en.ways[band.way],
    band.fire && `${band.fire} fire`,
    band.supply && `supply ${band.supply}`,
    band.load,
    band.power && `power ${band.power}`,
    band.place,
    band.element && `${band.element} V element`,
    band.igniter && `igniter ${band.igniter}`,
    band.needsPlate && `plate states ${band.needsPlate.join(", ")}`,
    band.percentOf && `percent of ${band.percentOf}`,
  ]
    .filter(Boolean)
    .join(", ");
}

/** The chain with what stands in for a plate that says nothing; empty where it has no plate figures. */
function withoutPlate(chain: Chain): string {
  if (chain.edges.every(({ at }) => typeof at === "number")) return "";
  const segments = resolveChain(chain, {});
  if (!segments) return "no class";
  return formatChain({
    classes: segments.map(({ outcome }) => outcome),
    edges: segments.slice(0, -1).map(({ to, toInclusive }) => ({
      at: to,
      belongsTo: toInclusive ? "lower" : "upper",
    })),
  });
}

/** Every band of the catalogue as a page. */
export function makeBandsPage(): string {
  const rows = CHECKS.flatMap(({ id }) =>
    bandsOf(id).map((band) => [
      `\`${id}\``,
      en.checks[id].title,
      `\`${band.key}\``,
      circumstances(band),
      band.quantity,
      en.units[band.unit],
      `\`${formatChain(band.chain)}\``,
      withoutPlate(band.chain),
    ]),
  );
  return (
    GENERATED_HEAD +
    "# Bands\n\n" +
    "The class of a number: `G` good, `M` marginal, `F` fail, `STOP` stop work, read from the lowest value to the highest. Each edge\n" +
    "belongs to one of its two classes, so every number has exactly one. Common practice; edges at the outer ends and some\n" +
    "marginal edges are judgement, set so that the bands close. The unit's plate outranks them, and a band written for one unit\n" +
    "names its own source. `across` is the volts across a 24 V contact, `magnitude` the size without the sign.\n\n" +
    table(["check", "what", "band", "when", "of", "unit", "classes", "where the plate is silent"], rows) +
    GENERATED_FOOT
  );
}

function span(
  limits: { atLeast?: number; above?: number; atMost?: number; below?: number },
  unit = "",
): string {
  return [
    limits.atLeast === undefined ? "" : `${limits.atLeast}${unit} or more`,
    limits.above === undefined ? "" : `above ${limits.above}${unit}`,
    limits.atMost === undefined ? "" : `${limits.atMost}${unit} or less`,
    limits.below === undefined ? "" : `below ${limits.below}${unit}`,
  ]
    .filter(Boolean)
    .join(", ");
}

function describeTrigger(trigger: StopTrigger): string {
  const units = trigger.when ? ` on ${formatVariant(trigger.when)}` : "";
  switch (trigger.on) {
    case "door": {
      const wanted =
        trigger.includes ?? (trigger.is === undefined ? span(trigger) : trigger.is ? "yes" : "no");
      return `at the door, ${trigger.field}: ${wanted}${units}`;
    }
    case "reading":
      return `${trigger.check} ${span(trigger, ` ${en.units[trigger.unit]}`)}${units}`;
    case "finding": {
      const words: Record<string, string> = en.findings[trigger.check];
      return `${trigger.check}: ${words[trigger.finding] ?? trigger.finding}${units}`;
    }
    case "fail":
      return `${trigger.check} fails${units}`;
  }
}

const DUE_WORDS = { all: "always", "going-on": "where work goes on", closing: "before closing" } as const;

function describeAct(act: StopAct, words: Readonly<Record<string, string>>): string {
  const limits = [
    act.seconds === undefined ? "" : `${act.seconds / 60} min`,
    act.check === undefined ? "" : act.check,
    act.pass === undefined ? "" : span(act.pass),
    act.when === undefined ? "" : `on ${formatVariant(act.when)}`,
  ].filter(Boolean);
  const detail = limits.length > 0 ? ` (${limits.join(", ")})` : "";
  return `${words[act.id] ?? act.id}${detail}, ${DUE_WORDS[act.due]}`;
}

/** Every stop rule as a page: what brings it up, what it asks for, where it comes from. */
export function makeStopRulesPage(): string {
  const rows = STOP_RULE_IDS.map((id) => {
    const rule = STOP_RULES[id];
    const words = en.stopRules[id];
    return [
      STOP_RULE_CODES[id],
      words.title,
      words.line,
      STOP_TRIGGERS[id].map(describeTrigger).join("; "),
      rule.stops,
      rule.acts.map((act) => describeAct(act, words.acts)).join("; "),
      en.afterwards[rule.afterwards],
      (rule.closing ?? []).map((closing) => en.closing[closing].title).join(", "),
      rule.provenance,
    ];
  });
  return (
    GENERATED_HEAD +
    "# Stop rules\n\n" +
    "A rule blocks progress until its acts are recorded, and always leaves a way to finish. Any rule may also be raised by hand.\n" +
    "Local law and the company's own rules outrank these.\n\n" +
    table(
      [
        "rule",
        "what",
        "line",
        "brought up by",
        "stops",
        "acts, in order",
        "afterwards",
        "closing checks added",
        "where from",
      ],
      rows,
    ) +
    GENERATED_FOOT
  );
}
