import type { SequenceEvent, SequenceOutputs } from "./sequence-types.ts";

/** Something the unit does in answer to its control, `afterS` seconds later. */
export interface UnitResponse {
  /** What changes; a newer answer of the same kind takes the place of one that has not come yet. */
  kind: "draft" | "high-draft" | "flame" | "flame-proof";
  afterS: number;
  event: SequenceEvent;
}

/** Answers a change of what is energised. */
export type UnitBehaviour = (now: SequenceOutputs, before: SequenceOutputs) => UnitResponse[];

/**
 * How a unit without a fault answers: the draft switch closes 3 s after the inducer starts and opens 2 s after
 * it stops, gas lights in 1 s on a glowing igniter and is proved 1 s later, and a flame is gone 1 s after the
 * gas. Seconds are common practice: 3 to 30 s to close the switch, at most 4 s from gas to flame.
 */
export const respondAsHealthyUnit: UnitBehaviour = (now, before) => {
  const responses: UnitResponse[] = [];
  if (now.inducer !== "off" && before.inducer === "off") {
    responses.push({ kind: "draft", afterS: 3, event: { type: "DRAFT.closed" } });
  }
  if (now.inducer === "off" && before.inducer !== "off") {
    responses.push({ kind: "draft", afterS: 2, event: { type: "DRAFT.open" } });
  }
  if (now.inducer === "high" && before.inducer !== "high") {
    responses.push({ kind: "high-draft", afterS: 2, event: { type: "HIGH_DRAFT.closed" } });
  }
  if (now.inducer !== "high" && before.inducer === "high") {
    responses.push({ kind: "high-draft", afterS: 1, event: { type: "HIGH_DRAFT.open" } });
  }
  if (now.gas !== "off" && before.gas === "off" && now.igniter) {
    responses.push({ kind: "flame", afterS: 1, event: { type: "FLAME.lit" } });
    responses.push({ kind: "flame-proof", afterS: 2, event: { type: "FLAME.proved" } });
  }
  if (now.gas === "off" && before.gas !== "off") {
    responses.push({ kind: "flame", afterS: 1, event: { type: "FLAME.lost" } });
  }
  return responses;
};
