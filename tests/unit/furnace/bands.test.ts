import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import {
  CHECK_IDS,
  bandsOf,
  chainTextSchema,
  formatChain,
  isInSegment,
  parseChain,
  resolveBands,
} from "@emberladder/furnace";
import type { CheckId, ResolvedBand } from "@emberladder/furnace";
import { buildManyProfiles, buildProfile } from "./build-profile.ts";

interface BandRow {
  check: CheckId;
  when: string;
  unit: string;
  chain: string;
}

/** The chains as the reference table writes them, read independently of the code. */
const rows = JSON.parse(
  readFileSync(new URL("../../fixtures/handbook-ids/bands.json", import.meta.url), "utf8"),
) as BandRow[];

const plain = (text: string) =>
  text
    .replaceAll("≤", "<=")
    .replaceAll("−", "-")
    .replaceAll(/(\d)\.0\b/g, "$1")
    .replaceAll(/(\.\d*[1-9])0+\b/g, "$1");
const isNumeric = (row: BandRow) => !/[a-z]{3,}/.test(row.chain);

/** Every band that some unit can have, resolved; each different one once. */
function resolveAll(): ResolvedBand[] {
  const bands = buildManyProfiles().flatMap((profile) =>
    CHECK_IDS.flatMap((check) => [
      ...resolveBands(check, profile, {}),
      ...resolveBands(check, profile, { stage: "steady", power: "ON-call" }),
      ...bandsOf(check).flatMap((band) => (band.way ? resolveBands(check, profile, { way: band.way }) : [])),
      ...resolveBands(check, profile, { way: "low-fire" }),
    ]),
  );
  return [
    ...new Map(bands.map((band) => [`${band.check} ${band.key} ${band.unit} ${band.text}`, band])).values(),
  ];
}

describe("the chains of bands", () => {
  it("hold every chain of the reference table that is written in numbers, in its own check", () => {
    // The plate outranks these: their chains are written with the plate's figure, whose default gives the same.
    const withDefaults = buildProfile();
    for (const row of rows.filter(isNumeric)) {
      const written = bandsOf(row.check).map((band) => formatChain(band.chain));
      const resolved = buildManyProfiles()
        .filter((profile) => Object.keys(profile.plate).length === 0)
        .concat(withDefaults, buildProfile({ plate: { igniterKind: "SiC" } }))
        .flatMap((profile) =>
          ["low-fire", "high-fire", undefined].flatMap((way) => resolveBands(row.check, profile, { way })),
        )
        .map((band) => band.text);
      if (row.check === "ck-pressure-suction" || row.check === "ck-pressure-switch-trip") continue;
      expect([...written, ...resolved], `${row.check} ${row.when}`).toContain(plain(row.chain));
    }
  });

  it("have a band for every row of the reference table", () => {
    for (const row of rows) expect(bandsOf(row.check).length, row.check).toBeGreaterThan(0);
    const withoutRow = CHECK_IDS.filter(
      (id) => bandsOf(id).length > 0 && !rows.some((row) => row.check === id),
    );
    expect(withoutRow).toEqual([]);
  });

  it("are a partition: every number, the edges and infinity are in exactly one class, on every unit", () => {
    const bands = resolveAll();
    expect(bands.length).toBeGreaterThan(97);
    for (const band of bands) {
      const edges = band.segments.flatMap(({ from, to }) => [from, to]).filter(Number.isFinite);
      const probes = [-Infinity, Infinity, 0, ...edges.flatMap((edge) => [edge, edge - 1e-7, edge + 1e-7])];
      for (const probe of probes) {
        const hits = band.segments.filter((segment) => isInSegment(segment, probe));
        expect(hits.length, `${band.check} ${band.key} ${band.text} at ${probe}`).toBe(1);
      }
    }
  });

  it("join without a gap and without neighbours of the same class", () => {
    for (const band of resolveAll()) {
      band.segments.forEach((segment, index) => {
        const next = band.segments[index + 1];
        if (!next) return;
        expect(next.from).toBe(segment.to);
        expect(next.fromInclusive).toBe(!segment.toInclusive);
      });
    }
  });

  it("name each circumstance of a check once", () => {
    for (const check of CHECK_IDS) {
      const keys = bandsOf(check).map((band) => band.key);
      expect(new Set(keys).size, check).toBe(keys.length);
    }
  });
});

