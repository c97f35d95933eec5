import type { DiagnosisState, RecordedEvent } from "../state/diagnosis-state.ts";

/** Steps that a person may want to take back at once; an undo of an undo is a new answer instead. */
const UNDOABLE = new Set([
  "door.answered",
  "unit.confirmed",
  "look.answered",
  "watch.seen",
  "watch.ended",
  "watch.skipped",
  "check.answered",
  "check.declined",
  "tree.step-done",
  "tree.left",
  "cause.concluded",
  "repair.recorded",
  "put-back.restored",
  "proof.recorded",
]);

/** The newest step that stands and can be taken back; undefined after closing. */
export function lastUndoable(state: DiagnosisState): RecordedEvent | undefined {
  if (state.closed) return undefined;
  return state.log.findLast((event) => UNDOABLE.has(event.type) && state.undone[event.id] === undefined);
}
