import rodCoated from "./reference-calls/01-rod-coated.json" with { type: "json" };
import openSeam from "./reference-calls/06-open-seam-shut-off.json" with { type: "json" };
import forgottenFilter from "./reference-calls/10-forgotten-filter.json" with { type: "json" };
import type { ReferenceCall } from "./reference-call.ts";

/**
 * The invented reference calls of hot-surface units that the demo shows as its past, by the day. They are part
 * of the program, so that a built server needs no file beside it. A test plays them through every rule, which
 * is more than the types of a JSON file could say.
 */
export const referenceCalls: readonly ReferenceCall[] = [rodCoated, openSeam, forgottenFilter].map(
  (call) => call as unknown as ReferenceCall,
);