describe("resolving bands for a unit", () => {
  const textOf = (...args: Parameters<typeof resolveBands>) => resolveBands(...args)[0]?.text;

  it("puts the closes-at figure of the label into the suction band", () => {
    const profile = buildProfile({ plate: { switchMakeInwc: 0.62, highSwitchMakeInwc: 1.04 } });
    expect(textOf("ck-pressure-suction", profile)).toBe("F < 0.62 <= M < 0.72 <= G");
    expect(textOf("ck-pressure-suction", profile, { way: "high-stage" })).toBe("F < 1.04 <= M < 1.14 <= G");
  });

  it("has no class for suction or rise where the plate does not say", () => {
    expect(resolveBands("ck-pressure-suction", buildProfile())).toEqual([]);
    expect(resolveBands("ck-temp-rise", buildProfile({ plate: { riseMinF: 35 } }))).toEqual([]);
  });

  it("lets a label that states both figures outrank the flame band", () => {
    expect(textOf("ck-flame-current", buildProfile())).toBe("F < 0.5 <= M < 2 <= G");
    expect(textOf("ck-flame-current", buildProfile({ codes: { ignition: "IPS" } }))).toBe(
      "F < 0.4 <= M < 1 <= G",
    );
    const labelled = buildProfile({ plate: { dropOutUa: 0.15, goodUa: 0.8 } });
    expect(textOf("ck-flame-current", labelled)).toBe("F < 0.15 <= M < 0.8 <= G");
    expect(textOf("ck-flame-current", buildProfile({ plate: { goodUa: 0.8 } }))).toBe(
      "F < 0.5 <= M < 2 <= G",
    );
  });

  it("reads another supply in percent of the plate and in volts too", () => {
    const bands = resolveBands("ck-line-voltage", buildProfile({ plate: { ratedVolts: 208 } }));
    expect(bands.map(({ unit, text }) => `${unit}: ${text}`)).toEqual([
      "pctPlate: F < 90 <= M < 92 <= G <= 105 < M <= 108 < F",
      "V: F < 187.2 <= M < 191.36 <= G <= 218.4 < M <= 224.64 < F",
    ]);
  });

  it("tells idle secondary volts from loaded ones by the stage", () => {
    const profile = buildProfile();
    expect(textOf("ck-transformer-secondary", profile, { stage: "power" })).toMatch(/^F < 21/);
    expect(textOf("ck-transformer-secondary", profile, { stage: "gas" })).toMatch(/^F < 20/);
  });

  it("classes the manifold of a modulating unit only at a rate it was forced to", () => {
    const modulating = buildProfile({ codes: { staging: "MOD", draft: "CON" } });
    expect(resolveBands("ck-manifold-pressure", modulating)).toEqual([]);
    expect(textOf("ck-manifold-pressure", modulating, { way: "high-fire" })).toMatch(/^F < 3 <= M < 3.2/);
  });

  it("takes the least draft of a cold day even where it asks for more than the usual target", () => {
    const cold = buildProfile({
      codes: { ignition: "IPS", draft: "ND", control: "MOD-S" },
      plate: { draftMinInwc: -0.03 },
    });
    expect(textOf("ck-draft", cold)).toBe("G <= -0.03 < F");
  });

  it("uses a band overridden for the unit, with its source, before the plate and the default", () => {
    const overridden = buildProfile({
      plate: { dropOutUa: 0.4, goodUa: 2 },
      bands: [
        { check: "ck-flame-current", when: "label", chain: "F < 0.3 <= M < 1.5 <= G", source: "board sheet" },
      ],
    });
    expect(resolveBands("ck-flame-current", overridden)[0]).toMatchObject({
      text: "F < 0.3 <= M < 1.5 <= G",
      from: "override",
      source: "board sheet",
    });
  });
});

describe("reading a chain in its written form", () => {
  it("reads what it writes", () => {
    const text = "F < 108 <= M < 110 <= G <= 126 < M <= 130 < F";
    const parsed = parseChain(text);
    expect(parsed.ok && formatChain(parsed.chain)).toBe(text);
  });

  it.each([
    ["", /Write a class/],
    ["F", /at least two/],
    ["F < 108 < M", /one "<" and one "<="/],
    ["F <= 108 <= M", /one "<" and one "<="/],
    ["F < 110 <= M < 108 <= G", /rise from left to right/],
    ["F < ten <= G", /not a number/],
    ["F < 10 <= F", /neighbouring/],
    ["F < 10 <= M <", /middle|End/],
    ["F < 10 <=", /middle|End|class/],
    ["X < 10 <= G", /Write a class/],
  ])("refuses %j and says why", (text, message) => {
    const parsed = parseChain(text);
    expect(parsed.ok ? "read" : parsed.message).toMatch(message);
    expect(chainTextSchema.safeParse(text).success).toBe(false);
  });
});
