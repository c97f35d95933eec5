import type { Company } from "@emberladder/contract";
import type { companies } from "@emberladder/db";

/** A company as clients see it. */
export function presentCompany(row: typeof companies.$inferSelect): Company {
  const { id, name, timeZone, altitudeRule, unitsShown, mode } = row;
  return { id, name, timeZone, altitudeRule, unitsShown, mode };
}
