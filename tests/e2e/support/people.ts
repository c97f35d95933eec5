import { readFileSync } from "node:fs";
import { expect } from "@playwright/test";
import type { Page } from "@playwright/test";
import { base32 } from "oslo/encoding";
import { TOTPController } from "oslo/otp";
import { TimeSpan } from "oslo";

export interface Account {
  role: string;
  name: string;
  company: string;
  email: string;
  password: string;
  totpSecretUri?: string;
}

const file = process.env["EMBERLADDER_ACCOUNTS"] ?? ".data/demo/accounts.json";
const accounts = JSON.parse(readFileSync(file, "utf8")) as Account[];

/** A demo person by the start of the e-mail address. */
export function person(start: string): Account {
  const found = accounts.find((account) => account.email.startsWith(`${start}@`));
  if (!found) throw new Error(`The demo has nobody called ${start}.`);
  return found;
}

/** The present two-step code of a person. */
export async function codeOf(account: Account): Promise<string> {
  const secret = new URL(account.totpSecretUri ?? "").searchParams.get("secret") ?? "";
  return new TOTPController({ digits: 6, period: new TimeSpan(30, "s") }).generate(
    base32.decode(secret, { strict: false }),
  );
}

/** Signs a person in by the form, as they would on a phone. */
export async function signIn(page: Page, start: string): Promise<void> {
  const account = person(start);
  await page.goto("/sign-in");
  await page.getByLabel(/e-?mail/i).fill(account.email);
  await page.getByLabel(/^password/i).fill(account.password);
  await page.getByRole("button", { name: /sign in/i }).click();
  if (account.totpSecretUri) {
    await page
      .getByLabel(/code/i)
      .first()
      .fill(await codeOf(account));
    await page
      .getByRole("button", { name: /go on|confirm|check|enter/i })
      .first()
      .click();
  }
  await expect(page).toHaveURL(/\/calls/);
}
