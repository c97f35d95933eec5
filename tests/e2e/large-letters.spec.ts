import { expect, test } from "@playwright/test";
import { expectRoomForLetters } from "./support/enlarge.ts";
import { openReferenceCall, withFreshFlueCo } from "./support/office.ts";
import { signIn } from "./support/people.ts";
import { reference } from "./support/reference.ts";
import { Hands } from "./support/visit.ts";

/*
 * WCAG 2.2, 1.4.4 and 1.4.12: letters at twice the size, and the reader's own spacing, at 360 x 640.
 */
test("letters at twice the size or widely spaced clip nothing, scroll nothing sideways and leave the way on in reach (UX-09)", async ({
  page,
  browser,
}) => {
  await page.goto("/sign-in");
  await expect(page.getByRole("heading", { level: 1 })).toBeVisible();
  await expectRoomForLetters(page, "sign-in", "Sign in");
  await signIn(page, "ibby");
  const { callId } = await openReferenceCall(browser, reference("01-rod-coated"), withFreshFlueCo);
  const hands = new Hands(page);
  await page.goto(`/calls/${callId}`);
  await expect(page.getByRole("button", { name: "Start at the door" })).toBeVisible();
  await expectRoomForLetters(page, "call", "Start at the door");
  await hands.start(callId);
  await expectRoomForLetters(page, "door", /^Yes/);
  await hands.tap("No. CO 0 ppm");
  await hands.tap("None. 0 % LEL");
  await hands.tap("Yes", { exact: true });
  await hands.at("confirm");
  await expectRoomForLetters(page, "confirm", "Both are right");
  await hands.tap("Both are right");
  await hands.at("look");
  await expectRoomForLetters(page, "first look", "Watch a call for heat");
  await hands.tap("Watch a call for heat");
  await hands.tap("None", { exact: true });
  await expectRoomForLetters(page, "before the watch", /Call for heat now/);
  await hands.tap(/Call for heat now/);
  await expectRoomForLetters(page, "watch", /^Inducer on/);
  for (const sight of [/^Inducer on/, /^Glow/, /^Flame(?! stays)/, /^Flame lost/]) await hands.tap(sight);
  await hands.at("check");
  await hands.tap(/own display/);
  await hands.type("0.2");
  await expectRoomForLetters(page, "reading", "Record 0.2 µA");
  await hands.tap("Record 0.2 µA");
  await hands.tap("Done", { exact: true });
  await hands.at("conclude");
  await expectRoomForLetters(page, "conclude", "Record: Flame sensor dirty");
  await hands.tap("Record: Flame sensor dirty");
  await hands.at("repair");
  await expectRoomForLetters(page, "repair", "Flame sensor cleaned");
  await hands.tap("Flame sensor cleaned");
  await hands.at("put-back");
  await expectRoomForLetters(page, "put back", "Fitted");
  const base = page.url().replace(/\/put-back.*/, "");
  for (const [screen, wayOn] of [
    ["proof", undefined],
    ["answers", undefined],
    ["close", /^Part needed/],
    ["ladder", undefined],
    ["safety", "Smell of gas"],
  ] as const) {
    await page.goto(`${base}/${screen}`);
    await expect(page.getByRole("heading", { level: 1 })).toBeVisible();
    await expectRoomForLetters(page, screen, wayOn);
  }
});
