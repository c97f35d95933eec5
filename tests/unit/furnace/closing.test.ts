import { describe, expect, it } from "vitest";
import { CLOSING_CHECK_IDS, closingChecksFor, closingPass } from "@emberladder/furnace";
import type { ClosingSituation } from "@emberladder/furnace";
import { buildProfile } from "./build-profile.ts";

const profile = buildProfile();
const natural = buildProfile({ codes: { ignition: "IPS", draft: "ND", control: "MOD-S" } });
const list = (situation: Partial<ClosingSituation>) =>
  closingChecksFor({ touched: [], outcome: "fixed", profile, ...situation });
const ids = (situation: Partial<ClosingSituation>) => list(situation).map(({ id }) => id);
const lights = (situation: Partial<ClosingSituation>) =>
  list(situation).find(({ id }) => id === "close-cycles")?.lights;

const ALWAYS = [
  "close-cycles",
  "close-flame",
  "close-cycle-end",
  "close-room-co",
  "close-panels",
  "close-tstat",
  "close-jumpers",
  "close-docs",
];

describe("the closing list", () => {
  it("asks for the eight that every unit left in service has, and nothing for a setting", () => {
    expect(ids({ touched: ["setting"] })).toEqual(ALWAYS);
    expect(lights({ touched: ["setting"] })).toBe(1);
  });

  it("asks for three lights and the flame proof where the flame was touched, five where it came and went", () => {
    expect(ids({ touched: ["flame"], flueCoWithin12Months: true })).toEqual(
      expect.arrayContaining(["close-sensor"]),
    );
    expect(ids({ touched: ["flame"], flueCoWithin12Months: true })).not.toContain("close-co");
    expect(ids({ touched: ["flame"] })).toContain("close-co");
    expect(lights({ touched: ["flame"] })).toBe(3);
    expect(lights({ touched: ["flame"], intermittent: true })).toBe(5);
    expect(lights({ touched: ["draft"], intermittent: true })).toBe(3);
  });

  it("asks for flue CO after draft work even where one is on record", () => {
    expect(ids({ touched: ["draft"], flueCoWithin12Months: true })).toContain("close-co");
  });

  it("does not ask a natural-draft unit to prove that a draft switch opens", () => {
    expect(ids({ touched: ["draft", "control", "gas-train", "safety"], profile: natural })).not.toContain(
      "close-draft-opens",
    );
    expect(ids({ touched: ["control"] })).toContain("close-draft-opens");
  });

  it("asks for leak checks only on the sides where a joint was opened", () => {
    expect(ids({ touched: ["gas-joint"], gasJoints: ["down"] })).toContain("close-leak-down");
    expect(ids({ touched: ["gas-joint"], gasJoints: ["down"] })).not.toContain("close-leak-up");
    expect(ids({ touched: ["gas-train"], gasJoints: [] })).not.toContain("close-leak-up");
    expect(ids({ touched: ["setting"], gasJoints: ["up"] })).toContain("close-leak-up");
  });

  it("asks for everything but the system test and the cold after a safety", () => {
    expect(ids({ touched: ["safety"] })).toEqual(
      CLOSING_CHECK_IDS.filter((id) => id !== "close-restore" && id !== "close-cold"),
    );
  });

  it("asks for the system test after a restored supply, and fifteen minutes of burning after airflow work", () => {
    expect(ids({ touched: ["restored"] })).toEqual([...ALWAYS, "close-restore"]);
    expect(list({ touched: ["airflow"] }).find(({ id }) => id === "close-rise")?.burnMinutes).toBe(15);
  });

  it.each(["part-needed", "shut-off", "referred"] as const)(
    "asks a unit left off as %s about the cold, never to light it",
    (outcome) => {
      expect(ids({ outcome, touched: ["flame", "safety", "gas-train"] }).toSorted()).toEqual(
        ["close-cold", "close-docs", "close-jumpers", "close-panels"].toSorted(),
      );
      expect(ids({ outcome, gasJoints: ["up", "down"] })).toContain("close-leak-up");
      expect(ids({ outcome, gasJoints: ["up", "down"] })).not.toContain("close-leak-down");
    },
  );

  it("says which rows asked for a check", () => {
    const cycles = list({ touched: ["flame", "draft"] }).find(({ id }) => id === "close-cycles");
    expect(cycles?.askedBy).toEqual(["always", "flame", "draft"]);
  });
});

