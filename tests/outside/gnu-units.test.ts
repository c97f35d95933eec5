import { execFileSync } from "node:child_process";
import { beforeAll, describe, expect, it } from "vitest";
import { ensureProgram } from "@emberladder/db/server";
import {
  btuhToKilowatts,
  cfhToCubicMetresPerHour,
  cfmToLitresPerSecond,
  fahrenheitRiseToCelsius,
  fahrenheitToCelsius,
  feetToMetres,
  inchesToMillimetres,
  inchesWaterToPascals,
  inchesWaterToPsi,
  psiToInchesWater,
} from "@emberladder/field-math";

/** Conversions held against GNU units, the reference program of Debian's package `units`. */
let program = "";

beforeAll(async () => {
  program = await ensureProgram({
    program: "units",
    packages: ["units"],
    purpose: "GNU units, which its tests hold conversions against",
    report: (line) => process.stdout.write(`${line}\n`),
  });
}, 120_000);

function askUnits(from: string, to: string): number {
  return Number(execFileSync(program, ["-t", "-d", "14", from, to], { encoding: "utf8" }).trim());
}

describe("conversions agree with GNU units to nine digits", () => {
  it.each([
    // GNU units' inch of water is that of 1 gram-force for each cubic centimetre: our conventional inch.
    ["3.5 inH2O", "Pa", inchesWaterToPascals(3.5)],
    ["14 inH2O", "psi", inchesWaterToPsi(14)],
    ["0.5 psi", "inH2O", psiToInchesWater(0.5)],
    ["100000 btu/hour", "kW", btuhToKilowatts(100_000)],
    ["1077 ft^3/min", "l/s", cfmToLitresPerSecond(1077)],
    ["110.77 ft^3/hour", "m^3/hour", cfhToCubicMetresPerHour(110.77)],
    ["0.125 in", "mm", inchesToMillimetres(0.125)],
    ["5280 ft", "m", feetToMetres(5280)],
    ["55 degF", "degC", fahrenheitRiseToCelsius(55)],
    ["tempF(140)", "tempC", fahrenheitToCelsius(140)],
  ])("%s in %s", (from, to, ours) => {
    expect(ours / askUnits(from, to)).toBeCloseTo(1, 8);
  });
});
