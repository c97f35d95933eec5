import { describe, expect, it } from "vitest";
import {
  airDensityRatioAt,
  airFreeCoPpm,
  airflowFromRiseCfm,
  altitudeFactor,
  btuhToKilowatts,
  carbonDioxidePct,
  cfmToLitresPerSecond,
  excessAirPct,
  inchesWaterToPascals,
  inchesWaterToPsi,
  inputAtManifoldBtuh,
  inputAtSiteBtuh,
  inputFromFlowBtuh,
  manifoldForInput,
  meterCorrection,
  meterFlowCfh,
  metricMeterFlowCfh,
  orificeFlowCfh,
  percentOfInput,
  psiToInchesWater,
  riseFromAirflowF,
  secondsPerTurn,
  standardPressureRatio,
  wobbeNumber,
} from "@emberladder/field-math";

const METRES_CUBED_PER_SECOND_TO_CFM = 2118.88;

describe("pressure", () => {
  // 60 F inch: NIST SP 811, from memory. 4 C and conventional inch: published conversion tables (inch of water).
  it("gives the pascals of 3.50 in. w.c. in each of the three conventions", () => {
    expect(inchesWaterToPascals(3.5, "60F")).toBeCloseTo(870.94, 2);
    expect(inchesWaterToPascals(3.5, "4C")).toBeCloseTo(871.79, 2);
    expect(inchesWaterToPascals(3.5)).toBeCloseTo(871.81, 2);
  });

  it("calls 14 in. w.c. half a psi", () => {
    expect(inchesWaterToPascals(14, "4C") / 1000).toBeCloseTo(3.487, 3);
    expect(inchesWaterToPsi(14, "4C")).toBeCloseTo(0.5058, 4);
  });

  it("gives the inches of half a psi by the convention named", () => {
    expect(psiToInchesWater(0.5, "60F")).toBeCloseTo(13.854, 3);
    expect(psiToInchesWater(0.5, "4C")).toBeCloseTo(13.84, 3);
  });
});

describe("the gas meter", () => {
  it("reads 114,092 Btu/h from one turn of a 2 ft3 dial in 65 s with gas of 1,030 Btu", () => {
    const flow = meterFlowCfh(2, 1, 65);
    expect(flow).toBeCloseTo(110.77, 2);
    expect(inputFromFlowBtuh(flow, 1030)).toBeCloseTo(114_092, 0);
    expect(btuhToKilowatts(inputFromFlowBtuh(flow, 1030))).toBeCloseTo(33.44, 2);
  });

  it("reads a metric dial in cubic feet an hour", () => {
    expect(metricMeterFlowCfh(0.01, 1, 16)).toBeCloseTo(79.46, 2);
  });

  it("tells how long a turn should take", () => {
    expect(secondsPerTurn(1, 100_000, 1030)).toBeCloseTo(37.08, 2);
  });

  it("has no flow to tell where no time has passed", () => {
    expect(meterFlowCfh(2, 1, 0)).toBeNaN();
  });

  it("needs no correction at base pressure and temperature", () => {
    expect(meterCorrection(14.73, 0, 60)).toBeCloseTo(1, 10);
    // Gas at 0.25 psi (7 in. w.c.) in a 40 F cellar at sea level: gas laws, by hand.
    expect(meterCorrection(14.696, 0.25, 40)).toBeCloseTo(((14.946 / 14.73) * 519.67) / 499.67, 10);
  });

  it("states input in percent of what it should be", () => {
    expect(percentOfInput(76_000, 80_000)).toBeCloseTo(95, 10);
  });
});

describe("orifice and manifold", () => {
  // Imperial orifice capacity table of an open textbook on plumbing, factor 0.90.
  it.each([
    ["#80 on natural gas at 3.5 in.", 0.0135, 3.5, 0.6, 0.516],
    ["#70 on natural gas at 3.5 in.", 0.028, 3.5, 0.6, 2.22],
    ["#70 on propane at 10 in.", 0.028, 10, 1.5, 2.373],
  ])("flows what the printed table says for %s", (_, hole, pressure, gravity, flow) => {
    expect(orificeFlowCfh(hole, pressure, gravity)).toBeCloseTo(flow, 3);
  });

  it("gives a #55 on propane 8.13 CFH", () => {
    const flow = orificeFlowCfh(0.052, 10, 1.52);
    expect(flow).toBeCloseTo(8.13, 2);
    expect(inputFromFlowBtuh(flow, 2516) / 20_457).toBeCloseTo(1, 3);
  });

  it("loses input with the square root of the manifold pressure", () => {
    expect(inputAtManifoldBtuh(80_000, 3.5, 3)).toBeCloseTo(74_066, 0);
    expect(manifoldForInput(3.5, 80_000, 74_066)).toBeCloseTo(3, 3);
  });

  it("burns 1.5 times its input on propane by mistake, and 2.6 times at propane's pressure", () => {
    const ratio = wobbeNumber(2516, 1.52) / wobbeNumber(1030, 0.6);
    expect(ratio).toBeCloseTo(1.535, 3);
    expect(inputAtManifoldBtuh(ratio, 3.5, 10)).toBeCloseTo(2.594, 3);
  });
});

