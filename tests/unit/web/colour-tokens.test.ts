import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";

/**
 * Contrast of the colour roles in every scheme. UX-03 (text), UX-04 (full sun) and UX-05 (marks). Formula and
 * figures: WCAG 2.2, relative luminance and contrast ratio; success criteria 1.4.6 (7:1) and 1.4.11 (3:1).
 */
const css = readFileSync(new URL("../../../apps/web/src/styles/tokens.css", import.meta.url), "utf8");

type Tokens = Record<string, string>;

function tokensOf(selector: string): Tokens {
  const at = css.indexOf(selector);
  const block = css.slice(css.indexOf("{", at) + 1, css.indexOf("}", at));
  return Object.fromEntries(
    [...block.matchAll(/--([a-z-]+):\s*([^;]+);/g)].map(([, name, value]) => [name, value]),
  );
}

const schemes: [string, Tokens][] = [
  ["daylight", tokensOf('[data-scheme="daylight"]')],
  ["attic", tokensOf('\n[data-scheme="attic"]')],
  ["full-sun", tokensOf('[data-scheme="full-sun"]')],
];

function luminance(hex: string): number {
  const [red = 0, green = 0, blue = 0] = [1, 3, 5].map((at) => {
    const share = Number.parseInt(hex.slice(at, at + 2), 16) / 255;
    return share <= 0.04045 ? share / 12.92 : ((share + 0.055) / 1.055) ** 2.4;
  });
  return 0.2126 * red + 0.7152 * green + 0.0722 * blue;
}

function contrast(a = "", b = ""): number {
  const [lighter = 0, darker = 0] = [luminance(a), luminance(b)].toSorted((x, y) => y - x);
  return (lighter + 0.05) / (darker + 0.05);
}

const TEXT_ON_GROUNDS = ["ink", "quiet", "ember", "link", "bypassed", "lead-red"];
const GROUNDS = ["ground", "surface"];
const TEXT_PAIRS = [
  ["on-stopped", "stopped"],
  ["on-caution", "caution"],
] as const;
const MARKS = ["rule", "proven", "stopped", "bypassed", "link", "lead-red", "lead-black"];

describe.each(schemes)("the colours of %s", (name, tokens) => {
  it("are all there", () => {
    for (const token of [...TEXT_ON_GROUNDS, ...GROUNDS, ...MARKS])
      expect(tokens[token], token).toMatch(/^#[0-9a-f]{6}$/);
  });

  it("give text at least 7 to 1 on ground and surface", () => {
    for (const text of TEXT_ON_GROUNDS) {
      for (const ground of GROUNDS) {
        expect(contrast(tokens[text], tokens[ground]), `${text} on ${ground}`).toBeGreaterThanOrEqual(7);
      }
    }
    for (const [text, ground] of TEXT_PAIRS) {
      expect(contrast(tokens[text], tokens[ground]), `${text} on ${ground}`).toBeGreaterThanOrEqual(7);
    }
  });

  it("give borders, icons and marks of state at least 3 to 1", () => {
    for (const mark of MARKS) {
      for (const ground of GROUNDS) {
        expect(contrast(tokens[mark], tokens[ground]), `${mark} on ${ground}`).toBeGreaterThanOrEqual(3);
      }
    }
  });

  it("are the same where the system asks for a dark scheme", () => {
    const system = tokensOf(":root:not([data-scheme])");
    expect(name === "attic" ? system : tokens).toEqual(tokens);
  });
});

describe("full sun", () => {
  it("has no hue and no half tone, and no thin weight", () => {
    const tokens = tokensOf('[data-scheme="full-sun"]');
    const colours = Object.values(tokens).filter((value) => value.startsWith("#"));
    expect(new Set(colours)).toEqual(new Set(["#ffffff", "#000000"]));
    expect(Number(tokens["body-weight"])).toBeGreaterThanOrEqual(400);
    expect(contrast(tokens["ink"], tokens["ground"])).toBe(21);
  });
});
