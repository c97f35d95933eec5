import { expect, test } from "@playwright/test";
import type { Page } from "@playwright/test";
import { openReferenceCall } from "./support/office.ts";
import { signIn } from "./support/people.ts";
import { reference } from "./support/reference.ts";
import { Hands } from "./support/visit.ts";

/** Chooses how the screens look to the person signed in, on this device. */
async function choose(page: Page, choice: string): Promise<void> {
  await page.goto("/account");
  await page.getByText(choice, { exact: true }).click();
}

/** Opens the reading of suction at the pressure switch, on the diagnosis that is open on the page. */
async function openSuction(page: Page, hands: Hands): Promise<void> {
  await hands.allWell();
  const diagnosis = new URL(page.url()).pathname.replace(/\/\w+$/, "");
  await page.goto(`${diagnosis}/check?check=ck-pressure-suction`);
}

interface StoredAnswer {
  type: string;
  body: { check?: string; value?: number; unit?: string; outcome?: string };
}

// A switch that closes at 0.3 in. w.c.: 74.7 Pa, and good from 0.1 in. w.c. above it, 99.6 Pa.
// GNU units: 1 inH2O is 249.08891 Pa.
test("a person who chose SI reads and types pascals, and the record keeps the gauge's inches (UX-37)", async ({
  page,
  browser,
}) => {
  await signIn(page, "ibby");
  await choose(page, "SI: Pa, C, kW");
  const { callId } = await openReferenceCall(browser, reference("01-rod-coated"), (profile) => ({
    ...profile,
    plate: { ...profile.plate, switchMakeInwc: 0.3 },
  }));
  const hands = new Hands(page);
  await hands.start(callId);
  const diagnosisId = new URL(page.url()).pathname.split("/")[2] ?? "";
  await hands.tap("No. CO 0 ppm");
  await hands.tap("None. 0 % LEL");
  await hands.tap("Yes", { exact: true });
  await expect(page.getByText("Pressure switch closes at 74.7 Pa")).toBeVisible();
  await hands.tap("Both are right");
  await hands.at("look");
  await page.goto(`/diagnoses/${diagnosisId}/check?check=ck-pressure-suction`);
  await page
    .getByRole("button", { name: /Burner door/ })
    .first()
    .click();

  const scale = page.getByRole("img", { name: /from 74\.7 to 99\.6/ });
  await expect(scale).toBeVisible();
  const status = page.getByRole("main").getByRole("status");
  await hands.type("99.6");
  await expect(status).toHaveText("holds");
  await hands.type("99.5");
  await expect(status).toHaveText("barely");
  await hands.type("3000");
  await hands.tap("Record 3000 Pa");
  await expect(page.getByRole("alert")).toContainText("-2490.9 to 2490.9 Pa");
  await hands.type("77");
  await hands.tap("Record 77 Pa");
  await expect(page).not.toHaveURL(/check=ck-pressure-suction/);

  // The technician's own record, on the phone.
  await page.goto(`/diagnoses/${diagnosisId}/record`);
  await expect(page.getByText(/Read suction at the pressure switch: 77 Pa/)).toBeVisible();

  // What the server keeps, and what two reviewers see of it.
  const desk = await browser.newContext({ viewport: { width: 1280, height: 800 } });
  const review = await desk.newPage();
  await signIn(review, "hollis");
  await expect(async () => {
    const answer = await desk.request.get(`/api/diagnoses/${diagnosisId}`);
    const { events } = (await answer.json()) as { events: StoredAnswer[] };
    const kept = events.find(({ body }) => body.check === "ck-pressure-suction" && body.value !== undefined);
    expect(kept?.body).toMatchObject({ value: 0.309, unit: "inwc", outcome: "marginal" });
  }).toPass();
  await review.goto(`/review/${diagnosisId}`);
  await expect(review.getByText(/Read suction at the pressure switch: 0\.309 in\. w\.c\./)).toBeVisible();
  await choose(review, "SI: Pa, C, kW");
  await review.goto(`/review/${diagnosisId}`);
  await expect(review.getByText(/Read suction at the pressure switch: 77 Pa/)).toBeVisible();
  await desk.close();
});

test("the ladder stands on the side that a person chose, on every field screen", async ({
  page,
  browser,
}) => {
  await signIn(page, "ibby");
  await choose(page, "Right");
  const { callId } = await openReferenceCall(browser, reference("01-rod-coated"));
  const hands = new Hands(page);
  await hands.start(callId);
  await openSuction(page, hands);
  const strip = page.getByRole("button", { name: "Open the whole ladder" });
  const box = await strip.boundingBox();
  expect((box?.x ?? 0) + (box?.width ?? 0)).toBe(360);
  const question = await page.getByRole("heading", { level: 1 }).boundingBox();
  expect((question?.x ?? 0) + (question?.width ?? 0)).toBeLessThanOrEqual(box?.x ?? 0);
  await choose(page, "Left");
  await page.goto(`/calls/${callId}`);
  await hands.tap("Go on");
  expect((await strip.boundingBox())?.x).toBe(0);
});

test("a screen that was never opened says so without a signal, keeps the ways to the others, and opens with one", async ({
  page,
  context,
}) => {
  await signIn(page, "hollis");
  await expect(page.getByRole("heading", { level: 1 })).toBeVisible();
  await context.route("**/assets/team-screen-*", async (route) => route.abort("internetdisconnected"));
  await page.getByRole("link", { name: "Team" }).click();
  await expect(
    page.getByRole("heading", { name: "No signal. This screen was never opened here." }),
  ).toBeVisible();
  await expect(page.getByText("What you recorded is on this phone.")).toBeVisible();
  await page.getByRole("link", { name: "Calls" }).click();
  await expect(page).toHaveURL(/\/calls/);
  await page.getByRole("link", { name: "Team" }).click();
  await context.unroute("**/assets/team-screen-*");
  await page.getByRole("button", { name: "Try again" }).click();
  await expect(page.getByRole("heading", { level: 1, name: "Team" })).toBeVisible();
});
