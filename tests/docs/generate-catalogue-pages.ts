import { CHECKS, FAULTS, findingsOf, formatVariant } from "@emberladder/furnace";
import type { Check, Fault } from "@emberladder/furnace";
import { en } from "@emberladder/words";
import { GENERATED_FOOT, GENERATED_HEAD, table } from "./markdown.ts";

const FREQUENCY_WORDS = { VC: "very common", C: "common", U: "uncommon", R: "rare" } as const;

const faultName = (id: string): string =>
  (en.faults as Record<string, { name: string }>)[id]?.name ??
  (en.symptoms as Record<string, { name: string }>)[id]?.name ??
  id;

function checkRow(check: Check): (string | number)[] {
  const words = en.checks[check.id];
  return [
    `\`${check.id}\``,
    words.title,
    words.do,
    check.instruments.map((instrument) => en.instruments[instrument]).join(", "),
    check.power.join(", "),
    check.stages.join(", "),
    check.hazards.join(", "),
    check.minutes,
    check.invasive,
    formatVariant(check.applies),
  ];
}

function findingRows(check: Check): string[][] {
  const words: Record<string, string> = en.findings[check.id];
  return findingsOf(check.id).map((finding) => [
    `\`${check.id}\``,
    words[finding.id] ?? finding.id,
    `\`${finding.id}\``,
    finding.classes.join(" or "),
    [
      ...finding.pointsAt.map(faultName),
      ...(finding.also
        ? [`on ${formatVariant(finding.also.when)}: ${finding.also.pointsAt.map(faultName).join(", ")}`]
        : []),
    ].join("; "),
    (finding.stopRules ?? []).join(", "),
  ]);
}

/** Every check of the catalogue as a page: how it is taken, on which units, and what may be found. */
export function makeChecksPage(): string {
  const hazards = Object.entries(en.hazards).map(([code, words]) => [code, words]);
  return (
    GENERATED_HEAD +
    "# Checks\n\n" +
    `${CHECKS.length} checks in the order of a visit. How they are taken is common practice; minutes, set-up, what is opened and how\n` +
    "far a check goes into the unit (0 nothing touched, 1 a cover or a probe, 2 a lead, tube or part moved, 3 gas side opened)\n" +
    "are judgement. `OFF` means locked and proven dead. The unit's own sheet outranks all of it.\n\n" +
    table(
      ["id", "check", "how", "with", "power", "stages", "hazards", "minutes", "into the unit", "units"],
      CHECKS.map(checkRow),
    ) +
    "\n## Findings\n\nWhat may be found at each check, the class it gives, and what it points at. Common practice; the links are judgement.\n\n" +
    table(["check", "finding", "id", "class", "points at", "stop rules"], CHECKS.flatMap(findingRows)) +
    "\n## Hazards\n\n" +
    table(["code", "line above the check"], hazards) +
    GENERATED_FOOT
  );
}

function lastStages({ lastStage }: Fault): string {
  return lastStage
    .map(({ when, stages }) => {
      const condition = when === undefined ? "" : when === "else" ? "else: " : `${formatVariant(when)}: `;
      return condition + stages.join(", ");
    })
    .join("; ");
}

function faultRow(fault: Fault): string[] {
  const words = en.faults[fault.id];
  return [
    `\`${fault.id}\``,
    words.name,
    words.what,
    lastStages(fault),
    fault.decisive
      .map(({ check, findings = [] }) => `${check}${findings.length > 0 ? ` (${findings.join(", ")})` : ""}`)
      .join("; "),
    fault.repairs.map((repair) => en.repairs[repair]).join("; "),
    FREQUENCY_WORDS[fault.frequency],
    [...(fault.stopRules ?? []), ...(fault.shutOff ? ["shut off where it cannot be cured now"] : [])].join(
      ", ",
    ),
    formatVariant(fault.applies),
  ];
}

/** Every fault of the catalogue as a page: where the unit stops, what decides it, what cures it. */
export function makeFaultsPage(): string {
  const symptoms = Object.entries(en.symptoms).map(([id, { name, what }]) => [`\`${id}\``, name, what]);
  return (
    GENERATED_HEAD +
    "# Faults\n\n" +
    `${FAULTS.length} faults. Where a unit with a fault stops, what decides it and what cures it are common practice; how often it is\n` +
    "met is judgement. A last stage is the last one completed: conditions are read in order, and one that is not known adds its\n" +
    "stages and reading goes on.\n\n" +
    table(
      [
        "id",
        "fault",
        "what it is",
        "last stage",
        "decided by",
        "cured by",
        "how often",
        "stop rules",
        "units",
      ],
      FAULTS.map(faultRow),
    ) +
    "\n## Never a cause\n\nSymptoms that a diagnosis has to go on from.\n\n" +
    table(["id", "symptom", "go on to"], symptoms) +
    GENERATED_FOOT
  );
}
