import { expect, test } from "@playwright/test";
import type { Page } from "@playwright/test";
import { codeOf, person } from "./support/people.ts";

/** Opens the newest link of a kind that was mailed to somebody. */
async function followMail(page: Page, email: string, kind: "invite" | "reset"): Promise<void> {
  const rows = page.getByRole("row").filter({ hasText: email });
  await expect
    .poll(
      async () => {
        await page.goto("/dev/mail");
        return rows.filter({ hasText: kind === "invite" ? /invites you/ : /new password/ }).count();
      },
      { timeout: 30_000, message: `the ${kind} is in the inbox` },
    )
    .toBeGreaterThan(0);
  await rows
    .filter({ hasText: kind === "invite" ? /invites you/ : /new password/ })
    .getByRole("link")
    .first()
    .click();
  await page
    .getByRole("link", { name: new RegExp(`/${kind}/`) })
    .first()
    .click();
}

/** Puts text on the clipboard and pastes it into what has the focus. */
async function paste(page: Page, text: string): Promise<void> {
  await page.evaluate((words) => navigator.clipboard.writeText(words), text);
  await page.keyboard.press("Control+V");
}

/*
 * WCAG 2.2, 3.3.8: nothing to remember or to solve. Names of autocomplete from the HTML standard.
 */
test("a supervisor signs in by pasting, invites somebody, who joins, forgets the password and chooses a new one (UX-29)", async ({
  page,
  context,
  browser,
}) => {
  await context.grantPermissions(["clipboard-read", "clipboard-write"]);
  const agnes = person("agnes");
  await page.goto("/sign-in");
  const email = page.getByLabel("E-mail");
  const password = page.getByLabel(/^Password/);
  await expect(email).toHaveAttribute("autocomplete", "username");
  await expect(password).toHaveAttribute("autocomplete", "current-password");
  await email.focus();
  await paste(page, agnes.email);
  await password.focus();
  await paste(page, agnes.password);
  await expect(password).toHaveValue(agnes.password);
  await expect(page.locator("iframe, canvas, img"), "puzzles").toHaveCount(0);
  await page.getByRole("button", { name: "Sign in" }).click();
  const code = page.getByLabel("Two-step code");
  await expect(code).toHaveAttribute("autocomplete", "one-time-code");
  await code.focus();
  await paste(page, await codeOf(agnes));
  await page.getByRole("button", { name: "Go on" }).click();
  await expect(page).toHaveURL(/\/calls/);

  const newcomer = `newcomer.${Date.now()}@bluestemheat.example`;
  await page.goto("/team");
  await page.getByRole("button", { name: "Invite somebody" }).click();
  await page.getByLabel("Name").fill("Tobin Arkwright");
  await page.getByLabel("E-mail").fill(newcomer);
  await page.getByRole("button", { name: "Send the invitation" }).click();
  await expect(page.getByText(`The invitation to ${newcomer} is on its way.`)).toBeVisible();

  const theirs = await browser.newContext({ viewport: { width: 360, height: 640 } });
  const phone = await theirs.newPage();
  await followMail(phone, newcomer, "invite");
  await expect(phone.getByRole("heading", { level: 1 })).toHaveText("Join Bluestem Heat Cooperative");
  await expect(phone.getByLabel(/^New password/)).toHaveAttribute("autocomplete", "new-password");
  await phone.getByLabel(/^New password/).fill("brisk otter under nine lamps");
  await phone.getByRole("button", { name: "Join" }).click();
  await expect(phone.getByRole("heading", { level: 1 })).toHaveText("You have an account");

  await phone.goto("/sign-in");
  await phone.getByRole("link", { name: "Forgotten password" }).click();
  await phone.getByLabel("E-mail").fill(newcomer);
  await phone.getByRole("button", { name: "Send the link" }).click();
  await expect(phone.getByRole("heading", { level: 1 })).toHaveText("Look into your mail");
  await followMail(phone, newcomer, "reset");
  const link = phone.url();
  await phone.getByLabel(/^New password/).fill("seven quiet barges by noon");
  await phone.getByRole("button", { name: "Save the new password" }).click();
  await expect(phone.getByRole("heading", { level: 1 })).toHaveText("The new password is saved");
  // The link works once.
  await phone.goto(link);
  await phone.getByLabel(/^New password/).fill("another pair of wool socks");
  await phone.getByRole("button", { name: "Save the new password" }).click();
  await expect(phone.getByText(/This link is used, or too old/).first()).toBeVisible();
  await phone.goto("/sign-in");
  await phone.getByLabel("E-mail").fill(newcomer);
  await phone.getByLabel(/^Password/).fill("seven quiet barges by noon");
  await phone.getByRole("button", { name: "Sign in" }).click();
  await expect(phone).toHaveURL(/\/calls/);
  await theirs.close();
});
