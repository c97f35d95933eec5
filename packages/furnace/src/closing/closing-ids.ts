/** The checks that prove a unit safe to leave. Common practice. */
export const CLOSING_CHECK_IDS = [
  "close-cycles",
  "close-flame",
  "close-cycle-end",
  "close-room-co",
  "close-panels",
  "close-tstat",
  "close-jumpers",
  "close-docs",
  "close-leak-up",
  "close-leak-down",
  "close-restore",
  "close-inlet-static",
  "close-inlet-run",
  "close-manifold",
  "close-input",
  "close-rise",
  "close-sensor",
  "close-co",
  "close-draft",
  "close-draft-opens",
  "close-safeties",
  "close-cold",
] as const;
export type ClosingCheckId = (typeof CLOSING_CHECK_IDS)[number];

/** Whether a text is the id of a closing check. */
export function isClosingCheckId(id: string): id is ClosingCheckId {
  return CLOSING_CHECK_IDS.some((known) => known === id);
}