describe("passing a closing check", () => {
  const pass = (...args: Parameters<typeof closingPass>) => closingPass(...args).pass;

  it("counts lights at the first try only", () => {
    expect(pass("close-cycles", { value: 3 }, profile, { lights: 3 })).toBe(true);
    expect(pass("close-cycles", { value: 2 }, profile, { lights: 3 })).toBe(false);
    expect(pass("close-cycles", { value: 3, also: { retries: 1 } }, profile, { lights: 3 })).toBe(false);
  });

  it("wants the flame out in two seconds", () => {
    expect(pass("close-cycle-end", { value: 2, unit: "s" }, profile)).toBe(true);
    expect(pass("close-cycle-end", { value: 2.1, unit: "s" }, profile)).toBe(false);
  });

  it("wants room CO at 9 ppm or less and no rise, and a source found and told above it", () => {
    expect(pass("close-room-co", { value: 9 }, profile)).toBe(true);
    expect(pass("close-room-co", { value: 5, also: { beforePpm: 1 } }, profile)).toBe(false);
    expect(closingPass("close-room-co", { value: 12 }, profile)).toMatchObject({
      pass: false,
      notice: "action-required",
    });
    expect(
      pass("close-room-co", { value: 12, also: { sourceFound: true, occupantTold: true } }, profile),
    ).toBe(true);
    expect(closingPass("close-room-co", { value: 30 }, profile).notice).toBe("stop-rule-co-30");
  });

  it("wants 1.0 uA and twice the drop-out of the label", () => {
    expect(pass("close-sensor", { value: 1 }, profile)).toBe(true);
    expect(pass("close-sensor", { value: 0.9 }, profile)).toBe(false);
    expect(pass("close-sensor", { value: 1.4 }, buildProfile({ plate: { dropOutUa: 0.75 } }))).toBe(false);
  });

  it("wants 12 mV loaded and a drop-out of three minutes at most of a standing pilot", () => {
    const pilot = buildProfile({ codes: { ignition: "SP", draft: "ND", control: "CV" } });
    expect(pass("close-sensor", { value: 16, also: { dropOutS: 48 } }, pilot)).toBe(true);
    expect(pass("close-sensor", { value: 16, also: { dropOutS: 181 } }, pilot)).toBe(false);
    expect(closingPass("close-sensor", { value: 16 }, pilot).missing).toEqual(["dropOutS"]);
  });

  it.each([
    [100, true, undefined],
    [101, false, undefined],
    [201, false, "cannot-close-as-fixed"],
    [401, false, "shut-off"],
  ] as const)(
    "judges %d ppm flue CO air-free (400 ppm: ANSI Z21.47, from memory)",
    (value, passed, notice) => {
      expect(closingPass("close-co", { value }, profile)).toMatchObject({ pass: passed });
      expect(closingPass("close-co", { value }, profile).notice).toBe(notice);
    },
  );

  it("shuts off at any flue CO that rises, and shows the supervisor 101 to 200 ppm with the cause sought", () => {
    expect(closingPass("close-co", { value: 40, also: { rising: true } }, profile).notice).toBe("shut-off");
    expect(closingPass("close-co", { value: 150, also: { causeSought: true } }, profile)).toMatchObject({
      pass: true,
      notice: "supervisor-sees",
    });
  });

  it("wants suction a tenth beyond closes-at at every switch", () => {
    const two = buildProfile({
      codes: { staging: "2S" },
      plate: { switchMakeInwc: 0.62, highSwitchMakeInwc: 1.04 },
    });
    expect(pass("close-draft", { value: 0.72, also: { highSuctionInwc: 1.14 } }, two)).toBe(true);
    expect(pass("close-draft", { value: 0.71, also: { highSuctionInwc: 1.14 } }, two)).toBe(false);
    expect(closingPass("close-draft", { value: 0.72 }, two).missing).toEqual(["highSuctionInwc"]);
    expect(pass("close-draft", { value: 0.9, also: { highSuctionInwc: 1.3, ventJointsCoPpm: 2 } }, two)).toBe(
      false,
    );
  });

  it("wants draft and no spill at a hood", () => {
    expect(pass("close-draft", { value: -0.036, also: { spillStopsS: 24 } }, natural)).toBe(true);
    expect(pass("close-draft", { value: -0.036, also: { spillStopsS: 301 } }, natural)).toBe(false);
    expect(pass("close-draft", { value: 0, also: { spillStopsS: 24 } }, natural)).toBe(false);
  });

  it("wants the rise within the plate, and says so where the plate is not known", () => {
    const plated = buildProfile({ plate: { riseMinF: 35, riseMaxF: 65 } });
    expect(pass("close-rise", { value: 65 }, plated)).toBe(true);
    expect(pass("close-rise", { value: 66 }, plated)).toBe(false);
    expect(closingPass("close-rise", { value: 55 }, profile).missing).toEqual([
      "plate.riseMinF",
      "plate.riseMaxF",
    ]);
  });

  it("fails every check of which nothing was recorded, and says what is missing", () => {
    for (const id of CLOSING_CHECK_IDS) {
      const verdict = closingPass(id, {}, profile);
      expect(verdict.pass, id).toBe(false);
      expect(verdict.missing.length, id).toBeGreaterThan(0);
    }
  });
});
