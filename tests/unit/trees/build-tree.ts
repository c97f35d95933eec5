import { TREE_FORMAT } from "@emberladder/trees";
import type { AskingNode, TreeDocument, TreeNode } from "@emberladder/trees";

/** A small sound tree for tests: one reading that settles a dirty flame sensor, else a senior. */
export function buildTree(overrides: Partial<TreeDocument> = {}): TreeDocument {
  return {
    format: TREE_FORMAT,
    id: "test-tree",
    title: "A tree for tests",
    applies: "ign:HSI & draft:IDP & ctl:IFC & fuel:NG",
    entries: everyEntry("signal"),
    nodes: [
      ask("signal", "ck-flame-current", {
        branches: [
          { on: "finding", finding: "low", to: "dirty" },
          { on: "class", outcome: "good", to: "ground" },
        ],
      }),
      ask("ground", "ck-burner-ground", { branches: [{ on: "finding", finding: "high", to: "bad-ground" }] }),
      { kind: "conclude", id: "dirty", fault: "flame-sensor-dirty" },
      { kind: "conclude", id: "bad-ground", fault: "poor-ground" },
      senior,
    ],
    ...overrides,
  };
}

export const senior: TreeNode = { kind: "hand-over", id: "senior", whom: "senior", say: "Ask a senior." };

/** A step that asks for a check; whatever is not said goes to the senior. */
export function ask(id: string, check: string, more: Partial<AskingNode> = {}): AskingNode {
  return { kind: "check", id, check, branches: [], otherwise: "senior", ...more };
}

/** Entries for every place where a direct hot-surface unit can stop, all to one node. */
export function everyEntry(to: string): TreeDocument["entries"] {
  const keys = ["none", "power", "call", "safeties", "draft-rest", "inducer", "prepurge", "ignition-source"];
  const more = ["gas", "lightoff", "flame-proved", "main-burner", "blower-on", "steady", "any"];
  return Object.fromEntries([...keys, ...more].map((key) => [key, to]));
}

/** The sound tree with one of its nodes changed or added, so that a test seeds one fault. */
export function buildTreeWith(...nodes: TreeNode[]): TreeDocument {
  const tree = buildTree();
  const ids = new Set(nodes.map((node) => node.id));
  return { ...tree, nodes: [...tree.nodes.filter((node) => !ids.has(node.id)), ...nodes] };
}
