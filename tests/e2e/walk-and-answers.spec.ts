import { expect, test } from "@playwright/test";
import type { Page } from "@playwright/test";
import { openReferenceCall, withFreshFlueCo } from "./support/office.ts";
import { signIn } from "./support/people.ts";
import { reference } from "./support/reference.ts";
import { Hands } from "./support/visit.ts";

test.beforeEach(async ({ page }) => signIn(page, "ibby"));

const heading = (page: Page) => page.getByRole("heading", { level: 1 });

/*
 * GOV.UK Design System, from memory: question pages keep what was given when one goes back; check answers shows
 * everything with a way to change it, says what is missing, and its button says what it does. Progress is text.
 */
test("a walk tells its progress in words, goes back through what was given, and every answer can be changed (UX-12, UX-15, UX-19)", async ({
  page,
  browser,
}) => {
  const { callId } = await openReferenceCall(browser, reference("01-rod-coated"), withFreshFlueCo);
  const hands = new Hands(page);
  await hands.start(callId);
  await hands.allWell();
  await page
    .getByRole("button", { name: /^Filter/ })
    .first()
    .click();
  await hands.tap("Note Status light");
  await hands.tap("Flame not proved");
  await hands.tap("Watch a call for heat");
  await hands.tap("None", { exact: true });
  await hands.tap(/Call for heat now/);
  for (const sight of [/^Inducer on/, /^Glow/, /^Flame(?! stays)/, /^Flame lost/]) await hands.tap(sight);
  await hands.at("check");
  // The rung where it stopped, of all rungs of this unit; the total is certain, it is the unit's ladder.
  await expect(page.getByText(/^Stopped at \d+ of \d+$/)).toBeVisible();
  const ladder = (await page.getByText(/^Stopped at \d+ of \d+$/).textContent()) ?? "";
  await hands.tap(/own display/);
  await hands.type("0.2");
  await hands.tap("Record 0.2 µA");
  await hands.tap("Done", { exact: true });
  await hands.at("conclude");
  await hands.tap("Record: Flame sensor dirty");
  await hands.at("repair");
  await hands.tap("Flame sensor cleaned");
  await hands.at("put-back");
  await hands.tap("Fitted", { exact: true });
  await hands.at("proof");
  const left = Number(/^(\d+) left to prove$/.exec((await heading(page).textContent()) ?? "")?.[1]);
  expect(left, "closing checks left").toBeGreaterThan(2);
  await hands.type("4.1");
  await hands.tap("Record 4.1 µA");
  await expect(heading(page)).toHaveText(`${left - 1} left to prove`);

  // Back, page by page, to the state last seen on each.
  await page.goBack();
  await hands.at("put-back");
  await page.goBack();
  await hands.at("repair");
  await expect(page.getByRole("button", { name: "Flame sensor cleaned" })).toHaveAttribute(
    "aria-pressed",
    "true",
  );
  await page.goBack();
  await hands.at("conclude");
  await expect(heading(page)).toHaveText("Flame sensor dirty");
  await page.goBack();
  await hands.at("check");
  await expect(heading(page)).toContainText(/flame/i);
  await page.goBack();
  // A call for heat is over and cannot be seen again: its page asks for another one.
  await hands.at("watch");
  await page.goBack();
  await hands.at("look");
  await expect(page.getByRole("button", { name: /^Filter/ }).first()).toHaveAttribute("aria-pressed", "true");
  await expect(page.getByRole("button", { name: "Note Status light" })).toHaveAttribute(
    "aria-pressed",
    "true",
  );
  await page.goBack();
  await hands.at("confirm");
  await page.goBack();
  await hands.at("door");
  for (const answer of ["No. CO 0 ppm", "None. 0 % LEL", "Yes"])
    await expect(page.getByRole("button", { name: new RegExp(`^${answer}`) })).toHaveAttribute(
      "aria-pressed",
      "true",
    );

  // Check answers: a row each, what is missing said, and the way on named by its act.
  const base = page.url().replace(/\/door.*/, "");
  await page.goto(`${base}/answers`);
  const rows = page.locator("main dl > div");
  await expect(rows.filter({ hasText: ladder })).toHaveCount(1);
  expect(await rows.count()).toBeGreaterThan(7);
  await expect(rows.filter({ has: page.getByRole("link", { name: /^Change/ }) })).toHaveCount(
    await rows.count(),
  );
  // What the record fills in by itself is listed too, so there may be more than the technician has to do.
  expect(await rows.filter({ hasText: "Not provided" }).count()).toBeGreaterThanOrEqual(left - 1);
  await expect(page.getByText("Before it can close as Fixed:")).toBeVisible();
  await expect(page.getByRole("button", { name: /^Close/ })).toHaveCount(0);
  const before = await rows.allTextContents();
  await page.getByRole("link", { name: "Change Filter" }).click();
  await hands.at("look");
  await hands.tap("Back");
  await hands.at("answers");
  expect(await rows.allTextContents(), "answers after looking at one").toEqual(before);

  await page.goto(`${base}/proof`);
  for (const light of [1, 2, 3]) await hands.tap(`Lit at the first try: ${light} of 3`);
  await hands.tap(/All panels on/);
  await hands.alwaysAsked();
  await hands.at("answers");
  await expect(rows.filter({ hasText: "Not provided" })).toHaveCount(0);
  await expect(page.getByRole("button", { name: "Close as fixed" })).toBeVisible();
});

