import { expect, test } from "@playwright/test";
import type { Page } from "@playwright/test";
import { expectFocusSeen } from "./support/focus.ts";
import { expectAccessible, expectNoSidewaysScroll, expectOneQuestion } from "./support/inspect.ts";
import { signIn } from "./support/people.ts";
import { collectViolations } from "./support/policy.ts";

/** The pages of the desk, with a word that tells that the page has what it shows. */
const PAGES: [path: string, shows: RegExp][] = [
  ["/calls", /./],
  ["/review", /Review/],
  ["/customers", /Customers/],
  ["/team", /Team/],
  ["/account", /./],
  ["/settings", /./],
];

async function open(page: Page, path: string, shows: RegExp): Promise<void> {
  await page.goto(path);
  await expect(page.getByRole("heading", { level: 1 })).toHaveText(shows);
  await expect(page.getByText(/^Fetching/)).toHaveCount(0);
}

test.describe("at a desk", () => {
  test.use({ viewport: { width: 1280, height: 800 } });

  test("a supervisor's pages are accessible in every scheme, fit every width, have one heading and no key for a word, and break no content policy (UX-08, UX-28, SEC-14)", async ({
    page,
    context,
  }) => {
    test.setTimeout(180_000);
    const violations = await collectViolations(context);
    await signIn(page, "maud");
    await page.goto("/review");
    const record = await page
      .getByRole("link", { name: /^Call \d+/ })
      .first()
      .getAttribute("href");
    expect(record).toMatch(/^\/review\//);

    for (const [path, shows] of [...PAGES, [record ?? "", /^Call \d+/] as [string, RegExp]]) {
      await page.setViewportSize({ width: 1280, height: 800 });
      await open(page, path, shows);
      await expectOneQuestion(page, path);
      for (const scheme of ["daylight", "attic", "full-sun"]) {
        await page.evaluate((chosen) => {
          document.documentElement.dataset["scheme"] = chosen;
        }, scheme);
        await expectAccessible(page, `${path} in ${scheme}`, false);
      }
      for (const width of [1280, 768, 360, 320]) {
        await page.setViewportSize({ width, height: 800 });
        await expectNoSidewaysScroll(page, `${path} at ${width}`);
      }
    }

    // One review, walked by the keyboard: the record is as it was received, and the slider goes step by step.
    await page.setViewportSize({ width: 1280, height: 800 });
    await expect(page.getByText(/^Record unaltered: \d+ events checked\.$/)).toBeVisible();
    const slider = page.getByRole("slider", { name: "Step" });
    const count = Number(await slider.getAttribute("max"));
    await slider.focus();
    await page.keyboard.press("Home");
    await expect(page.getByText(`Step 1 of ${count}`)).toBeVisible();
    await expect(page).toHaveURL(/step=1$/);
    await page.keyboard.press("ArrowRight");
    await page.keyboard.press("ArrowRight");
    await expect(page.getByText(`Step 3 of ${count}`)).toBeVisible();
    await page.keyboard.press("End");
    await expect(page.getByText(`Step ${count} of ${count}`)).toBeVisible();
    await expectFocusSeen(page, "review");
    await open(page, "/customers", /Customers/);
    await expectFocusSeen(page, "customers");
    expect(violations).toEqual([]);
  });
});
