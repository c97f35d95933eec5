export * from "./envelope.ts";
export * from "./events/fields.ts";
export * from "./events/index.ts";
export { TOUCH_ROWS, OUTCOMES_OF_VISIT, type VisitOutcome } from "./events/closing-events.ts";
export * from "./state/diagnosis-state.ts";
export * from "./state/evolve.ts";
export * from "./derive/ladder.ts";
export * from "./derive/rung-of-device.ts";
export * from "./derive/tree-position.ts";
