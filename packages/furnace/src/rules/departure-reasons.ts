/** Reasons for leaving the tree, one tap each; only `other` is typed. */
export const DEPARTURE_REASONS = [
  "seen",
  "read",
  "cant-reach",
  "no-tool",
  "unsafe",
  "plate",
  "not-fitted",
  "history",
  "cheaper",
  "told",
  "other",
] as const;
export type DepartureReason = (typeof DEPARTURE_REASONS)[number];

/** Reasons that also say why a check cannot be done here. */
export const CANNOT_REASONS: readonly DepartureReason[] = [
  "cant-reach",
  "no-tool",
  "unsafe",
  "not-fitted",
  "other",
];

/** Whether a text is a reason for leaving the tree. */
export function isDepartureReason(id: string): id is DepartureReason {
  return DEPARTURE_REASONS.some((reason) => reason === id);
}
