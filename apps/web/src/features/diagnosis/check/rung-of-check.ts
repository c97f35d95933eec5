import { stageForCheck } from "@emberladder/diagnosis";
import { STAGES } from "@emberladder/furnace";
import type { CheckId, Stage } from "@emberladder/furnace";
import type { AskingNode } from "@emberladder/trees";

/** The rung a check belongs to, for the notch on the strip; undefined where it is tied to none. */
export function rungOfCheck(check: CheckId, node: AskingNode | undefined): Stage | undefined {
  const stage = stageForCheck(check, node?.stage);
  return STAGES.find((candidate) => candidate === stage);
}
