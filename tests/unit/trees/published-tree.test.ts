import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { CHECK_IDS, OPTION_FLAGS, findingsOf, getCheck, isCheckId, mayApply } from "@emberladder/furnace";
import type { CheckId, Options } from "@emberladder/furnace";
import {
  TREE_FORMAT,
  afterAnswer,
  afterDeclined,
  afterDone,
  hotSurfaceInducedTree,
  isAsking,
  kindsOf,
  lintTree,
  possibleAnswers,
  readApplies,
  settleNode,
  treeConclusions,
  treeDocumentSchema,
} from "@emberladder/trees";
import type { TreeAnswer, TreeDocument, TreeNode, TreeUnit } from "@emberladder/trees";
import { ask, everyEntry, senior } from "./build-tree.ts";

const published = hotSurfaceInducedTree;
const applies = readApplies(published);
const kinds = applies ? kindsOf(applies) : [];

const options: fc.Arbitrary<Options> = fc.dictionary(fc.constantFrom(...OPTION_FLAGS), fc.boolean(), {
  maxKeys: 12,
});
const unitOf = (codes: typeof kinds): fc.Arbitrary<TreeUnit> =>
  fc.record({ codes: fc.constantFrom(...codes), options });

/** Walks a tree by numbers that choose the answers, and returns the nodes shown. */
function walk(tree: TreeDocument, entry: string, choices: readonly number[], unit: TreeUnit): TreeNode[] {
  const shown: TreeNode[] = [];
  let node = settleNode(tree, entry, unit);
  for (let at = 0; node && shown.length <= tree.nodes.length; at++) {
    shown.push(node);
    if (node.kind === "do") node = afterDone(tree, node.id, unit);
    else if (!isAsking(node)) break;
    else {
      const answers = possibleAnswers(node);
      const chosen = answers[(choices[at % choices.length] ?? 0) % answers.length];
      const { evidence, branch } = chosen ?? { evidence: null };
      const value =
        branch?.on === "range" ? { value: branch.min ?? (branch.max ?? 0) - 1, unit: branch.unit } : {};
      node = evidence
        ? afterAnswer(tree, node.id, { ...(evidence as TreeAnswer), ...value }, unit)
        : afterDeclined(tree, node.id, unit);
    }
  }
  return shown;
}

function cannotAnswer(node: TreeNode, unit: TreeUnit): boolean {
  if (!isAsking(node) || !isCheckId(node.check)) return false;
  return !mayApply(getCheck(node.check).applies, unit.codes, unit.options);
}

const choices = fc.array(fc.nat(40), { minLength: 30, maxLength: 60 });

