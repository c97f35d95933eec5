import { expect, test } from "@playwright/test";
import { expectFocusSeen, Keys } from "./support/focus.ts";
import { openReferenceCall, withFreshFlueCo } from "./support/office.ts";
import { person, signIn } from "./support/people.ts";
import { reference } from "./support/reference.ts";
import { Hands } from "./support/visit.ts";

test("a whole visit, from sign-in to the report, is done with the keyboard alone (UX-24)", async ({
  page,
  browser,
}) => {
  const { callId } = await openReferenceCall(browser, reference("01-rod-coated"), (profile) => ({
    ...profile,
    options: { ...profile.options, "stat-battery": true },
  }));
  const keys = new Keys(page);
  const ibby = person("ibby");
  await page.goto(`/calls/${callId}`);
  await expect(page.getByRole("heading", { name: "Sign in" })).toBeVisible();
  await keys.reach("E-mail");
  await page.keyboard.type(ibby.email);
  await keys.reach(/^Password/);
  await page.keyboard.type(ibby.password);
  await page.keyboard.press("Enter");
  await keys.press("Start at the door");
  await keys.press("No. CO 0 ppm");
  await keys.press("None. 0 % LEL", "Space");
  await keys.press(/^Yes/);
  await keys.press("Both are right");
  await keys.press("Hit Thermostat");
  await keys.press("Blank, has batteries");
  await keys.press(/^Record: /);
  await keys.press(/batteries replaced/i, "Space");
  await keys.press(/fitted$/);
  await keys.press("Lit at the first try: 1 of 1");
  await keys.press(/^Steady, same with the blower/);
  await keys.press(/^CO 0 ppm/);
  await keys.press(/customer's setting/);
  await keys.press("Close as fixed");
  await keys.press(/^Send the report/);
  await expect(page.getByText(/The report goes to/)).toBeVisible();
});

test("every stop of Tab on the field screens shows its ring, whole, with contrast, under no bar (UX-06)", async ({
  page,
  browser,
}) => {
  await page.goto("/sign-in");
  await expect(page.getByRole("heading", { name: "Sign in" })).toBeVisible();
  await expectFocusSeen(page, "sign-in");
  await signIn(page, "ibby");
  const { callId } = await openReferenceCall(browser, reference("01-rod-coated"), withFreshFlueCo);
  const hands = new Hands(page);
  await expect(page.getByRole("heading", { level: 1 })).toBeVisible();
  await expectFocusSeen(page, "calls");
  await page.goto(`/calls/${callId}`);
  await expect(page.getByRole("button", { name: "Start at the door" })).toBeVisible();
  await expectFocusSeen(page, "call");
  await hands.start(callId);
  await expectFocusSeen(page, "door");
  await hands.allWell();
  await expectFocusSeen(page, "first look");
  await hands.tap("Watch a call for heat");
  await expectFocusSeen(page, "before the watch");
  await hands.tap("None", { exact: true });
  await hands.tap(/Call for heat now/);
  await expectFocusSeen(page, "watch");
  for (const sight of [/^Inducer on/, /^Glow/, /^Flame(?! stays)/, /^Flame lost/]) await hands.tap(sight);
  await hands.at("check");
  await expectFocusSeen(page, "start of a check");
  await hands.tap(/own display/);
  await hands.type("0.2");
  await expectFocusSeen(page, "reading");
  await hands.tap("Record 0.2 µA");
  await hands.tap("Done", { exact: true });
  await hands.at("conclude");
  await expectFocusSeen(page, "conclude");
  const base = page.url().replace(/\/conclude.*/, "");
  await page.goto(`${base}/check?check=ck-limit-voltage`);
  await expect(page.getByRole("heading", { level: 1 })).toBeVisible();
  const start = page.getByRole("button", { name: /Call for heat|Power on|Start this check/ });
  if (await start.count()) await start.first().click();
  await expectFocusSeen(page, "in and out volts");
  for (const screen of ["put-back", "proof", "answers", "close", "safety", "ladder"]) {
    await page.goto(`${base}/${screen}`);
    await expect(page.getByRole("heading", { level: 1 })).toBeVisible();
    await expectFocusSeen(page, screen);
  }
});

test("less motion runs no animation, forced colours keep every edge, a dark system gives attic (UX-27)", async ({
  page,
  browser,
}) => {
  await signIn(page, "ibby");
  const { callId } = await openReferenceCall(browser, reference("01-rod-coated"));
  const hands = new Hands(page);
  await page.emulateMedia({ reducedMotion: "reduce", colorScheme: "dark" });
  const running = () =>
    page.evaluate(() => document.getAnimations().filter(({ playState }) => playState === "running").length);
  const ground = () => page.evaluate(() => getComputedStyle(document.documentElement).backgroundColor);
  expect(await running(), "animations on calls").toBe(0);
  expect(await ground(), "attic's ground").toBe("rgb(11, 17, 19)");
  await page.emulateMedia({ colorScheme: "light" });
  expect(await ground(), "daylight's ground").toBe("rgb(239, 243, 241)");
  await hands.start(callId);
  expect(await running(), "animations at the door").toBe(0);

  await page.emulateMedia({ forcedColors: "active", colorScheme: "dark" });
  const edges = () =>
    page.evaluate(() =>
      [...document.querySelectorAll<HTMLElement>("main button, main input[type=text], main textarea")]
        .filter((element) => element.getBoundingClientRect().width > 0)
        .filter((element) => {
          // Words that are underlined are told by their line, as a link is.
          if (getComputedStyle(element).textDecorationLine.includes("underline")) return false;
          // A field's frame may be drawn around it with its unit.
          const frames = element.tagName === "INPUT" ? [element, element.parentElement] : [element];
          const framed = frames.some((candidate) => {
            if (!candidate) return false;
            const { borderTopWidth, borderTopStyle, borderTopColor, backgroundColor } =
              getComputedStyle(candidate);
            return (
              Number.parseFloat(borderTopWidth) >= 1 &&
              borderTopStyle !== "none" &&
              borderTopColor !== backgroundColor
            );
          });
          return !framed;
        })
        .map((element) => element.textContent),
    );
  /** Lines of the ladder that have the colour of the ground, and so cannot be seen. */
  const lost = () =>
    page.evaluate(() => {
      const own = getComputedStyle(document.documentElement).backgroundColor;
      return [...document.querySelectorAll("svg line")].filter(
        (line) => getComputedStyle(line).stroke === own,
      ).length;
    });
  expect(await edges(), "controls without an edge at the door").toEqual([]);
  expect(await lost(), "lines of the ladder that cannot be seen").toBe(0);
  await hands.allWell();
  await hands.tap("Watch a call for heat");
  await hands.tap("None", { exact: true });
  expect(await edges(), "controls without an edge before the watch").toEqual([]);
  await hands.tap(/Call for heat now/);
  await expect(page.getByText("Tap the highest thing you see.")).toBeVisible();
  expect(await edges(), "controls without an edge on the watch").toEqual([]);
  expect(await running(), "animations on the watch").toBe(0);
  const base = page.url().replace(/\/watch.*/, "");
  await page.goto(`${base}/check?check=ck-inlet-pressure-static`);
  await hands.tap(/Start|door|tap/i);
  await expect(page.locator("main input").first()).toBeVisible();
  expect(await edges(), "controls without an edge at a reading").toEqual([]);
});
