import { treeFlagsOf } from "@emberladder/api/src/modules/sync/tree-step-flags.ts";
import { evolve, initialState, parseBody, treePosition } from "@emberladder/diagnosis";
import type { DiagnosisState } from "@emberladder/diagnosis";
import { demoCalls } from "@emberladder/db/seed";
import { hotSurfaceInducedTree, isAsking } from "@emberladder/trees";
import type { AskingNode, TreeNode } from "@emberladder/trees";
import fc from "fast-check";
import { describe, expect, it } from "vitest";

/*
 * SEC-12. The walk of the shipped tree, replayed from the record alone. That an application checks the order of the steps
 * of a procedure on its server is ASVS 2.3.1 (from memory).
 */
const tree = hotSurfaceInducedTree;
const profile = demoCalls[0]?.profile;
const asking = tree.nodes.filter(isAsking);

const idOf = (index: number) => `00000000-0000-7000-8000-${String(index + 1).padStart(12, "0")}`;
const add = (state: DiagnosisState, type: string, body: unknown): DiagnosisState =>
  evolve(state, {
    id: idOf(state.log.length),
    type,
    schemaVersion: 1,
    body,
    occurredAt: 0,
    deviceId: "d",
    deviceSeq: state.log.length + 1,
  });
const read = (type: string, body: unknown) => {
  const parsed = parseBody(type, 1, body);
  if (!parsed.ok || !parsed.known) throw new Error(`${type} cannot be read.`);
  return { kind: "known", event: parsed.event } as const;
};
const opening = {
  callId: idOf(900),
  unitId: idOf(901),
  profile,
  tree: { id: idOf(902), version: 1, hash: "a".repeat(64) },
  catalogueVersion: "1",
  modelVersion: "1",
};
const opened = () => add(initialState, "diagnosis.opened", opening);

/** An event that takes a node, by the n-th of the ways out of it. */
const takeNode = (node: TreeNode, way: number): [string, Record<string, unknown>] => {
  if (node.kind === "do") return ["tree.step-done", { treeNode: node.id }];
  if (!isAsking(node)) throw new Error(`Nothing is recorded at ${node.id}.`);
  if (way === 0) return ["check.declined", { check: node.check, reason: "no-access", treeNode: node.id }];
  return ["check.answered", answerOf(node, way)];
};
const answerOf = (node: AskingNode, way: number) => {
  const branch = node.branches[way % (node.branches.length + 1)];
  const given =
    branch?.on === "finding"
      ? { finding: branch.finding }
      : branch?.on === "class"
        ? { outcome: branch.outcome }
        : branch?.on === "range"
          ? { value: branch.min ?? (branch.max ?? 0) - 1, unit: branch.unit }
          : {};
  return { check: node.check, stage: "any", power: "any", ...given, shown: { treeNode: node.id } };
};
/** Walks as the screens do: at each node one of its ways, until the tree has no step to record. */
const walk = (
  ways: readonly number[],
  visit: (state: DiagnosisState, node: TreeNode, way: number) => void,
) => {
  let state = opened();
  for (const way of ways) {
    const { node } = treePosition(tree, state);
    if (!node || (node.kind !== "do" && !isAsking(node))) return;
    visit(state, node, way);
    const [type, body] = takeNode(node, way);
    state = add(state, type, body);
  }
};
const anyWays = fc.array(fc.nat(12), { minLength: 1, maxLength: 25 });

describe("steps of a pinned tree", () => {
  it("are never flagged where each is the step that was due", () => {
    let steps = 0;
    fc.assert(
      fc.property(anyWays, (ways) => {
        walk(ways, (state, node, way) => {
          steps += 1;
          expect(treeFlagsOf(state, read(...takeNode(node, way)), tree)).toEqual([]);
        });
      }),
      { seed: 12, numRuns: 300 },
    );
    expect(steps).toBeGreaterThan(500);
  });

  it("are flagged with the step that was due where any other step is named", () => {
    fc.assert(
      fc.property(anyWays, fc.nat(asking.length - 1), (ways, other) => {
        walk(ways, (state, node, way) => {
          const wrong = asking[other];
          if (!wrong || wrong.id === node.id) return;
          expect(treeFlagsOf(state, read(...takeNode(wrong, way)), tree)).toEqual([
            { rule: "tree-step-unreachable", params: { step: wrong.id, due: node.id } },
          ]);
        });
      }),
      { seed: 12, numRuns: 300 },
    );
  });

  it("are flagged after the tree was left, until it is entered again", () => {
    const start = opened();
    const { node } = treePosition(tree, start);
    if (!node) throw new Error("The tree has a beginning.");
    const left = add(start, "tree.left", { treeNode: node.id, reason: "seen-before" });
    expect(treeFlagsOf(left, read(...takeNode(node, 1)), tree)).toMatchObject([
      { rule: "tree-step-unreachable", params: { due: "" } },
    ]);
    const back = add(left, "tree.entered", { treeNode: node.id });
    expect(treeFlagsOf(back, read(...takeNode(node, 1)), tree)).toEqual([]);
  });

  it("are not judged off the tree, nor where there is no document", () => {
    const state = opened();
    const offTree = read("check.answered", { check: "ck-filter", stage: "any", power: "any" });
    expect(treeFlagsOf(state, offTree, tree)).toEqual([]);
    const [first] = asking;
    if (!first) throw new Error("The tree asks for something.");
    expect(treeFlagsOf(state, read("check.answered", answerOf(first, 1)), null)).toEqual([]);
  });

  it("cannot be judged where the opening pins a version that there is not, and that is flagged", () => {
    expect(treeFlagsOf(initialState, read("diagnosis.opened", opening), null)).toEqual([
      { rule: "tree-unknown" },
    ]);
    expect(treeFlagsOf(initialState, read("diagnosis.opened", opening), tree)).toEqual([]);
  });
});
