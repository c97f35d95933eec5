import { expect } from "@playwright/test";
import type { Page } from "@playwright/test";

/** How a reader changes the letters: twice the size, or the spacing of WCAG 2.2, 1.4.12. */
export type Letters = "twice" | "spaced";

/** Sets or takes away the reader's own letters, as a browser's setting would. */
async function setLetters(page: Page, letters: Letters | null): Promise<void> {
  const session = await page.context().newCDPSession(page);
  await session.send("Page.setFontSizes", { fontSizes: { standard: letters === "twice" ? 32 : 16 } });
  await session.detach();
  await page.evaluate((chosen) => {
    const sheet = new CSSStyleSheet();
    if (chosen === "spaced")
      sheet.replaceSync(
        "* { line-height: 1.5 !important; letter-spacing: 0.12em !important; word-spacing: 0.16em !important } p { margin-bottom: 2em !important }",
      );
    document.adoptedStyleSheets = [sheet];
  }, letters);
}

/** What is cut off or has to be scrolled sideways on a page. */
async function findClipped(page: Page): Promise<string[]> {
  return page.evaluate(() => {
    const found: string[] = [];
    const root = document.documentElement;
    if (root.scrollWidth > root.clientWidth)
      found.push(`the page is ${root.scrollWidth - root.clientWidth} px too wide`);
    for (const element of document.querySelectorAll<HTMLElement>("body *")) {
      const style = getComputedStyle(element);
      const box = element.getBoundingClientRect();
      if (box.width < 2 || box.height < 2 || element.closest(".sr-only, svg")) continue;
      const words = (element.textContent ?? "").trim().slice(0, 40);
      if (!words) continue;
      // A box that is labelled and has a stop of Tab may scroll by itself.
      const isOwnScroller = element.tabIndex >= 0 && element.getAttribute("role") === "region";
      const clips = (value: string) => value === "hidden" || value === "clip";
      if (element.scrollWidth > element.clientWidth + 1 && style.overflowX !== "visible" && !isOwnScroller)
        found.push(
          `${element.tagName} "${words}" is ${element.scrollWidth - element.clientWidth} px too wide`,
        );
      if (element.scrollHeight > element.clientHeight + 1 && clips(style.overflowY))
        found.push(`${element.tagName} "${words}" is cut off below`);
      // A control holds its words; what stands out of it lies over something else.
      if (
        element.matches("a, button") &&
        style.display !== "inline" &&
        (element.scrollWidth > element.clientWidth + 1 || element.scrollHeight > element.clientHeight + 4)
      )
        found.push(
          `"${words}" stands out of its ${element.tagName} by ${element.scrollWidth - element.clientWidth} and ${element.scrollHeight - element.clientHeight} px`,
        );
      if (
        box.right > root.clientWidth + 1 &&
        box.left < root.clientWidth &&
        !element.closest("[role=region]")
      )
        found.push(`${element.tagName} "${words}" runs out at the right`);
    }
    return [...new Set(found)];
  });
}

/** Holds a page against both: nothing cut off, nothing sideways, and the way on can be reached. UX-09. */
export async function expectRoomForLetters(
  page: Page,
  where: string,
  wayOn?: string | RegExp,
): Promise<void> {
  for (const letters of ["twice", "spaced"] as const) {
    await setLetters(page, letters);
    expect.soft(await findClipped(page), `${where}, letters ${letters}`).toEqual([]);
    if (wayOn) {
      const button = page.getByRole("button", { name: wayOn }).first();
      await button.scrollIntoViewIfNeeded();
      await expect.soft(button, `the way on of ${where}, letters ${letters}`).toBeInViewport({ ratio: 0.9 });
      await button.click({ trial: true });
    }
  }
  await setLetters(page, null);
}
