import type { Observation } from "@emberladder/diagnosis";
import type { CheckId } from "@emberladder/furnace";
import type { AskingNode } from "@emberladder/trees";
import type { ReactNode } from "react";

/** What a check's answer panel needs. */
export interface CheckTask {
  check: CheckId;
  node: AskingNode | undefined;
  way: string | undefined;
  /** What was recorded here before, filled in; undefined where the check is to be taken. */
  given: Observation | undefined;
}

/** Draws an answer panel in the page of its check, with the act that is pinned above the dock. */
export type Frame = (content: ReactNode, pinned?: ReactNode) => ReactNode;