test("a reading gone back to, or changed from the answers, is filled in with what was recorded, and a change returns there (UX-12, UX-19)", async ({
  page,
  browser,
}) => {
  const { callId } = await openReferenceCall(browser, reference("01-rod-coated"), withFreshFlueCo);
  const hands = new Hands(page);
  await hands.start(callId);
  await hands.allWell();
  await hands.tap("Watch a call for heat");
  await hands.tap("None", { exact: true });
  await hands.tap(/Call for heat now/);
  for (const sight of [/^Inducer on/, /^Glow/, /^Flame(?! stays)/, /^Flame lost/]) await hands.tap(sight);
  await hands.tap(/own display/);
  await hands.type("0.2");
  await hands.tap("Record 0.2 µA");
  await expect(page.locator("main input")).toHaveCount(0);
  await page.goBack();
  await expect(page.locator("main input").first()).toHaveValue("0.2");
  await expect(page.getByRole("button", { name: "Record 0.2 µA" })).toBeVisible();
  await page.goForward();
  await hands.tap("Done", { exact: true });
  await hands.at("conclude");
  const base = page.url().replace(/\/conclude.*/, "");
  await page.goto(`${base}/answers`);
  const rows = page.locator("main dl > div");
  await expect(rows.filter({ hasText: "0.2 µA" })).toHaveCount(1);
  await rows
    .filter({ hasText: "0.2 µA" })
    .getByRole("link", { name: /^Change/ })
    .click();
  await expect(page.locator("main input").first()).toHaveValue("0.2");
  await hands.tap("Back");
  await hands.at("answers");
  await expect(rows.filter({ hasText: "0.2 µA" })).toHaveCount(1);
});

test("gas smell and CO are one tap away on every field page, with and without a signal (UX-39, UX-15)", async ({
  page,
  browser,
  context,
}) => {
  const { callId } = await openReferenceCall(browser, reference("01-rod-coated"));
  const hands = new Hands(page);
  const safety = page.getByRole("link", { name: "Smell gas? CO alarm?" });
  await page.goto(`/calls/${callId}`);
  await expect(page.getByRole("button", { name: "Start at the door" })).toBeVisible();
  // What the tap needs was fetched while there was a signal.
  await page.waitForLoadState("networkidle");
  await context.setOffline(true);
  await safety.click();
  await expect(page.getByText("Leave now. Touch no switch. The rest is done outside.")).toBeVisible();
  await page.goBack();
  await hands.tap("Start at the door");
  await hands.at("door");
  const base = new URL(page.url()).pathname.replace(/\/door.*/, "");
  const screens = [
    "door",
    "confirm",
    "look",
    "watch",
    "check?check=ck-filter",
    "checks",
    "conclude",
    "repair",
    "put-back",
    "proof",
    "answers",
    "close",
    "ladder",
  ];
  for (const screen of screens) {
    // Inside the page, as a tap would: there is no signal to fetch anything with.
    await page.evaluate((path) => {
      history.pushState({}, "", path);
      dispatchEvent(new PopStateEvent("popstate"));
    }, `${base}/${screen}`);
    await expect(safety, `the way to the acts on ${screen}`).toBeInViewport({ ratio: 1 });
    await safety.click();
    await expect(heading(page), `the acts from ${screen}`).toHaveText("What is wrong?");
    await page.goBack();
  }
  // Nothing was answered yet, and the answers say so.
  await page.evaluate((path) => {
    history.pushState({}, "", path);
    dispatchEvent(new PopStateEvent("popstate"));
  }, `${base}/answers`);
  await expect(page.locator("main dl > div").first()).toContainText("Not provided");
  // A stop rule called without a signal: its acts count down in words, and gas smell takes no tap until outside.
  await safety.click();
  await hands.tap("Someone is unwell");
  await hands.at("stop");
  const words = page.getByText(/^\d+ left to do$/);
  const count = Number.parseInt((await words.textContent()) ?? "", 10);
  expect(count, "acts left").toBeGreaterThan(1);
  await hands.tap("Done", { exact: true });
  await expect(words).toHaveText(`${count - 1} left to do`);
  await expect(safety).toBeVisible();
  await context.setOffline(false);
});
