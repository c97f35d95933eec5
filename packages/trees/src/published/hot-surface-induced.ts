import type { FaultId } from "@emberladder/furnace";
import { TREE_FORMAT } from "../document.ts";
import type { TreeDocument, TreeNode } from "../document.ts";
import { burnNodes } from "./hot-surface-burn.ts";
import { draftNodes } from "./hot-surface-draft.ts";
import { ignitionNodes } from "./hot-surface-ignition.ts";
import { powerNodes } from "./hot-surface-power.ts";
import { conclude, handOver } from "./steps.ts";

const parts: TreeNode[] = [...powerNodes, ...draftNodes, ...ignitionNodes, ...burnNodes];

/** Every `is-<fault>` that a part goes to becomes one conclusion. */
function conclusionsOf(nodes: readonly TreeNode[]): TreeNode[] {
  const targets = nodes.flatMap((node) => {
    if (node.kind === "check" || node.kind === "look") {
      return [
        ...node.branches.map((branch) => branch.to),
        node.otherwise,
        ...(node.cannot ? [node.cannot] : []),
      ];
    }
    return node.kind === "do" || node.kind === "go-to" ? [node.to] : [];
  });
  const faults = [...new Set(targets.filter((target) => target.startsWith("is-")))];
  return faults.map((target) => conclude(target.slice(3) as FaultId));
}

/**
 * The procedure for the commonest family: direct hot-surface ignition, induced draft with a pressure switch,
 * integrated board; one or two stages, natural gas or propane. Order of the checks: what settles most for the
 * least minutes and the least live work. Common practice and judgement; no single source.
 */
export const hotSurfaceInducedTree: TreeDocument = {
  format: TREE_FORMAT,
  id: "hot-surface-induced",
  title: "Hot surface, induced draft, integrated board",
  applies: "ign:HSI & draft:IDP & ctl:IFC",
  entries: {
    none: "line-voltage",
    power: "call-w",
    call: "safety-string",
    safeties: "switch-at-rest",
    "draft-rest": "inducer-volts",
    inducer: "tube",
    "draft-proved": "suction",
    prepurge: "igniter-look",
    "ignition-source": "gas-handles",
    gas: "igniter-glow",
    lightoff: "flame-signal",
    "flame-proved": "flame-signal",
    "main-burner": "blower-volts",
    "blower-on": "filter",
    steady: "filter",
    satisfied: "lockout",
    any: "call-w",
    "look:thermostat": "thermostat-set",
    "look:water": "float",
  },
  nodes: [
    ...parts,
    ...conclusionsOf(parts),
    handOver("ask-senior", "senior", "The procedure ends here. Say how high it climbed and what was read."),
    handOver(
      "ask-utility",
      "utility",
      "Gas does not reach the building. Leave the unit off; the utility has to come.",
    ),
    handOver(
      "ask-supplier",
      "supplier",
      "The propane supply fails. Leave the unit off; the supplier has to come.",
    ),
  ],
};
