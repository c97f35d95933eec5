import { can } from "@emberladder/contract";
import type { Transaction } from "@emberladder/db";
import { profileProblems } from "@emberladder/furnace";
import type { Actor } from "#http/actor.ts";
import type { RequestContext } from "#http/route.ts";
import { enqueueJob } from "#modules/jobs/repository.ts";
import { INFORMATIVE_RULES } from "./flags.ts";
import { projectState } from "./judge.ts";
import type { Judged } from "./judge-items.ts";
import type { RecordHead } from "./record-head.ts";
import { listFlagRules, moveCall, replaceProfile } from "./repository.ts";
import type { DiagnosisRow } from "./repository.ts";

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
  tx: Transaction,
  { now }: Context,
  { row, before, judged }: { row: DiagnosisRow; before: RecordHead; judged: Judged },
): Promise<ProjectedRow> {
  const after = projectState(judged.head.state);
  let waiting: Pick<ProjectedRow, "waitsForRelease"> = {};
  if (after.wantsReport && !projectState(before.state).wantsReport) {
    const earlier = row.serverSeq === 0 ? [] : await listFlagRules(tx, row.id);
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
export async function followUp(
  tx: Transaction,
  { actor, now, newId }: Context,
  facts: { row: DiagnosisRow; before: RecordHead; after: RecordHead; isNew: boolean; mustWait: boolean },
): Promise<void> {
  const { row } = facts;
  const before = projectState(facts.before.state);
  const after = projectState(facts.after.state);
  if (facts.isNew || after.isClosed !== before.isClosed)
    await moveCall(tx, row.callId, after.isClosed ? "done" : "under-way", after.closedAt);

  const { confirmed, profile } = facts.after.state;
  const isCorrected =
    confirmed?.changedUnit === true && confirmed.eventId !== facts.before.state.confirmed?.eventId;
  if (isCorrected && profile && can(actor.role, "unit:write") && profileProblems(profile).length === 0)
    await replaceProfile(tx, row.companyId, row.unitId, profile);

  if (after.wantsReport && !before.wantsReport && !facts.mustWait)
    await enqueueJob(tx, {
      id: newId(),
      companyId: row.companyId,
      kind: "report.render",
      payload: { diagnosisId: row.id },
      now,
    });
}
