import { fileURLToPath } from "node:url";
import { test } from "@playwright/test";
import type { Page } from "@playwright/test";
import { openReferenceCall, withFreshFlueCo } from "../e2e/support/office.ts";
import { signIn } from "../e2e/support/people.ts";
import { reference } from "../e2e/support/reference.ts";
import { Hands } from "../e2e/support/visit.ts";

/*
 * Takes the pictures of the documents. SCHEMES may name others than daylight, SCREENSHOTS another folder:
 * start the product, then EMBERLADDER_ORIGIN=... npx playwright test --config tests/docs/playwright.config.ts
 */
const folder =
  process.env["SCREENSHOTS"] ?? fileURLToPath(new URL("../../docs/screenshots/", import.meta.url));
const schemes = (process.env["SCHEMES"] ?? "daylight").split(",");
const all = process.env["SCREENSHOTS"] !== undefined;

for (const scheme of schemes) {
  test(`pictures in ${scheme}`, async ({ page, browser }) => {
    test.setTimeout(300_000);
    const suffix = scheme === "daylight" && !all ? "" : `-${scheme}`;
    const take = async (subject: Page, name: string, always = false) => {
      if (!always && !all) return;
      await subject.waitForTimeout(300);
      await subject.screenshot({ path: `${folder}/${name}${suffix}.png` });
    };
    await signIn(page, "ibby");
    await page.evaluate((chosen) => localStorage.setItem("emberladder.scheme", chosen), scheme);
    const { callId } = await openReferenceCall(browser, reference("01-rod-coated"), withFreshFlueCo);
    const hands = new Hands(page);
    await page.goto("/calls");
    await take(page, "calls");
    await page.goto(`/calls/${callId}`);
    await take(page, "call");
    await hands.start(callId);
    await hands.tap("No. CO 0 ppm");
    await hands.tap("None. 0 % LEL");
    await take(page, "door", true);
    await hands.tap("Yes", { exact: true });
    await take(page, "confirm");
    await hands.tap("Both are right");
    await hands.tap("Note Status light");
    await take(page, "status-light");
    await hands.tap("Flame not proved");
    await take(page, "look");
    await hands.tap("Watch a call for heat");
    await take(page, "watch-before");
    await hands.tap("None", { exact: true });
    await hands.tap(/Call for heat now/);
    await hands.tap(/^Inducer on/);
    await page.waitForTimeout(3000);
    await take(page, "watch-inducer");
    await hands.tap(/^Glow/);
    await page.waitForTimeout(2000);
    await hands.tap(/^Flame(?! stays)/);
    await take(page, "watch", true);
    await hands.tap(/^Flame lost/);
    await take(page, "check-start");
    await hands.tap(/own display/);
    await hands.type("0.2");
    await take(page, "reading", true);
    await hands.tap("Record 0.2 µA");
    await take(page, "do");
    const base = page.url().replace(/\/check.*/, "");
    await page.goto(`${base}/ladder`);
    await page.setViewportSize({ width: 360, height: 780 });
    await take(page, "ladder", true);
    await page.setViewportSize({ width: 360, height: 640 });
    await page.goto(`${base}/checks`);
    await take(page, "checks");
    await page.goto(`${base}/check`);
    await hands.tap("Done", { exact: true });
    await take(page, "conclude");
    await hands.tap("Record: Flame sensor dirty");
    await take(page, "repair");
    await hands.tap("Flame sensor cleaned");
    await take(page, "put-back");
    await hands.tap("Fitted", { exact: true });
    await take(page, "proof");
    await hands.type("4.1");
    await hands.tap("Record 4.1 µA");
    for (const light of [1, 2, 3]) await hands.tap(`Lit at the first try: ${light} of 3`);
    await take(page, "proof-later");
    await hands.tap(/All panels on/);
    await hands.alwaysAsked();
    await take(page, "answers");
    await hands.tap("Close as fixed");
    await take(page, "done");
    await hands.tap(/Send the report/);
    await page.goto(`${base}/safety`);
    await take(page, "safety");
    await page.goto("/sync");
    await take(page, "sync");
    await page.goto("/account");
    await take(page, "account");
    await page.goto("/nowhere");
    await take(page, "not-found");

    const desk = await browser.newPage({ viewport: { width: 1280, height: 800 } });
    await signIn(desk, "maud");
    await desk.evaluate((chosen) => localStorage.setItem("emberladder.scheme", chosen), scheme);
    await desk.goto("/review");
    await take(desk, "review-list");
    await desk
      .getByRole("main")
      .getByRole("link", { name: /Call 1081/ })
      .first()
      .click();
    await desk.waitForURL(/review\/.+/);
    await desk
      .getByRole("button", { name: /Read the flame signal/ })
      .first()
      .click();
    await desk.waitForTimeout(800);
    await take(desk, "review", true);
    for (const path of ["calls", "customers", "team", "settings", "account"]) {
      await desk.goto(`/${path}`);
      await take(desk, `desk-${path}`);
    }
    await desk.close();
  });
}
