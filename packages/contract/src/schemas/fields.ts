import { z } from "zod";
import * as limits from "../limits.ts";
import { ROLES } from "../roles.ts";

/** Fields that several forms share, each with its limits and the words of its refusal. */

/** Text on one line: trimmed, no control characters, well-formed Unicode. */
export const lineOf = (most: number, what: string) =>
  z
    .string()
    .trim()
    .min(1, `Enter ${what}.`)
    .max(most, `At most ${most} characters.`)
    .refine((text) => !/[\p{Cc}\p{Cs}]/u.test(text), "Use plain characters on one line.");

/** Text that may run over lines. */
export const textOf = (most: number, what: string) =>
  z
    .string()
    .trim()
    .min(1, `Enter ${what}.`)
    .max(most, `At most ${most} characters.`)
    .refine((text) => !/\p{Cs}|[^\P{Cc}\n\t]/u.test(text), "Use plain characters.");

export const idField = z.uuid("That is not an id of ours.").toLowerCase();
export const emailField = z
  .string()
  .trim()
  .toLowerCase()
  .max(limits.MAX_EMAIL, `At most ${limits.MAX_EMAIL} characters.`)
  .pipe(z.email("Enter an e-mail address such as name@company.example."));
export const personNameField = lineOf(limits.MAX_NAME, "a name");
export const phoneField = lineOf(limits.MAX_PHONE, "a phone number");
/** A password as typed: any characters, never trimmed. Length by factor and the block list are judged apart. */
export const passwordField = z
  .string()
  .min(1, "Enter a password.")
  .max(limits.MAX_PASSWORD, `At most ${limits.MAX_PASSWORD} characters.`)
  .refine((text) => !/\p{Cs}/u.test(text), "Use plain characters.");
export const newPasswordField = passwordField.min(
  limits.MIN_PASSWORD_WITH_TWO_STEP,
  `At least ${limits.MIN_PASSWORD_ALONE} characters, or ${limits.MIN_PASSWORD_WITH_TWO_STEP} with two-step codes on.`,
);
export const twoStepCodeField = z
  .string()
  .transform((text) => text.replaceAll(/[\s-]/g, ""))
  .pipe(z.string().regex(/^\d{6}$/, `Enter the ${limits.TWO_STEP_DIGITS} digits.`));
export const recoveryCodeField = z
  .string()
  .max(60)
  .transform((text) => text.toLowerCase().replaceAll(/[^a-z2-7]/g, ""))
  .pipe(z.string().length(24, "A recovery code has 24 letters and digits."));
/** A secret of a link: 256 bits in base64url. */
export const tokenField = z.string().regex(/^[A-Za-z0-9_-]{43}$/, "That link is not complete.");
export const roleField = z.enum(ROLES);
/** An IANA time zone name. */
export const timeZoneField = z
  .string()
  .max(64)
  .regex(/^[A-Za-z]+(?:[/_+-][A-Za-z0-9]+)*$/)
  .refine(isTimeZone, "Enter a time zone such as America/Denver.");
/** A moment as ISO 8601 in UTC, as every response writes it. */
export const momentField = z.iso.datetime();
export const dateField = z.iso.date();
export const hashField = z.string().regex(/^[0-9a-f]{64}$/);

function isTimeZone(name: string): boolean {
  try {
    return new Intl.DateTimeFormat("en", { timeZone: name }).resolvedOptions().timeZone.length > 0;
  } catch {
    return false;
  }
}

/** Query fields of a paged list. Numbers arrive as text. */
export const pageQuery = {
  page: z.coerce.number().int().min(1).max(10_000).default(1),
  pageSize: z.coerce.number().int().min(1).max(limits.MAX_PAGE_SIZE).default(limits.DEFAULT_PAGE_SIZE),
};

/** A page of a list with the count of all its rows. */
export const pageOf = <T extends z.ZodType>(item: T) =>
  z.strictObject({
    items: z.array(item),
    total: z.number().int(),
    page: z.number().int(),
    pageSize: z.number().int(),
  });