describe("the published tree for hot-surface induced-draft units", () => {
  it("is a document of the format, with no error in the lint", () => {
    expect(treeDocumentSchema.safeParse(published).success).toBe(true);
    const problems = lintTree(published);
    const warnings = problems.filter(({ severity }) => severity === "warning");
    process.stdout.write(`published tree: ${published.nodes.length} nodes, ${warnings.length} warnings\n`);
    expect(problems.filter(({ severity }) => severity === "error")).toEqual([]);
  });

  it("concludes at least 30 faults", () => {
    const faults = treeConclusions(published);
    process.stdout.write(`published tree: concludes ${faults.length} faults\n`);
    expect(faults.length).toBeGreaterThanOrEqual(30);
  });

  it("is for one and two stages and modulating, natural gas and propane, in every place", () => {
    expect(kinds).toHaveLength(3 * 2 * 3);
    expect(new Set(kinds.map(({ fuel }) => fuel))).toEqual(new Set(["NG", "LP"]));
  });

  it("ends every walk of every unit at a conclusion or a hand-over, whatever is answered", () => {
    const entries = fc.constantFrom(...Object.values(published.entries));
    fc.assert(
      fc.property(entries, choices, unitOf(kinds), (entry, chosen, unit) => {
        const shown = walk(published, entry, chosen, unit);
        expect(shown.length).toBeLessThan(40);
        expect(["conclude", "hand-over"]).toContain(shown.at(-1)?.kind);
        expect(shown.filter((node) => cannotAnswer(node, unit))).toEqual([]);
      }),
      { numRuns: 2000 },
    );
  });

  it("asks for no propane tank on natural gas, and for one on propane", () => {
    const [gas, propane] = (["NG", "LP"] as const).map((fuel) => kinds.find((codes) => codes.fuel === fuel));
    expect(gas && settleNode(published, "tank", { codes: gas, options: {} })?.id).toBe("ask-utility");
    expect(propane && settleNode(published, "tank", { codes: propane, options: {} })?.id).toBe("tank");
  });

  it("asks for the float switch unless the unit states that it has none", () => {
    const [codes] = kinds;
    const at = (unitOptions: Options) =>
      codes && settleNode(published, "float", { codes, options: unitOptions })?.id;
    expect(at({})).toBe("float");
    expect(at({ overflow: true })).toBe("float");
    expect(at({ overflow: false, "condensate-pump": false })).toBe("safety-string");
  });

  // The taps of the three fast calls depend on these two parts of the tree.
  it("takes a low flame signal to the sensor, off and out, and a cracked igniter straight to its cause", () => {
    const lit = settleNode(published, published.entries["lightoff"]);
    expect(lit?.id).toBe("flame-signal");
    const off = afterAnswer(published, "flame-signal", { outcome: "fail", finding: "low" });
    expect(off).toMatchObject({ kind: "do", id: "sensor-off" });
    expect(afterDone(published, "sensor-off")).toMatchObject({
      kind: "conclude",
      fault: "flame-sensor-dirty",
    });
    const dark = settleNode(published, published.entries["prepurge"]);
    expect(dark).toMatchObject({ id: "igniter-look", way: "power-off" });
    expect(afterAnswer(published, "igniter-look", { outcome: "fail", finding: "cracked" })).toMatchObject({
      kind: "conclude",
      fault: "igniter-broken",
    });
  });
});

describe("any tree", () => {
  const allKinds = kindsOf({ all: true });

  /** Trees without a circle: each step leads only to later ones, and the last is the senior. */
  const anyTree: fc.Arbitrary<TreeDocument> = fc
    .array(
      fc.record({
        check: fc.constantFrom(...CHECK_IDS),
        seed: fc.array(fc.nat(1000), { minLength: 40, maxLength: 40 }),
      }),
      {
        minLength: 2,
        maxLength: 14,
      },
    )
    .map((steps) => ({
      format: TREE_FORMAT,
      id: "any-tree",
      title: "Any tree",
      applies: "all",
      entries: everyEntry("step-0"),
      nodes: [...steps.map(({ check, seed }, index) => anyStep(check, seed, index, steps.length)), senior],
    }));

  function anyStep(check: CheckId, seed: readonly number[], index: number, count: number): TreeNode {
    let used = 0;
    const later = () => {
      const to = index + 1 + ((seed[used++ % seed.length] ?? 0) % (count - index));
      return to >= count ? "senior" : `step-${to}`;
    };
    const branches = findingsOf(check).map(({ id }) => ({
      on: "finding" as const,
      finding: id,
      to: later(),
    }));
    return ask(`step-${index}`, check, { branches, otherwise: later(), cannot: later() });
  }

  it("walked to any end never shows a question that the unit cannot answer", () => {
    let passedOver = 0;
    fc.assert(
      fc.property(anyTree, choices, unitOf(allKinds), (tree, chosen, unit) => {
        const shown = walk(tree, "step-0", chosen, unit);
        passedOver += tree.nodes.filter((node) => cannotAnswer(node, unit)).length;
        expect(shown.filter((node) => cannotAnswer(node, unit))).toEqual([]);
        expect(shown.at(-1)?.kind).toBe("hand-over");
      }),
      { numRuns: 500 },
    );
    // The property says something only where there was something to pass over.
    expect(passedOver).toBeGreaterThan(100);
  });
});
