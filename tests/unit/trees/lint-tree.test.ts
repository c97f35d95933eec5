import { describe, expect, it } from "vitest";
import { TREE_RULES, lintTree, treeConclusions } from "@emberladder/trees";
import type { TreeDocument, TreeNode, TreeProblem, TreeRule } from "@emberladder/trees";
import { ask, buildTree, buildTreeWith, everyEntry, senior } from "./build-tree.ts";

const found = (tree: TreeDocument, rule: TreeRule): TreeProblem[] =>
  lintTree(tree).filter((problem) => problem.rule === rule);

/** The signal step of the sound tree, with more or other branches. */
const signal = (branches: ReturnType<typeof ask>["branches"], more: Parameters<typeof ask>[2] = {}) =>
  ask("signal", "ck-flame-current", { branches, ...more });
const toDirty = { on: "finding", finding: "low", to: "dirty" } as const;
const toGround = { on: "class", outcome: "good", to: "ground" } as const;

describe("a sound tree", () => {
  it("has no problems", () => {
    expect(lintTree(buildTree())).toEqual([]);
  });

  it("tells what it concludes, each fault once and only where it can be reached", () => {
    const unreached: TreeNode = { kind: "conclude", id: "never", fault: "igniter-broken" };
    expect(treeConclusions(buildTreeWith(unreached))).toEqual(["flame-sensor-dirty", "poor-ground"]);
  });
});

/** UX-13 and UX-14 among them: every question has a way past it, and none comes twice. One fault for each: the rule that has to name it, where, and how heavily. */
const SEEDED: [TreeRule, TreeDocument, string | undefined, TreeProblem["severity"]][] = [
  ["applies-unreadable", buildTree({ applies: "ign:HSX" }), undefined, "error"],
  ["applies-to-no-unit", buildTree({ applies: "ign:SP & draft:CON" }), undefined, "error"],
  ["duplicate-id", { ...buildTree(), nodes: [...buildTree().nodes, senior] }, "senior", "error"],
  ["target-missing", buildTreeWith(signal([toDirty, toGround], { otherwise: "nowhere" })), "signal", "error"],
  ["target-missing", buildTree({ entries: { ...everyEntry("signal"), gas: "nowhere" } }), undefined, "error"],
  [
    "unreachable",
    buildTreeWith({ kind: "conclude", id: "never", fault: "igniter-broken" }),
    "never",
    "warning",
  ],
  [
    "go-to-loop",
    buildTreeWith(
      signal([toDirty, toGround], { otherwise: "one" }),
      { kind: "go-to", id: "one", to: "two" },
      { kind: "go-to", id: "two", to: "one" },
    ),
    "one",
    "error",
  ],
  [
    "cycle-without-act",
    buildTreeWith(ask("ground", "ck-burner-ground", { otherwise: "signal", cannot: "senior" })),
    "signal",
    "error",
  ],
  [
    "asked-twice",
    buildTreeWith(
      ask("ground", "ck-burner-ground", { otherwise: "signal-again" }),
      ask("signal-again", "ck-flame-current"),
    ),
    "signal-again",
    "error",
  ],
  ["check-unknown", buildTreeWith(ask("ground", "ck-feeling")), "ground", "error"],
  ["check-cannot-apply", buildTreeWith(ask("ground", "ck-thermocouple-open")), "ground", "error"],
  ["way-unknown", buildTreeWith(ask("ground", "ck-burner-ground", { way: "by-ear" })), "ground", "error"],
  [
    "stage-unusual",
    buildTreeWith(ask("ground", "ck-burner-ground", { stage: "satisfied" })),
    "ground",
    "warning",
  ],
  [
    "finding-unknown",
    buildTreeWith(signal([toDirty, toGround, { on: "finding", finding: "haunted", to: "senior" }])),
    "signal",
    "error",
  ],
  [
    "finding-of-other-check",
    buildTreeWith(signal([toDirty, toGround, { on: "finding", finding: "grounded", to: "senior" }])),
    "signal",
    "error",
  ],
  [
    "unit-of-other-check",
    buildTreeWith(signal([toDirty, toGround, { on: "range", unit: "inwc", max: 1, to: "ground" }])),
    "signal",
    "error",
  ],
  ["fault-unknown", buildTreeWith({ kind: "conclude", id: "dirty", fault: "bad-luck" }), "dirty", "error"],
  [
    "fault-cannot-apply",
    buildTreeWith({ kind: "conclude", id: "dirty", fault: "thermocouple-failed" }),
    "dirty",
    "error",
  ],
  [
    "symptom-concluded",
    buildTreeWith({ kind: "conclude", id: "dirty", fault: "delayed-ignition" }),
    "dirty",
    "error",
  ],
  [
    "branch-never-taken",
    buildTreeWith(signal([toDirty, toGround, { on: "finding", finding: "low", to: "ground" }])),
    "signal",
    "error",
  ],
  [
    "branch-never-taken",
    buildTreeWith(
      signal([
        toDirty,
        { on: "range", unit: "uA", min: 0, max: 2, to: "ground" },
        { on: "range", unit: "uA", min: 0.5, max: 1, to: "dirty" },
      ]),
    ),
    "signal",
    "error",
  ],
  [
    "branch-never-taken",
    // A look whose every finding has its own branch cannot fail in any other way.
    buildTreeWith(
      ask("ground", "ck-lockout-reset", {
        branches: [
          { on: "finding", finding: "no-change", to: "bad-ground" },
          { on: "class", outcome: "fail", to: "dirty" },
        ],
      }),
    ),
    "ground",
    "error",
  ],
  [
    "branch-same-as-otherwise",
    buildTreeWith(
      ask("ground", "ck-burner-ground", { branches: [{ on: "finding", finding: "high", to: "senior" }] }),
    ),
    "ground",
    "warning",
  ],
  [
    "numbers-of-one-fuel",
    {
      ...buildTreeWith(manifold({ min: 3.2, max: 3.8 })),
      applies: "ign:HSI & draft:IDP & ctl:IFC",
    },
    "ground",
    "error",
  ],
  ["numbers-of-other-fuel", buildTreeWith(manifold({ min: 9.5, max: 10.5 })), "ground", "error"],
  [
    "cannot-concludes",
    buildTreeWith(ask("ground", "ck-burner-ground", { otherwise: "bad-ground" })),
    "ground",
    "error",
  ],
  [
    "entry-unknown",
    buildTree({ entries: { ...everyEntry("signal"), somewhere: "signal" } }),
    undefined,
    "error",
  ],
  ["entry-missing", buildTree({ entries: { any: "signal", lightoff: "signal" } }), undefined, "error"],
  [
    "entry-never-used",
    buildTree({
      applies: "ign:IPS & draft:ND & ctl:MOD-S & fuel:NG",
      entries: { ...everyEntry("signal"), "draft-proved": "signal" },
    }),
    undefined,
    "warning",
  ],
  [
    "entry-without-end",
    buildTreeWith(
      { kind: "do", id: "one", act: "Wait a minute.", to: "two" },
      { kind: "do", id: "two", act: "Wait again.", to: "one" },
      signal([], { otherwise: "one" }),
    ),
    "signal",
    "error",
  ],
  [
    "conclusion-never-decided",
    buildTreeWith({ kind: "conclude", id: "dirty", fault: "igniter-broken" }),
    "dirty",
    "error",
  ],
  [
    "conclusion-undecided-on-a-path",
    buildTreeWith(signal([toDirty, toGround, { on: "finding", finding: "zero", to: "dirty" }])),
    "dirty",
    "warning",
  ],
  [
    "conclusion-not-of-unit",
    {
      ...buildTreeWith(
        ask("ground", "ck-gas-shutoff", {
          branches: [{ on: "finding", finding: "meter", to: "bad-ground" }],
        }),
        { kind: "conclude", id: "bad-ground", fault: "gas-off-meter" },
      ),
      applies: "ign:HSI & draft:IDP & ctl:IFC",
    },
    "bad-ground",
    "warning",
  ],
];

