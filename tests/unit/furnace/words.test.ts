import { describe, expect, it } from "vitest";
import {
  CHECKS,
  CHECK_IDS,
  CLOSING_CHECKS,
  FAULTS,
  FIRST_LOOK,
  SAME_FAULTS,
  STOP_RULES,
  STOP_RULE_IDS,
} from "@emberladder/furnace";
import { en } from "@emberladder/words";

function textsOf(node: unknown, path = "trade"): [string, string][] {
  if (typeof node === "string") return [[path, node]];
  if (typeof node !== "object" || node === null) return [];
  return Object.entries(node).flatMap(([key, child]) => textsOf(child, `${path}.${key}`));
}

const texts = textsOf(en);
const words = (text: string) => text.split(/\s+/).filter(Boolean).length;
const sentences = (text: string) => text.split(/(?<=[.?!:])\s+/);

describe("the trade's words", () => {
  it("use only characters that the shipped fonts have in their Latin part", () => {
    const odd = texts.filter(([, text]) => /[^\u0020-\u007E\u00B5]/.test(text));
    expect(odd).toEqual([]);
  });

  it("say nothing empty", () => {
    expect(texts.filter(([, text]) => text.trim() === "" || text !== text.trim())).toEqual([]);
  });

  it("keep a sentence of a check, a rule or the closing under fifteen words", () => {
    const onSite = texts.filter(([path]) =>
      /^trade\.(checks|stopRules|closing|hazards|putBack|standingPilot)\./.test(path),
    );
    const long = onSite.flatMap(([path, text]) =>
      sentences(text)
        .filter((s) => words(s) >= 15)
        .map((s) => `${path}: ${s}`),
    );
    expect(long).toEqual([]);
  });

  it("give every check a title of eight words at most and at most two sentences of doing", () => {
    for (const id of CHECK_IDS) {
      expect(words(en.checks[id].title), id).toBeLessThanOrEqual(8);
      expect(en.checks[id].do.split(/(?<=[.?!])\s+/).length, id).toBeLessThanOrEqual(2);
      expect(en.checks[id].title, id).not.toMatch(/\.$/);
    }
  });

  it("use the words of the trade, not the ids' old ones", () => {
    const wrong = texts.filter(([, text]) =>
      /\b(flame rod|rod\b|draft motor|draft fan|spill device|rollout device|rests open)/i.test(text),
    );
    expect(wrong).toEqual([]);
  });

  it("have words for every act of every stop rule and for no other", () => {
    for (const id of STOP_RULE_IDS) {
      expect(Object.keys(en.stopRules[id].acts), id).toEqual(STOP_RULES[id].acts.map((act) => act.id));
    }
  });

  it("have words for every hit of the first look", () => {
    for (const item of FIRST_LOOK) {
      expect(Object.keys(en.firstLook[item.id].hits).toSorted(), item.id).toEqual(
        item.hits.map((hit) => hit.id).toSorted(),
      );
    }
  });

  it("have words for every circumstance of two names, every way and every thing opened", () => {
    for (const { circumstance } of SAME_FAULTS) expect(Object.keys(en.sameFaults)).toContain(circumstance);
    for (const check of CHECKS) {
      for (const way of check.ways ?? []) expect(en.ways[way.id]).toBeTruthy();
      for (const opening of check.opens)
        expect(en.putBack.out[opening.what]).toContain(en.putBack.what[opening.what]);
    }
  });

  it("tell the customer about every fault in one or two plain sentences without ids or codes", () => {
    for (const { id } of FAULTS) {
      const { plain, name } = en.faults[id];
      expect(plain, id).toMatch(/\.$/);
      expect(sentences(plain).length, id).toBeLessThanOrEqual(2);
      expect(plain, id).not.toMatch(/\b(W|R|C|IFC|HSI|OL)\b|ck-|24 V/);
      expect(words(name), id).toBeLessThanOrEqual(7);
    }
  });

  it("say what is right for every closing check", () => {
    for (const { id } of CLOSING_CHECKS) expect(en.closing[id].right, id).toBeTruthy();
  });
});
