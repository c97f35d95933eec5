import { expect, test } from "@playwright/test";
import { expectNoSidewaysScroll, inspectField } from "./support/inspect.ts";
import { openReferenceCall, withFreshFlueCo } from "./support/office.ts";
import { signIn } from "./support/people.ts";
import { reference } from "./support/reference.ts";
import { Hands } from "./support/visit.ts";

/*
 * Every screen of the field flow at 360 x 640 in each scheme: WCAG 2.2 AA with AAA contrast, targets, text sizes,
 * one question a page. UX-01, UX-02, UX-03, UX-04, UX-07, UX-08, UX-11, UX-28, UX-36.
 */
for (const scheme of ["daylight", "attic", "full-sun"] as const) {
  test(`every field screen is legible and reachable in ${scheme}`, async ({ page, browser }) => {
    test.setTimeout(240_000);
    await signIn(page, "ibby");
    await page.evaluate((chosen) => localStorage.setItem("emberladder.scheme", chosen), scheme);
    const { callId } = await openReferenceCall(browser, reference("01-rod-coated"), (profile) => ({
      ...withFreshFlueCo(profile),
      timings: { ...profile.timings, prepurgeS: 0 },
    }));
    const hands = new Hands(page);
    await page.goto("/calls");
    await inspectField(page, "calls");
    await hands.start(callId);
    await inspectField(page, "door");
    await hands.tap("CO higher");
    await inspectField(page, "CO keypad");
    await hands.tap("Back without a number");
    await hands.allWell();
    await inspectField(page, "first look");
    await hands.tap("Hit At the unit");
    await inspectField(page, "at the unit");
    await hands.tap("Back to the looks");
    await hands.tap("Note Status light");
    await inspectField(page, "status light");
    await hands.tap("Ignition failed");
    await page.goBack();
    await page.goForward();
    await hands.tap("Watch a call for heat");
    await hands.tap("One or more");
    await inspectField(page, "before the watch");
    await hands.tap("None", { exact: true });
    await hands.tap(/Call for heat now/);
    await hands.tap(/^Inducer on/);
    await inspectField(page, "watch");
    await hands.tap(/^No glow/);
    await inspectField(page, "no glow");
    await hands.tap("Gas is shut");
    await inspectField(page, "start of a check");
    await hands.tap(/Burner door|Power off/);
    await inspectField(page, "look check");
    await hands.tap("Can't do it");
    await inspectField(page, "cannot do it");
    await hands.tap("Back to the check");
    await hands.tap("Why this?");
    await inspectField(page, "why this");
    const base = page.url().replace(/\/check.*/, "");
    await page.goto(`${base}/check?check=ck-inlet-pressure-static`);
    await hands.tap(/Start|door|tap/i);
    await hands.type("7.1");
    await inspectField(page, "number check");
    await page.goto(`${base}/check?check=ck-limit-voltage`);
    await page.locator("h1").waitFor();
    const start = page.getByRole("button", { name: /Call for heat|Power on|Start this check/ });
    if (await start.count()) await start.first().click();
    await page.getByLabel("In", { exact: true }).fill("24.6");
    await page.getByLabel("Out", { exact: true }).fill("8.1");
    await inspectField(page, "in and out volts");
    await page.goto(`${base}/checks`);
    await inspectField(page, "list of checks");
    await page.goto(`${base}/ladder`);
    await inspectField(page, "ladder");
    await page.goto(`${base}/safety`);
    await inspectField(page, "safety");
    await page.goto(`${base}/put-back`);
    await inspectField(page, "put back");
    await page.goto(`${base}/check?check=ck-igniter-visual`);
    const again = page.getByRole("button", { name: /power off/i });
    if (await again.count()) await again.first().click();
    await hands.tap("Cracked", { exact: true });
    await page.goto(`${base}/conclude?cause=igniter-broken`);
    await inspectField(page, "conclude");
    await hands.tap("Record: Igniter broken");
    await inspectField(page, "repair");
    await hands.tap(/^Igniter replaced/);
    await hands.tap(/fitted$/);
    await page.goto(`${base}/proof`);
    await inspectField(page, "proof");
    await page.goto(`${base}/answers`);
    await inspectField(page, "check answers");
    await page.goto(`${base}/close`);
    await hands.tap(/^Part needed/);
    await inspectField(page, "close");
    await page.goto(`${base}/safety`);
    await hands.tap("Smell of gas");
    await expect(page.getByText("Leave now. Touch no switch. The rest is done outside.")).toBeVisible();
    await inspectField(page, "leave now");
    await hands.tap("I am outside");
    await inspectField(page, "stop");
    await page.setViewportSize({ width: 320, height: 640 });
    await expectNoSidewaysScroll(page, "stop at 320");
    await page.goto("/calls");
    await expectNoSidewaysScroll(page, "calls at 320");
  });
}

