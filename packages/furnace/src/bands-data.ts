import { airBands } from "./bands-data-air.ts";
import { callBands } from "./bands-data-call.ts";
import { draftBands } from "./bands-data-draft.ts";
import { gasBands } from "./bands-data-gas.ts";
import { ignitionBands } from "./bands-data-ignition.ts";
import { supplyBands } from "./bands-data-supply.ts";
import type { Band } from "./bands-types.ts";

/**
 * Every band of the catalogue. All are defaults: the unit's plate, its instructions and local codes outrank
 * them, and any may be overridden for one unit with its source.
 */
export const BANDS: readonly Band[] = [
  ...supplyBands,
  ...callBands,
  ...draftBands,
  ...ignitionBands,
  ...gasBands,
  ...airBands,
];
