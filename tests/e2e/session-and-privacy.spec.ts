import { expect, test } from "@playwright/test";
import { openCall, openReferenceCall, withFreshFlueCo } from "./support/office.ts";
import { person, signIn } from "./support/people.ts";
import { readPhone } from "./support/phone.ts";
import { collectViolations } from "./support/policy.ts";
import { reference } from "./support/reference.ts";
import { Hands } from "./support/visit.ts";
import { profileOf } from "@emberladder/db/seed";

test("a session that ends in a visit takes nothing: the answer stays, is told, and goes out after signing in again (UX-23)", async ({
  page,
  browser,
  request,
}) => {
  await signIn(page, "ibby");
  const { callId } = await openReferenceCall(browser, reference("01-rod-coated"), withFreshFlueCo);
  const hands = new Hands(page);
  await hands.start(callId);
  await hands.tap("No. CO 0 ppm");
  const chip = page.getByRole("status");
  await expect(chip.filter({ hasText: /On server/ })).toBeVisible();
  const diagnosisId = /diagnoses\/([^/]+)/.exec(page.url())?.[1] ?? "";

  // From another device of theirs, all other sessions are ended.
  const ibby = person("ibby");
  const headers = { origin: new URL(page.url()).origin, "sec-fetch-site": "same-origin" };
  await request.post("/api/auth/sign-in", { data: { email: ibby.email, password: ibby.password }, headers });
  expect((await request.post("/api/auth/sessions/end-others", { headers, data: {} })).status()).toBe(204);

  await hands.tap("None. 0 % LEL");
  await expect(chip.filter({ hasText: "Sign in to send" })).toBeVisible();
  await expect(page.getByRole("button", { name: /^None. 0 % LEL/ })).toHaveAttribute("aria-pressed", "true");
  // The visit goes on, and what is being typed is not interrupted either.
  await hands.tap("Yes", { exact: true });
  await hands.at("confirm");
  const waiting = JSON.parse((await readPhone(page))["emberladder/outbox"] ?? "[]") as unknown[];
  expect(waiting.length, "steps that wait").toBe(2);

  await page.getByText("Sign in to send").click();
  await page.getByRole("button", { name: "Sign in" }).click();
  await page.getByLabel(/e-?mail/i).fill(ibby.email);
  await page.getByLabel(/^password/i).fill(ibby.password);
  await page.getByRole("button", { name: "Sign in" }).click();
  await expect(page.getByText("Nothing waits.")).toBeVisible();
  const record = (await (await request.get(`/api/diagnoses/${diagnosisId}`)).json()) as {
    events: { type: string }[];
  };
  expect(record.events.filter(({ type }) => type === "door.answered")).toHaveLength(3);
  await page.goto(`/diagnoses/${diagnosisId}`);
  await hands.at("confirm");
});

test("after a visit the phone holds no last name, telephone or e-mail of the customer, events hold no name at all, and the content policy refused nothing (SEC-20, SEC-14)", async ({
  page,
  context,
  browser,
}) => {
  const violations = await collectViolations(context);
  await signIn(page, "ibby");
  const planted = {
    firstName: "Odalys",
    lastName: "Quillfeather",
    email: `quill.${Date.now()}@planted.example`,
    phone: "555-014-7788",
  };
  const { callId, unitId } = await openCall(browser, {
    technician: "ibby",
    office: "hollis",
    profile: {
      ...profileOf(reference("01-rod-coated")),
      options: { ...profileOf(reference("01-rod-coated")).options, "stat-battery": true },
    },
    complaint: "No heat since the morning",
    customer: planted,
    address: "7 Planted Lane",
    unitName: "Hall furnace",
  });
  const hands = new Hands(page);
  await page.goto("/calls");
  await expect(page.getByText("Odalys").first()).toBeVisible();
  await page.goto(`/units/${unitId}`);
  await expect(page.getByRole("heading", { level: 1 })).toBeVisible();
  await hands.start(callId);
  await hands.allWell();
  await hands.tap("Hit Thermostat");
  await hands.tap("Blank, has batteries");
  await page.getByText("Add a sentence").click();
  await page.getByLabel("In your words").fill("The screen is blank.");
  await hands.tap(/^Record: /);
  await hands.tap(/batteries replaced/i);
  await hands.tap(/fitted$/);
  await hands.tap("Lit at the first try: 1 of 1");
  await hands.alwaysAsked();
  await hands.closeAndReport();
  await expect(page.getByRole("status").filter({ hasText: /On server/ })).toBeVisible();

  const phone = await readPhone(page);
  expect(phone["emberladder/events"], "the visit is kept").toContain("cause.concluded");
  for (const [place, text] of Object.entries(phone)) {
    for (const secret of [planted.lastName, planted.email, planted.phone])
      expect.soft(text.includes(secret), `${secret} in ${place}`).toBe(false);
  }
  for (const word of [planted.firstName, "Planted Lane", "Castellan", person("ibby").email, "blank."])
    expect.soft(phone["emberladder/events"]?.includes(word), `"${word}" in the events`).toBe(false);
  expect(violations).toEqual([]);
});
