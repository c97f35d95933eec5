import { expect, test } from "@playwright/test";
import { openReferenceCall, withFreshFlueCo } from "./support/office.ts";
import { signIn } from "./support/people.ts";
import { reference } from "./support/reference.ts";
import { Hands } from "./support/visit.ts";

/*
 * Three calls that a technician has every week, counted tap by tap at 360 x 640, from opening the call to sending
 * the report. A typed digit is one tap. UX-20, UX-21.
 */
test.beforeEach(async ({ page }) => signIn(page, "ibby"));

test("a dirty flame sensor takes at most 36 taps", async ({ page, browser }) => {
  const { callId } = await openReferenceCall(browser, reference("01-rod-coated"), withFreshFlueCo);
  const hands = new Hands(page);
  await hands.start(callId);
  await hands.allWell();
  await hands.tap("Note Status light");
  await hands.tap("Flame not proved");
  await hands.tap("Watch a call for heat");
  await hands.tap("None", { exact: true });
  await hands.tap(/Call for heat now/);
  await hands.tap(/^Inducer on/);
  await hands.tap(/^Glow/);
  await hands.tap(/^Flame(?! stays)/);
  await hands.tap(/^Flame lost/);
  await hands.at("check");
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
  await hands.type("4.1");
  await hands.tap("Record 4.1 µA");
  for (const light of [1, 2, 3]) await hands.tap(`Lit at the first try: ${light} of 3`);
  await hands.tap(/All panels on/);
  await hands.alwaysAsked();
  await hands.closeAndReport();
  console.log(`dirty flame sensor: ${hands.taps} taps of 36`);
  expect(hands.taps).toBeLessThanOrEqual(36);
});

test("a cracked igniter takes at most 36 taps", async ({ page, browser }) => {
  const { callId } = await openReferenceCall(browser, reference("01-rod-coated"), (profile) => ({
    ...withFreshFlueCo(profile),
    // A short purge, so that the missing glow is due at once.
    timings: { ...profile.timings, prepurgeS: 0 },
  }));
  const hands = new Hands(page);
  await hands.start(callId);
  await hands.allWell();
  await hands.tap("Note Status light");
  await hands.tap("Ignition failed");
  await hands.tap("Watch a call for heat");
  await hands.tap("None", { exact: true });
  await hands.tap(/Call for heat now/);
  await hands.tap(/^Inducer on/);
  await hands.tap(/^No glow/);
  await hands.tap("Gas is shut");
  await hands.at("check");
  await hands.tap(/Burner door off|Power off/);
  await hands.tap("Cracked", { exact: true });
  await hands.at("conclude");
  await hands.tap("Record: Igniter broken");
  await hands.at("repair");
  await hands.tap(/^Igniter replaced/);
  await hands.tap(/fitted$/);
  await hands.at("put-back");
  await hands.tap("Open again");
  await hands.at("proof");
  await hands.type("3.8");
  await hands.tap("Record 3.8 µA");
  for (const light of [1, 2, 3]) await hands.tap(`Lit at the first try: ${light} of 3`);
  await hands.tap(/All panels on/);
  await hands.alwaysAsked();
  await hands.closeAndReport();
  console.log(`cracked igniter: ${hands.taps} taps of 36`);
  expect(hands.taps).toBeLessThanOrEqual(36);
});

test("dead thermostat batteries take at most 18 taps and no panel off", async ({ page, browser }) => {
  const { callId } = await openReferenceCall(browser, reference("01-rod-coated"), (profile) => ({
    ...profile,
    options: { ...profile.options, "stat-battery": true },
  }));
  const hands = new Hands(page);
  await hands.start(callId);
  await hands.allWell();
  await hands.tap("Hit Thermostat");
  await hands.tap("Blank, has batteries");
  await hands.at("conclude");
  await hands.tap(/^Record: /);
  await hands.at("repair");
  await hands.tap(/batteries replaced/i);
  await hands.tap(/fitted$/);
  await hands.at("proof");
  await hands.tap("Lit at the first try: 1 of 1");
  await hands.alwaysAsked();
  await hands.closeAndReport();
  await expect(page.getByRole("link", { name: /^0\s*Put back/ })).toBeVisible();
  console.log(`dead thermostat batteries: ${hands.taps} taps of 18`);
  expect(hands.taps).toBeLessThanOrEqual(18);
});
