import { describe, expect, it } from "vitest";
import {
  acceptsAs,
  classifyReading,
  closingChecksFor,
  closingPass,
  getFinding,
  isCheckId,
  isFaultId,
  lastStagesOf,
  mayApply,
  getCheck,
  getFault,
  stopRuleByCode,
  stopRulesFor,
} from "@emberladder/furnace";
import type { ReadingStage, TouchRow } from "@emberladder/furnace";
import { profileOf, referenceCalls } from "./reference-calls.ts";
import type { ReferenceObservation } from "./reference-calls.ts";

/** Invented calls, written down before the code and kept as they are: the classes in them were set by hand. */
const everyObservation = referenceCalls.flatMap((call) =>
  [...call.observations, ...call.afterRepair, ...call.assess.observations].map((observation) => ({
    call,
    observation,
  })),
);

function classify({
  call,
  observation,
}: {
  call: (typeof referenceCalls)[number];
  observation: ReferenceObservation;
}) {
  if (!isCheckId(observation.check)) throw new Error(`${observation.check} is not a check`);
  return classifyReading(
    {
      ...observation,
      check: observation.check,
      stage: observation.stage as ReadingStage,
      power: observation.power,
    },
    profileOf(call),
  );
}

describe("the twelve reference calls", () => {
  it("are all there", () => {
    expect(referenceCalls).toHaveLength(12);
  });

  it("name checks that apply to their unit, findings that exist and classes the findings may carry", () => {
    for (const { call, observation } of everyObservation) {
      const { check, finding, outcome } = observation;
      const where = `${call.slug} ${check} ${finding ?? ""}`;
      expect(isCheckId(check), where).toBe(true);
      if (!isCheckId(check)) continue;
      expect(mayApply(getCheck(check).applies, profileOf(call).codes, profileOf(call).options), where).toBe(
        true,
      );
      const entry = finding === undefined ? undefined : getFinding(check, finding);
      expect(entry?.id, where).toBe(finding);
      const mayCarry = !entry || !outcome || entry.classes.includes(outcome);
      expect(mayCarry, where).toBe(true);
    }
  });

  it("class every number as the call states it", () => {
    const withNumber = everyObservation.filter(({ observation }) => observation.value !== undefined);
    expect(withNumber.length).toBeGreaterThan(60);
    for (const one of withNumber) {
      const where = `${one.call.slug} ${one.observation.check} ${one.observation.value}`;
      expect(classify(one).outcome, where).toBe(one.observation.outcome);
    }
  });

  it("class by the finding no better than the call states where there is no number", () => {
    const looks = everyObservation.filter(
      ({ observation: { value, finding } }) => value === undefined && finding,
    );
    const classed = looks.filter((one) => classify(one).outcome !== undefined);
    expect(classed.length).toBeGreaterThan(20);
    for (const one of classed) {
      expect(classify(one).outcome, `${one.call.slug} ${one.observation.check}`).toBe(
        one.observation.outcome,
      );
    }
  });

  it("conclude faults that apply to the unit and stop where the unit stopped", () => {
    for (const call of referenceCalls) {
      const profile = profileOf(call);
      const [cause] = call.assess.truth;
      expect(cause && isFaultId(cause), call.slug).toBe(true);
      if (!cause || !isFaultId(cause)) continue;
      expect(mayApply(getFault(cause).applies, profile.codes, profile.options), call.slug).toBe(true);
      if (call.assess.lastStage === "any") continue;
      expect([...lastStagesOf(cause, profile)], call.slug).toContain(call.assess.lastStage);
    }
  });

  it("have a reading, among the evidence, that points at what was concluded", () => {
    for (const call of referenceCalls) {
      const causes = call.assess.truth.filter(isFaultId);
      const pointed = call.conclusion.evidence.flatMap((index) => {
        const { check = "", finding } = call.observations[index] ?? {};
        return isCheckId(check) && finding ? (getFinding(check, finding)?.pointsAt ?? []) : [];
      });
      const isPointed = causes.some((cause) => pointed.some((at) => isFaultId(at) && acceptsAs(cause, at)));
      expect(isPointed, call.slug).toBe(true);
    }
  });

  it("ask for exactly the closing checks that the call lists", () => {
    for (const call of referenceCalls) {
      const profile = profileOf(call);
      const sides = call.putBack.flatMap(({ leakCheck }) => leakCheck ?? []);
      const required = closingChecksFor({
        touched: call.touched.filter((row): row is TouchRow => row !== "left-off"),
        outcome: call.outcome,
        profile,
        intermittent: false,
        gasJoints: [...new Set(sides)],
        flueCoWithin12Months:
          profile.lastFlueCo !== undefined && monthsBetween(profile.lastFlueCo.date, call.job.date) <= 12,
      }).map(({ id }) => id);
      const listed = call.lightOffProof.filter(({ applies }) => applies).map(({ id }) => id);
      expect(required.toSorted(), call.slug).toEqual(listed.toSorted());
    }
  });

  it("pass the closing checks that the call passed", () => {
    for (const call of referenceCalls) {
      for (const proof of call.lightOffProof.filter(({ applies }) => applies)) {
        const seenRight = ["close-panels", "close-tstat"].includes(proof.id) ? true : undefined;
        const verdict = closingPass(proof.id, { ...proof, seenRight }, profileOf(call));
        expect(verdict, `${call.slug} ${proof.id}`).toMatchObject({ pass: proof.pass, missing: [] });
      }
    }
  });

  it("bring up the stop rules that the call met, from its findings and numbers", () => {
    for (const call of referenceCalls) {
      const raised = new Set(
        call.observations.flatMap(({ check, finding, value, unit, outcome }) =>
          isCheckId(check)
            ? stopRulesFor({ on: "check", check, finding, value, unit, outcome }, profileOf(call))
            : [],
        ),
      );
      // Gas that flowed with no spark was seen in the watch, not read.
      const read = call.stops.map(({ rule }) => stopRuleByCode(rule)).filter((id) => id !== "raw-gas");
      expect([...raised], call.slug).toEqual(expect.arrayContaining(read));
    }
  });
});

function monthsBetween(earlier: string, later: string): number {
  return (Date.parse(later) - Date.parse(earlier)) / (1000 * 60 * 60 * 24 * 30.44);
}
