import { command, powerOf, stageForCheck } from "@emberladder/diagnosis";
import type { BodyOf, Command, DiagnosisState } from "@emberladder/diagnosis";
import { CATALOGUE_VERSION } from "@emberladder/furnace";
import type { Outcome, ReadingUnit, UnitProfile } from "@emberladder/furnace";
import type { CheckTask } from "./check-task.ts";

export interface GivenAnswer {
  outcome?: Outcome;
  finding?: string;
  value?: number | "OL";
  unit?: ReadingUnit;
  inV?: number;
  outV?: number;
  confirmedUnlikely?: boolean;
  bandUsed?: string;
}

/** The command that records an answer, with its stage, the state of the unit, and what the screen showed. */
export function answerCommand(input: {
  state: DiagnosisState;
  profile: UnitProfile;
  task: CheckTask;
  answer: GivenAnswer;
}): Command {
  const { state, task, answer } = input;
  const { bandUsed, ...given } = answer;
  const { opened } = state;
  const body: BodyOf<"check.answered"> = {
    check: task.check,
    stage: stageForCheck(task.check, task.node?.stage),
    power: powerOf(state.unit),
    ...(task.way ? { way: task.way } : {}),
    ...given,
    ...(state.repairs.length > 0 ? { afterRepair: true } : {}),
    shown: {
      check: task.check,
      ...(task.node ? { treeNode: task.node.id } : {}),
      ...(bandUsed ? { bandUsed } : {}),
      unitState: state.unit,
      versions: {
        catalogue: CATALOGUE_VERSION,
        ...(opened?.tree ? { tree: `${opened.tree.id}@${opened.tree.version}` } : {}),
      },
    },
  };
  return command("check.answered", body);
}