function manifold(span: { min: number; max: number }) {
  return ask("ground", "ck-manifold-pressure", {
    branches: [{ on: "range", unit: "inwc", ...span, to: "bad-ground" }],
  });
}

describe("a fault seeded into a tree is found", () => {
  it.each(SEEDED)("%s", (rule, tree, node, severity) => {
    const problems = found(tree, rule);
    expect(problems, JSON.stringify(lintTree(tree))).not.toEqual([]);
    expect(problems.map((problem) => problem.node)).toContain(node);
    expect(new Set(problems.map((problem) => problem.severity))).toEqual(new Set([severity]));
  });

  it("for every rule there is", () => {
    const seeded = new Set(SEEDED.map(([rule]) => rule));
    expect(TREE_RULES.filter((rule) => !seeded.has(rule))).toEqual([]);
  });
});

describe("what is no fault", () => {
  it("is the same question again after something was done to the unit (UX-14)", () => {
    const tree = buildTreeWith(
      ask("ground", "ck-burner-ground", { otherwise: "clean" }),
      { kind: "do", id: "clean", act: "Clean the flame sensor.", to: "signal-again" },
      ask("signal-again", "ck-flame-current", {
        branches: [{ on: "finding", finding: "recovers-cleaned", to: "dirty" }],
      }),
    );
    expect(found(tree, "asked-twice")).toEqual([]);
  });

  it("is the same check taken another way or at another place in the sequence", () => {
    const tree = buildTreeWith(
      signal([toDirty, toGround], { stage: "lightoff" }),
      ask("ground", "ck-burner-ground", { otherwise: "signal-in-run" }),
      ask("signal-in-run", "ck-flame-current", { stage: "steady" }),
    );
    expect(found(tree, "asked-twice")).toEqual([]);
  });

  it("is a number of the tree's own fuel", () => {
    const tree = buildTreeWith(manifold({ min: 3.2, max: 3.8 }));
    expect([...found(tree, "numbers-of-one-fuel"), ...found(tree, "numbers-of-other-fuel")]).toEqual([]);
  });

  it("has the errors first", () => {
    const severities = lintTree(
      buildTreeWith(
        { kind: "conclude", id: "never", fault: "igniter-broken" },
        signal([toDirty], { otherwise: "nowhere" }),
      ),
    ).map(({ severity }) => severity);
    expect(severities).toEqual(severities.toSorted());
    expect(new Set(severities)).toEqual(new Set(["error", "warning"]));
  });
});
