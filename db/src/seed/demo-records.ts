import { command } from "@emberladder/diagnosis";
import { demoCalls } from "./demo-calls.ts";
import { demoId } from "./demo-id.ts";
import { demoCompanies } from "./demo-people.ts";
import type { ReferenceCall } from "./reference-call.ts";
import { referenceCalls } from "./reference-calls.ts";
import type { RecordStep } from "./reference-record.ts";

/** A past diagnosis of the demo: an invented reference call at one of the demo's own units. */
export interface DemoRecord {
  /** Names its rows for ever; ids follow from it. */
  slug: string;
  companyId: string;
  unitId: string;
  /** Who kept it, and by which demo phone. */
  technician: { id: string; name: string; email: string };
  /** Number of the call, before today's. */
  callNumber: number;
  reference: ReferenceCall;
  /** Alters the steps, for an example that a supervisor has to look at. */
  change: (steps: readonly RecordStep[]) => readonly RecordStep[];
}

/** Past calls are numbered from here, below today's. */
const FIRST_PAST_NUMBER = 1081;
/** The day and the unit of the example with too few lights. */
const TWIN = { date: "2026-02-03", unit: "vantongeren" };

/** The demo's past, oldest first: the reference calls, and one that was closed after a single light too few. */
export function demoRecords(): DemoRecord[] {
  const asTheyWere = referenceCalls.map((reference) => ({
    slug: reference.id,
    reference,
    unit: unitOf(reference),
    change: (steps: readonly RecordStep[]) => steps,
  }));
  const [first] = referenceCalls;
  const twins = first
    ? [
        {
          slug: `${first.id}-too-few-lights`,
          reference: { ...first, job: { ...first.job, date: TWIN.date } },
          unit: TWIN.unit,
          change: withoutLights,
        },
      ]
    : [];
  return [...asTheyWere, ...twins]
    .toSorted((a, b) => a.reference.job.date.localeCompare(b.reference.job.date))
    .map(({ unit, ...record }, index) => {
      const company = companyOf(record.reference);
      return {
        ...record,
        companyId: demoId("company", company.slug),
        unitId: demoId("unit", unit),
        technician: technicianOf(company, record.reference),
        callNumber: FIRST_PAST_NUMBER + index,
      };
    });
}

/** A record in which the unit was not lit a second time. */
function withoutLights(steps: readonly RecordStep[]): RecordStep[] {
  return steps.map((step) => {
    const wanted = step.command;
    return wanted.type === "proof.recorded" && wanted.body.closing === "close-cycles"
      ? { ...step, command: command("proof.recorded", { ...wanted.body, value: 1 }) }
      : step;
  });
}

/** The demo's unit of the same customer. */
function unitOf({ id, job }: ReferenceCall): string {
  const found = demoCalls.find(({ customer }) => customer.email === job.customer.email);
  if (!found) throw new Error(`The demo has no unit for the reference call ${id}.`);
  return found.slug;
}

function companyOf({ id, job }: ReferenceCall) {
  const found = demoCompanies.find(({ name }) => name === job.company);
  if (!found) throw new Error(`The demo has no company for the reference call ${id}.`);
  return found;
}

/** Who was on the call, or the company's first technician where the demo does not have that person. */
function technicianOf(company: (typeof demoCompanies)[number], { job }: ReferenceCall) {
  const person =
    company.people.find(({ email }) => email === job.technician.email) ??
    company.people.find(({ role }) => role === "technician");
  if (!person) throw new Error(`${company.name} has no technician.`);
  return { id: demoId("person", person.email), name: person.name, email: person.email };
}
