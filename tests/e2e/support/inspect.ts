import { createRequire } from "node:module";
import { readFileSync } from "node:fs";
import { expect } from "@playwright/test";
import type { Page } from "@playwright/test";

const axeSource = readFileSync(createRequire(import.meta.url).resolve("axe-core/axe.min.js"), "utf8");

interface AxeResult {
  violations: { id: string; nodes: { target: string[]; failureSummary: string }[] }[];
}

/** Accessibility by axe: WCAG 2.2 A and AA, and AAA contrast where `field` is set. UX-03, UX-28. */
export async function expectAccessible(page: Page, where: string, field: boolean): Promise<void> {
  await page.evaluate(axeSource);
  const result = (await page.evaluate(
    (enhanced) =>
      (
        globalThis as unknown as { axe: { run: (root: Document, options: unknown) => Promise<unknown> } }
      ).axe.run(document, {
        runOnly: { type: "tag", values: ["wcag2a", "wcag2aa", "wcag21a", "wcag21aa", "wcag22aa"] },
        rules: { "color-contrast-enhanced": { enabled: enhanced }, "target-size": { enabled: true } },
      }),
    field,
  )) as AxeResult;
  const found = result.violations.map(
    ({ id, nodes }) =>
      `${id}: ${nodes
        .map((node) => node.target.join(" "))
        .slice(0, 3)
        .join(" | ")}`,
  );
  expect.soft(found, `axe on ${where}`).toEqual([]);
}

/** Nothing scrolls sideways. UX-08. */
export async function expectNoSidewaysScroll(page: Page, where: string): Promise<void> {
  const over = await page.evaluate(
    () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
  );
  expect.soft(over, `sideways scroll on ${where}`).toBeLessThanOrEqual(0);
}

/** Every control is at least 48 by 48, a radio or a box by its label; text is large enough to read on site. UX-01, UX-07. */
export async function expectFieldSizes(page: Page, where: string): Promise<void> {
  const found = await page.evaluate(() => {
    const problems: string[] = [];
    const isShown = (element: Element) => {
      const box = element.getBoundingClientRect();
      return box.width > 0 && box.height > 0 && getComputedStyle(element).visibility !== "hidden";
    };
    for (const element of document.querySelectorAll<HTMLElement>(
      "a, button, input, select, textarea, summary",
    )) {
      if (!isShown(element) || (element.tagName === "A" && element.classList.contains("sr-only"))) continue;
      const label = element.closest("label");
      const subject = element.matches("input[type=radio], input[type=checkbox]") && label ? label : element;
      const box = subject.getBoundingClientRect();
      const inText = element.tagName === "A" && getComputedStyle(element).display === "inline";
      if (!inText && (box.width < 47.5 || box.height < 47.5)) {
        problems.push(
          `${element.tagName} "${(element.textContent || element.getAttribute("aria-label") || "").slice(0, 30)}" is ${Math.round(box.width)} x ${Math.round(box.height)}`,
        );
      }
      if (
        element.matches("input, textarea, select") &&
        Number.parseFloat(getComputedStyle(element).fontSize) < 16
      )
        problems.push("an input under 16 px");
    }
    for (const element of document.querySelectorAll<HTMLElement>("main p, main li, main dd, main dt")) {
      if (!isShown(element) || element.closest(".sr-only") || element.classList.contains("sr-only")) continue;
      const size = Number.parseFloat(getComputedStyle(element).fontSize);
      if (size < 16) problems.push(`text of ${size} px: "${(element.textContent ?? "").slice(0, 30)}"`);
    }
    return problems;
  });
  expect.soft(found, `sizes on ${where}`).toEqual([]);
}

/** One question a page: one heading of the first level, and no word that is only a key. UX-11, UX-36. */
export async function expectOneQuestion(page: Page, where: string): Promise<void> {
  await expect(page.locator("h1"), `one heading on ${where}`).toHaveCount(1);
  const text = await page.locator("body").innerText();
  expect(
    text.match(/\b(?:trade:|[a-z]+\.[a-z]+[A-Z]?[a-zA-Z]*\.[a-z][a-zA-Z-]+)\b/g) ?? [],
    `untranslated keys on ${where}`,
  ).toEqual([]);
}

/** Everything that is held against a field screen. */
export async function inspectField(page: Page, where: string): Promise<void> {
  await expectOneQuestion(page, where);
  await expectNoSidewaysScroll(page, where);
  await expectFieldSizes(page, where);
  await expectAccessible(page, where, true);
}
