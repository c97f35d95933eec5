import type { ReportContent } from "@emberladder/contract";
import type { DiagnosisState } from "@emberladder/diagnosis";
import { en } from "@emberladder/words";
import { formatMoment } from "#modules/mail/format-moment.ts";
import type { ReportSubject } from "./repository.ts";
import {
  AFTER_REPAIR,
  CAUTION_WORDS,
  NEXT_WORDS,
  NOT_PROVEN,
  NOTHING_DONE,
  OVER_RANGE,
  PART_FITTED,
  PART_ORDERED,
  SAFE_WORDS,
  VERDICT_WORDS,
} from "./report-words.ts";

type Words = Readonly<Record<string, unknown>>;

/** The word of an id, or the id in plain letters where this build has no word for it. */
function wordOf(words: Words, id: string, field?: string): string {
  const found = Object.hasOwn(words, id) ? words[id] : undefined;
  const text = field === undefined ? found : (found as Words | undefined)?.[field];
  return typeof text === "string" ? text : id.replaceAll("-", " ");
}

/**
 * The customer's report of a closed diagnosis, in words.
 * @param subject names and places, which the record itself does not hold
 */
export function buildReportContent(state: DiagnosisState, subject: ReportSubject): ReportContent {
  const outcome = state.closed?.outcome ?? "not-found";
  const timeZone = subject.site.timeZone ?? subject.company.timeZone;
  return {
    companyName: subject.company.name,
    isDemo: subject.diagnosis.isDemo,
    callNumber: subject.callNumber,
    customerFirstName: subject.customerFirstName,
    siteAddress: [subject.site.address, subject.site.town, subject.site.region, subject.site.postalCode]
      .filter(Boolean)
      .join(", "),
    unitName: subject.unitName,
    technicianName: subject.technicianName,
    visited: formatMoment(subject.diagnosis.openedAt, timeZone),
    complaint: subject.complaint,
    found: describeFound(state),
    done: describeDone(state),
    measured: describeMeasured(state),
    safe: SAFE_WORDS[outcome],
    next: NEXT_WORDS[outcome],
    cautions: CAUTION_WORDS,
    recordHash: subject.diagnosis.chainHash,
  };
}

function describeFound({ conclusion }: DiagnosisState): string[] {
  if (!conclusion || !conclusion.proven) return [NOT_PROVEN];
  return [conclusion.cause, ...(conclusion.also ?? [])].map((fault) => wordOf(en.faults, fault, "plain"));
}

function describeDone({ repairs }: DiagnosisState): string[] {
  const done = repairs.flatMap((repair) => [
    ...repair.done.map((id) => wordOf(en.repairs, id)),
    ...repair.parts.map(
      ({ part, quantity, state }) =>
        `${quantity > 1 ? `${quantity} x ` : ""}${wordOf(en.parts, part)} ${state === "fitted" ? PART_FITTED : PART_ORDERED}`,
    ),
  ]);
  return done.length > 0 ? done : [NOTHING_DONE];
}

function describeMeasured({ observations, proofs }: DiagnosisState): ReportContent["measured"] {
  const readings = observations.flatMap(({ check, value, unit, outcome, shown, afterRepair }) => {
    if (value === undefined) return [];
    const title = wordOf(en.checks, check, "title");
    return [
      {
        what: afterRepair === true ? `${title}, ${AFTER_REPAIR}` : title,
        reading: describeReading(value, unit),
        expected: shown?.bandUsed ?? "",
        verdict: outcome === undefined ? "" : VERDICT_WORDS[outcome],
      },
    ];
  });
  const closing = Object.values(proofs).flatMap(({ closing: id, value, unit }) =>
    value === undefined
      ? []
      : [
          {
            what: wordOf(en.closing, id, "title"),
            reading: describeReading(value, unit),
            expected: wordOf(en.closing, id, "right"),
            verdict: "",
          },
        ],
  );
  return [...readings, ...closing];
}

function describeReading(value: number | "OL", unit: string | undefined): string {
  if (value === "OL") return OVER_RANGE;
  const digits = String(Math.round(value * 1000) / 1000);
  return unit === undefined ? digits : `${digits} ${wordOf(en.units, unit)}`;
}
