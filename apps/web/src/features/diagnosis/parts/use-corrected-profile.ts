import { readUnit } from "@emberladder/contract";
import type { UnitProfile } from "@emberladder/furnace";
import { useQuery } from "@tanstack/react-query";
import { callApi } from "#lib/api-client.ts";

/**
 * The unit's profile as the office has it now, where it differs from the one this diagnosis was opened with:
 * somebody corrected the unit meanwhile. Undefined without a signal or without a difference.
 */
export function useCorrectedProfile(
  unitId: string | undefined,
  pinned: UnitProfile,
): UnitProfile | undefined {
  const { data } = useQuery({
    queryKey: ["unit-as-it-is", unitId],
    queryFn: ({ signal }) => callApi(readUnit, { params: { unitId: unitId ?? "" }, signal }),
    enabled: unitId !== undefined,
    staleTime: 0,
  });
  return data && !isSame(data.profile, pinned) ? data.profile : undefined;
}

/** Whether two profiles say the same, in whatever order their fields stand. */
function isSame(a: unknown, b: unknown): boolean {
  if (typeof a !== "object" || typeof b !== "object" || a === null || b === null) return a === b;
  const keys = new Set([...Object.keys(a), ...Object.keys(b)]);
  return [...keys].every((key) =>
    isSame((a as Record<string, unknown>)[key], (b as Record<string, unknown>)[key]),
  );
}
