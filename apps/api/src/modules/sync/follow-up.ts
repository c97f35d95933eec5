import { can } from "@emberladder/contract";
import type { Queryable } from "@emberladder/db";
import { profileProblems } from "@emberladder/furnace";
import type { Actor } from "#http/actor.ts";
import type { RequestContext } from "#http/route.ts";
import { toEnqueueJob } from "#modules/jobs/repository.ts";
import { INFORMATIVE_RULES } from "./flags.ts";
import { projectState } from "./judge.ts";
import type { Judged } from "./judge-items.ts";
import type { RecordHead } from "./record-head.ts";
import { listFlagRules, toMoveCall, toReplaceProfile } from "./repository.ts";
import type { DiagnosisRow, SQL } from "./repository.ts";

type Context = RequestContext<Actor>;

/** The columns of a diagnosis that follow from its events. */
export type ProjectedRow = Omit<
  DiagnosisRow,
  | "id"
  | "companyId"
  | "callId"
  | "unitId"
  | "technicianId"
  | "openedAt"
  | "isDemo"
  | "flags"
  | "waitsForRelease"
> &
  // Only set when a report is asked for: afterwards it is a supervisor who ends the waiting.
  Partial<Pick<DiagnosisRow, "waitsForRelease">>;

/**
 * The row of a diagnosis after new events. A closing that asks for a report waits for a supervisor when
 * anything was ever flagged on the record that a customer's report should not pass over.
 */
export async function projectRow(
  db: Queryable,
  { now }: Context,
  { row, before, judged }: { row: DiagnosisRow; before: RecordHead; judged: Judged },
): Promise<ProjectedRow> {
  const after = projectState(judged.head.state);
  let waiting: Pick<ProjectedRow, "waitsForRelease"> = {};
  if (after.wantsReport && !projectState(before.state).wantsReport) {
    const earlier = row.serverSeq === 0 ? [] : await listFlagRules(db, row.id);
    const rules = [...earlier, ...judged.flags.map(({ rule }) => rule)];
    waiting = { waitsForRelease: rules.some((rule) => !INFORMATIVE_RULES.includes(rule)) };
  }
  return {
    serverSeq: judged.head.serverSeq,
    chainHash: judged.head.chainHash,
    lastEventAt: now,
    status: after.isClosed ? "closed" : "open",
    outcome: after.outcome,
    lastStage: after.lastStage,
    closedAt: after.closedAt,
    wantsReport: after.wantsReport,
    ...waiting,
  };
}

/** What else follows from new events: the call, a unit corrected on site, and the job that makes the report. */
export function followUp(
  db: Queryable,
  { actor, now, newId }: Context,
  facts: { row: DiagnosisRow; before: RecordHead; after: RecordHead; isNew: boolean; mustWait: boolean },
): SQL[] {
  const { row } = facts;
  const before = projectState(facts.before.state);
  const after = projectState(facts.after.state);
  const statements: SQL[] = [];
  if (facts.isNew || after.isClosed !== before.isClosed)
    statements.push(toMoveCall(db, row.callId, after.isClosed ? "done" : "under-way", after.closedAt));

  const { confirmed, profile } = facts.after.state;
  const isCorrected =
    confirmed?.changedUnit === true && confirmed.eventId !== facts.before.state.confirmed?.eventId;
  if (isCorrected && profile && can(actor.role, "unit:write") && profileProblems(profile).length === 0)
    statements.push(toReplaceProfile(db, row.companyId, row.unitId, profile));

  if (after.wantsReport && !before.wantsReport && !facts.mustWait)
    statements.push(
      toEnqueueJob(db, {
        id: newId(),
        companyId: row.companyId,
        kind: "report.render",
        payload: { diagnosisId: row.id },
        now,
      }),
    );
  return statements;
}
