import type { CheckId } from "./checks/check-ids.ts";
import type { WayId } from "./checks/check-types.ts";
import type { ReadingUnit } from "./codes.ts";
import type { Chain, PlateFigure } from "./bands-chain.ts";
import type { VariantExpr } from "./variant.ts";

/** Figures that a percentage is of; `transformerAmps` is the transformer's VA over 24 V. */
export type PercentBase = "ratedVolts" | "transformerAmps" | "inducerFlaA" | "blowerFlaA";

/**
 * One band of a check: the classes of its number under stated circumstances. Every circumstance that is given
 * has to hold; of the bands that hold, the first one of a unit counts.
 */
export interface Band {
  readonly check: CheckId;
  /** Short name of the circumstance, unique within the check; an override of a unit names it. */
  readonly key: string;
  readonly unit: ReadingUnit;
  /**
   * What is classed: the value, its size without the sign, or the volts across a 24 V contact, which are
   * In V less Out V.
   */
  readonly quantity: "value" | "magnitude" | "across";
  readonly chain: Chain;
  readonly when?: VariantExpr;
  /** 120 V, also where the plate does not say, or anything else. */
  readonly supply?: "120 V" | "other";
  /** Secondary volts with nothing pulled in, or later in the call. */
  readonly load?: "idle" | "loaded";
  readonly power?: "ON" | "OFF";
  readonly place?: "at-rest" | "at-speed";
  /** Volts of the igniter's element. */
  readonly element?: 120 | 80 | 24;
  /** Kind of a line-voltage igniter; `unstated` where the plate does not say. */
  readonly igniter?: "SiC" | "SiN" | "unstated";
  /** Fire the manifold is read at; a modulating unit only at a commanded rate. */
  readonly fire?: "high" | "low";
  /** Holds only where the plate states all of these. */
  readonly needsPlate?: readonly PlateFigure[];
  /** Which of the check's readings, or ways of taking it, is meant. */
  readonly way?: WayId;
  /** Percent bands: what they are percent of, so that volts and amps can be classed too. */
  readonly percentOf?: PercentBase;
}
