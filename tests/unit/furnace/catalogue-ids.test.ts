import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import {
  CHECKS,
  CHECK_FINDINGS,
  CHECK_IDS,
  CLOSING_CHECKS,
  DEPARTURE_REASONS,
  FAULTS,
  FAULT_IDS,
  FIRST_LOOK_IDS,
  REPAIRS,
  STANDING_PILOT_STEP_IDS,
  STOP_RULE_CODES,
  SYMPTOMS,
  TOUCH_ROWS,
  findingsOf,
  getFinding,
  isFaultId,
  isSymptomId,
} from "@emberladder/furnace";

/** Id lists taken from the tables of the trade references, independently of the code. */
function readJson(name: string): unknown {
  return JSON.parse(
    readFileSync(new URL(`../../fixtures/handbook-ids/${name}.json`, import.meta.url), "utf8"),
  );
}

const readIds = (name: string) => readJson(name) as string[];

describe("the catalogue against the id lists of the reference tables", () => {
  it("has the 148 faults of the list, none missing and none extra", () => {
    const listed = readIds("faults");
    expect(listed).toHaveLength(148);
    expect([...FAULT_IDS].toSorted()).toEqual(listed.toSorted());
    expect(FAULTS).toHaveLength(148);
  });

  it("has the three symptoms and takes none of them for a fault", () => {
    const listed = readIds("symptoms");
    expect(Object.keys(SYMPTOMS).toSorted()).toEqual(listed.toSorted());
    expect(listed).toHaveLength(3);
    for (const id of listed) expect([isFaultId(id), isSymptomId(id)]).toEqual([false, true]);
  });

  it("has the 108 checks of the list, none missing and none extra", () => {
    const listed = readIds("checks");
    expect(listed).toHaveLength(108);
    expect([...CHECK_IDS].toSorted()).toEqual(listed.toSorted());
    expect(CHECKS.map((check) => check.id)).toEqual([...CHECK_IDS]);
  });

  it("has every finding of every check, none missing and none extra", () => {
    const listed = readJson("findings") as Record<string, string[]>;
    for (const check of CHECK_IDS) {
      expect(
        findingsOf(check).map((finding) => finding.id),
        check,
      ).toEqual(listed[check] ?? []);
    }
    expect(Object.keys(CHECK_FINDINGS)).toHaveLength(108);
  });

  it("has the 22 closing checks, the stop rules, the departure reasons and the lighting steps", () => {
    expect(CLOSING_CHECKS.map((check) => check.id)).toEqual(readIds("closing-checks"));
    expect(CLOSING_CHECKS).toHaveLength(22);
    expect(Object.values(STOP_RULE_CODES)).toEqual(readIds("stop-rules"));
    expect([...DEPARTURE_REASONS]).toEqual(readIds("departure-reasons"));
    expect([...STANDING_PILOT_STEP_IDS]).toEqual(readIds("standing-pilot-steps"));
    expect(["always", ...TOUCH_ROWS, "left-off"]).toEqual(readIds("touch-rows"));
    expect(FIRST_LOOK_IDS).toHaveLength(readIds("first-look").length);
  });
});

describe("links within the catalogue", () => {
  it("gives every fault a decisive check that can be taken and a repair that touches something or tags the unit", () => {
    for (const fault of FAULTS) {
      expect(fault.decisive.length, fault.id).toBeGreaterThan(0);
      expect(fault.repairs.length, fault.id).toBeGreaterThan(0);
      const touches = fault.repairs.flatMap((id) => REPAIRS[id].touches);
      expect(touches.length > 0 || fault.shutOff === true, fault.id).toBe(true);
    }
  });

  it("knows every finding that a fault names as decisive", () => {
    for (const fault of FAULTS) {
      for (const { check, findings = [] } of fault.decisive) {
        for (const finding of findings)
          expect(getFinding(check, finding), `${fault.id} ${check}`).toBeDefined();
      }
    }
  });

  it("points at every fault from some finding of some check", () => {
    const pointed = new Set(
      CHECK_IDS.flatMap((check) =>
        findingsOf(check).flatMap((finding) => [...finding.pointsAt, ...(finding.also?.pointsAt ?? [])]),
      ),
    );
    expect(FAULT_IDS.filter((id) => !pointed.has(id))).toEqual([]);
  });

  it("shows why a symptom is no cause by pointing on to faults", () => {
    for (const symptom of Object.values(SYMPTOMS)) expect(symptom.pointsTo.every(isFaultId)).toBe(true);
  });

  it("marks every check that opens a gas tap as fully invasive and gives the side for the leak check", () => {
    for (const check of CHECKS) {
      const gas = check.opens.filter(({ kind }) => kind === "gas-port-opened" || kind === "gas-joint-opened");
      expect(gas.length > 0 && check.invasive !== 3, check.id).toBe(false);
      expect(
        gas.filter(({ side }) => side === undefined),
        check.id,
      ).toEqual([]);
    }
  });

  it("opens nothing where the flame signal is read on the board's own display", () => {
    const check = CHECKS.find(({ id }) => id === "ck-flame-current");
    expect(check?.opens).toEqual([]);
    expect(check?.ways?.find(({ id }) => id === "board-display")?.opens).toEqual([]);
    expect(check?.ways?.find(({ id }) => id === "series-meter")?.opens.map(({ kind }) => kind)).toEqual([
      "cover-removed",
      "lead-lifted",
      "meter-in-series",
    ]);
  });
});