test("five quick taps on one answer record it once (UX-20)", async ({ page, browser }) => {
  await signIn(page, "ibby");
  const { callId } = await openReferenceCall(browser, reference("01-rod-coated"));
  const hands = new Hands(page);
  await hands.start(callId);
  await hands.allWell();
  await hands.tap("Watch a call for heat");
  await hands.tap("None", { exact: true });
  await page.getByRole("button", { name: /Call for heat now/ }).click({ clickCount: 5, delay: 20 });
  await expect(page.getByText("Tap the highest thing you see.")).toBeVisible();
  const started = await page.evaluate(
    () =>
      new Promise<number>((resolve) => {
        const open = indexedDB.open("emberladder");
        open.addEventListener("success", () => {
          const all = open.result.transaction("events").objectStore("events").getAll();
          all.addEventListener("success", () =>
            resolve(all.result.filter((event: { type: string }) => event.type === "watch.started").length),
          );
        });
      }),
  );
  expect(started).toBe(1);
});

test("an answer taken back stays in the record, struck through, and the walk goes back (UX-40)", async ({
  page,
  browser,
}) => {
  await signIn(page, "ibby");
  const { callId } = await openReferenceCall(browser, reference("01-rod-coated"));
  const hands = new Hands(page);
  await hands.start(callId);
  await hands.allWell();
  await hands.tap("Hit Filter");
  await hands.tap("Loaded", { exact: true });
  await hands.at("conclude");
  await hands.tap("Take back");
  await hands.at("look");
  await expect(page.getByRole("button", { name: "Hit Filter" })).toHaveAttribute("aria-pressed", "false");
});

test("an impossible reading is refused with its limits, an unlikely one asks to be confirmed (UX-17)", async ({
  page,
  browser,
}) => {
  await signIn(page, "ibby");
  const { callId } = await openReferenceCall(browser, reference("01-rod-coated"));
  const hands = new Hands(page);
  await hands.start(callId);
  await hands.allWell();
  const base = page.url().replace(/\/look.*/, "");
  await page.goto(`${base}/check?check=ck-flame-current`);
  await hands.tap(/own display/);
  await hands.type("900");
  await hands.tap("Record 900 µA");
  await expect(page.getByRole("alert")).toContainText(/The limits are -20 to 100 µA/);
  await hands.type("40");
  await hands.tap("Record 40 µA");
  await expect(page.getByRole("alert")).toContainText(/unlikely/);
  await hands.tap("Yes, record 40 µA");
  await expect(page.getByText("Recorded: check")).toBeVisible();
});

test("what was recorded is there after the browser is closed and opened again (UX-22)", async ({
  page,
  browser,
}) => {
  await signIn(page, "ibby");
  const { callId } = await openReferenceCall(browser, reference("01-rod-coated"));
  const hands = new Hands(page);
  await hands.start(callId);
  await hands.allWell();
  await hands.tap(/Thermostat/);
  const url = page.url();
  await page.reload();
  await expect(page).toHaveURL(url);
  await expect(page.getByRole("button", { name: /^Thermostat/ }).first()).toHaveAttribute(
    "aria-pressed",
    "true",
  );
});

test("an answer given without the server is kept on the phone and sent when it is back (UX-26)", async ({
  page,
  browser,
  context,
}) => {
  await signIn(page, "ibby");
  const { callId } = await openReferenceCall(browser, reference("01-rod-coated"));
  const hands = new Hands(page);
  await hands.start(callId);
  await context.setOffline(true);
  await hands.tap("No. CO 0 ppm");
  await hands.tap("None. 0 % LEL");
  await expect(page.getByRole("status").filter({ hasText: /to send/ })).toBeVisible();
  await context.setOffline(false);
  await page.evaluate(() => dispatchEvent(new Event("online")));
  await expect(page.getByRole("status").filter({ hasText: /On server/ })).toBeVisible();
});
