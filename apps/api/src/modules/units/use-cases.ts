import type { createUnit, InputOf, updateUnit } from "@emberladder/contract";
import { profileProblems } from "@emberladder/furnace";
import type { UnitProfile } from "@emberladder/furnace";
import type { Actor } from "#http/actor.ts";
import { ApiError, found } from "#http/api-error.ts";
import type { RequestContext } from "#http/route.ts";
import { writeAudit } from "#modules/audit/repository.ts";
import { presentSite, presentUnit } from "#modules/customers/present-place.ts";
import { findSite } from "#modules/customers/repository.ts";
import { presentOpenShutOff, presentSummary } from "#modules/diagnoses/present-diagnosis.ts";
import { listLastClosedOfUnits, listSummaries } from "#modules/diagnoses/summaries/repository.ts";
import { findUnitPlace, insertUnit, updateUnitRow } from "./repository.ts";

type Context = RequestContext<Actor>;

/** Diagnoses shown in a unit's history at most. */
const HISTORY_LENGTH = 50;

/** A unit with its site, history and any open shut-off record. @throws ApiError `not-found`. */
export async function readUnitDetail({ database, actor }: Context, unitId: string) {
  const { companyId } = actor;
  const { unit, site, customerFirstName } = found(await findUnitPlace(database, companyId, unitId));
  const [history, lastClosed] = await Promise.all([
    listSummaries(database, { companyId, unitId }, 1, HISTORY_LENGTH),
    listLastClosedOfUnits(database, companyId, [unitId]),
  ]);
  return {
    ...presentUnit(unit),
    site: presentSite(site),
    customerFirstName,
    openShutOff: presentOpenShutOff(lastClosed.get(unitId)),
    history: history.rows.map(presentSummary),
  };
}

/** Adds a unit to a site. @throws ApiError `not-found`, `profile-impossible`. */
export async function addUnit(context: Context, body: InputOf<typeof createUnit>["body"]) {
  const { database, actor, now, newId } = context;
  const site = found(await findSite(database, actor.companyId, body.siteId));
  refuseImpossible(body.profile);
  const unitId = newId();
  await insertUnit(database, {
    id: unitId,
    companyId: actor.companyId,
    siteId: site.id,
    name: body.name,
    profile: body.profile,
    createdAt: now,
  });
  await audit(context, "unit.created", unitId);
  return readUnitDetail(context, unitId);
}

/** Corrects a unit. @throws ApiError `not-found`, `profile-impossible`, `changed-meanwhile`. */
export async function correctUnit(
  context: Context,
  unitId: string,
  { version, ...change }: InputOf<typeof updateUnit>["body"],
) {
  const { database, actor } = context;
  found(await findUnitPlace(database, actor.companyId, unitId));
  if (change.profile) refuseImpossible(change.profile);
  const isChanged = await updateUnitRow(database, { companyId: actor.companyId, unitId, version }, change);
  if (!isChanged) throw new ApiError("changed-meanwhile");
  await audit(context, "unit.updated", unitId);
  return readUnitDetail(context, unitId);
}

function refuseImpossible(profile: UnitProfile): void {
  const problems = profileProblems(profile);
  if (problems.length === 0) return;
  throw new ApiError("profile-impossible", {
    fields: problems.map(({ field, reason }) => ({
      pointer: `/profile/${field.replaceAll(".", "/")}`,
      detail: reason,
    })),
  });
}

async function audit(context: Context, action: string, subjectId: string): Promise<void> {
  const { companyId, personId: actorId } = context.actor;
  await writeAudit(context.database, context, { action, companyId, actorId, subjectId });
}
