import { expect } from "@playwright/test";
import type { Page } from "@playwright/test";

/** Where the focus is after a Tab: its place in the document, its name, and what is wrong with how it is shown. */
interface Stop {
  key: string;
  name: string;
  problems: string[];
}

/**
 * Looks at the element with the focus: its ring is at least 2 px wide, has a contrast of 3 to 1 against what lies
 * under it in each scheme, is not cut off, and the element is not under a bar. WCAG 2.2, 2.4.11 and 2.4.13.
 */
async function lookAtFocus(page: Page): Promise<Stop | null> {
  return page.evaluate(() => {
    const focused = document.activeElement;
    if (!(focused instanceof HTMLElement) || focused === document.body) return null;
    const name = (focused.getAttribute("aria-label") || focused.textContent || focused.tagName).trim();
    const problems: string[] = [];
    const holder = [focused, focused.parentElement].find((element) => {
      if (!element) return false;
      const { outlineStyle, outlineWidth } = getComputedStyle(element);
      return outlineStyle !== "none" && Number.parseFloat(outlineWidth) >= 2;
    });
    const key = [...document.querySelectorAll("*")].indexOf(focused).toString();
    if (!holder) return { key, name, problems: ["no ring"] };

    const channels = (colour: string) => (colour.match(/[\d.]+/g) ?? []).map(Number);
    const isClear = (colour: string) => channels(colour).length === 4 && channels(colour)[3] === 0;
    const luminance = (colour: string) => {
      const [red = 0, green = 0, blue = 0] = channels(colour).map((channel) => {
        const share = channel / 255;
        return share <= 0.04045 ? share / 12.92 : ((share + 0.055) / 1.055) ** 2.4;
      });
      return 0.2126 * red + 0.7152 * green + 0.0722 * blue;
    };
    const groundOf = (element: Element | null): string => {
      if (!element) return "rgb(255, 255, 255)";
      const { backgroundColor } = getComputedStyle(element);
      return isClear(backgroundColor) ? groundOf(element.parentElement) : backgroundColor;
    };
    const offset = Number.parseFloat(getComputedStyle(holder).outlineOffset);
    const root = document.documentElement;
    const chosen = root.dataset["scheme"];
    for (const scheme of ["daylight", "attic", "full-sun"]) {
      root.dataset["scheme"] = scheme;
      const ring = luminance(getComputedStyle(holder).outlineColor);
      const ground = luminance(groundOf(offset < 0 ? holder : holder.parentElement));
      const ratio = (Math.max(ring, ground) + 0.05) / (Math.min(ring, ground) + 0.05);
      if (ratio < 3) problems.push(`ring of ${ratio.toFixed(1)} to 1 in ${scheme}`);
    }
    if (chosen === undefined) delete root.dataset["scheme"];
    else root.dataset["scheme"] = chosen;

    const box = holder.getBoundingClientRect();
    const reach = offset + 2;
    const clip = { left: 0, top: 0, right: root.clientWidth, bottom: innerHeight };
    for (let element = holder.parentElement; element; element = element.parentElement) {
      if (element === root || element === document.body) continue;
      const style = getComputedStyle(element);
      if (style.overflowX === "visible" && style.overflowY === "visible") continue;
      const around = element.getBoundingClientRect();
      clip.left = Math.max(clip.left, around.left);
      clip.top = Math.max(clip.top, around.top);
      clip.right = Math.min(clip.right, around.right);
      clip.bottom = Math.min(clip.bottom, around.bottom);
    }
    const isLarge = box.height > clip.bottom - clip.top;
    if (box.left - reach < clip.left - 0.5 || box.right + reach > clip.right + 0.5)
      problems.push("ring cut off at a side");
    if (!isLarge && (box.top - reach < clip.top - 0.5 || box.bottom + reach > clip.bottom + 0.5))
      problems.push("ring cut off above or below");

    const own = focused.getClientRects()[0] ?? box;
    const hit = document.elementFromPoint(
      (Math.max(own.left, clip.left) + Math.min(own.right, clip.right)) / 2,
      (Math.max(own.top, clip.top) + Math.min(own.bottom, clip.bottom)) / 2,
    );
    const label = focused.closest("label");
    if (!hit || !(focused.contains(hit) || hit.contains(focused) || label?.contains(hit)))
      problems.push(`under ${hit?.tagName ?? "nothing"}`);
    return { key, name, problems };
  });
}

/** Tabs once around a page and holds each stop's ring against the rule. UX-06. */
export async function expectFocusSeen(page: Page, where: string): Promise<void> {
  await page.evaluate(() => {
    if (document.activeElement instanceof HTMLElement) document.activeElement.blur();
    document.querySelector("main")?.scrollTo(0, 0);
    scrollTo(0, 0);
  });
  const seen = new Set<string>();
  const found: string[] = [];
  for (let step = 0; step < 120; step += 1) {
    await page.keyboard.press("Tab");
    const stop = await lookAtFocus(page);
    if (!stop || seen.has(stop.key)) break;
    seen.add(stop.key);
    found.push(...stop.problems.map((problem) => `"${stop.name.slice(0, 40)}": ${problem}`));
  }
  expect(seen.size, `stops of Tab on ${where}`).toBeGreaterThan(2);
  expect.soft(found, `focus on ${where}`).toEqual([]);
}

/** A person with a keyboard and no pointer. */
export class Keys {
  readonly page: Page;
  constructor(page: Page) {
    this.page = page;
  }

  /** Goes on with Tab until the focus is on what has this name. */
  async reach(name: string | RegExp): Promise<void> {
    for (let step = 0; step < 120; step += 1) {
      await this.page.keyboard.press("Tab");
      const here = await this.page.evaluate(() => {
        const focused = document.activeElement;
        const label = focused instanceof HTMLInputElement ? (focused.labels?.[0]?.textContent ?? "") : "";
        return (focused?.getAttribute("aria-label") || label || focused?.textContent || "").trim();
      });
      if (typeof name === "string" ? here.startsWith(name) : name.test(here)) return;
    }
    throw new Error(`Tab never comes to ${String(name)} on ${this.page.url()}.`);
  }

  /** Presses what has this name, once it is there. */
  async press(name: string | RegExp, key: "Enter" | "Space" = "Enter"): Promise<void> {
    await expect(
      this.page
        .getByRole("button", { name })
        .or(this.page.getByRole("link", { name }))
        .or(this.page.getByLabel(name))
        .first(),
    ).toBeVisible();
    await this.reach(name);
    await this.page.keyboard.press(key);
  }
}
