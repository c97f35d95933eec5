import type { DepartureReason } from "@emberladder/furnace";

/** Reasons for leaving the tree. */
export const departures: Readonly<Record<DepartureReason, string>> = {
  seen: "I can see the fault",
  read: "Already read on this visit",
  "cant-reach": "Cannot reach it",
  "no-tool": "No meter or tool for it here",
  unsafe: "Not safe here or now",
  plate: "Plate or diagram says otherwise",
  "not-fitted": "This unit does not have it",
  history: "The unit's history points elsewhere",
  cheaper: "Another check is quicker and says as much",
  told: "Told to by a senior or the supervisor",
  other: "Other: type it",
};