describe("altitude", () => {
  // First rule: NFPA 54 Annex E as a trade magazine prints it. The others: common practice, from memory.
  it.each([
    ["4-from-sea-level", 78_880],
    ["4-above-2000", 86_880],
    ["2-from-sea-level", 89_440],
    ["none", 100_000],
  ] as const)("gives a plate of 100,000 Btu/h at 5,280 ft by the rule %s", (rule, input) => {
    expect(inputAtSiteBtuh(100_000, 5280, rule)).toBeCloseTo(input, 6);
  });

  it("reduces nothing up to 2,000 ft by any rule", () => {
    for (const rule of ["4-from-sea-level", "4-above-2000", "2-from-sea-level", "none"] as const) {
      expect(altitudeFactor(2000, rule)).toBe(1);
      expect(altitudeFactor(-200, rule)).toBe(1);
    }
  });

  // International Standard Atmosphere, published tables.
  it.each([
    [2000, 0.93],
    [5000, 0.832],
    [7000, 0.772],
  ])("has the standard atmosphere's pressure at %i ft", (feet, ratio) => {
    expect(standardPressureRatio(feet)).toBeCloseTo(ratio, 3);
  });
});

describe("combustion", () => {
  // A trade article on air-free CO works the first two through: 50 ppm at 7 % and 1,200 ppm at 6 % (printed 1,680).
  it.each([
    [50, 7, 75.2],
    [1200, 6, 1683],
    [65, 8, 105.3],
  ])("frees %i ppm at %i percent of oxygen from the air in it", (ppm, oxygen, airFree) => {
    const figure = airFreeCoPpm(ppm, oxygen) ?? Number.NaN;
    expect(Math.abs(figure - airFree)).toBeLessThan(0.6);
  });

  it("refuses an air-free figure from a sample that is mostly air", () => {
    expect(airFreeCoPpm(20, 16)).toBeGreaterThan(80);
    expect(airFreeCoPpm(20, 16.1)).toBeUndefined();
  });

  it("knows carbon dioxide and excess air from oxygen", () => {
    expect(carbonDioxidePct(8, "NG")).toBeCloseTo(7.28, 2);
    expect(carbonDioxidePct(8, "LP")).toBeCloseTo(8.46, 2);
    expect(excessAirPct(8)).toBeCloseTo(55.3, 1);
    expect(excessAirPct(5)).toBeCloseTo(28, 0);
  });
});

describe("airflow", () => {
  it("finds 1,077 CFM in 64,000 Btu/h over a rise of 55 F at sea level", () => {
    const cfm = airflowFromRiseCfm(64_000, 55);
    expect(cfm).toBeCloseTo(1077, 0);
    expect(cfmToLitresPerSecond(cfm)).toBeCloseTo(508.5, 1);
    expect(riseFromAirflowF(64_000, cfm)).toBeCloseTo(55, 10);
  });

  it("agrees with the SI form within half a percent", () => {
    // Q / (rho cp dT) with 1.204 kg/m3 and 1006 J/(kg K): textbook values for air at 20 C.
    const si = (btuhToKilowatts(64_000) * 1000) / (1.204 * 1006 * (55 / 1.8));
    expect(airflowFromRiseCfm(64_000, 55) / (si * METRES_CUBED_PER_SECOND_TO_CFM)).toBeCloseTo(1, 2);
  });

  it("counts thin air: the same rise is more CFM at 5,000 ft", () => {
    expect(airDensityRatioAt(0)).toBeCloseTo(1, 5);
    expect(airflowFromRiseCfm(64_000, 55, airDensityRatioAt(5000))).toBeCloseTo(1077.4 / 0.832, 0);
  });

  it("has no airflow to tell without a rise", () => {
    expect(airflowFromRiseCfm(64_000, 0)).toBeNaN();
  });
});
