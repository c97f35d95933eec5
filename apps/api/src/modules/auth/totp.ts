import { TWO_STEP_DIGITS } from "@emberladder/contract";
import { TimeSpan } from "oslo";
import { base32 } from "oslo/encoding";
import { createTOTPKeyURI, generateHOTP } from "oslo/otp";

const STEP_SECONDS = 30;
/** Bytes of a secret: 160 bits as RFC 4226 asks for. */
export const TOTP_SECRET_BYTES = 20;

/** The time step of a moment (RFC 6238). */
export function totpStepAt(now: Date): number {
  return Math.floor(now.getTime() / 1000 / STEP_SECONDS);
}

/** The code of a secret at a time step. */
export async function totpCode(secret: Uint8Array, step: number): Promise<string> {
  return generateHOTP(secret, step, TWO_STEP_DIGITS);
}

/**
 * The time step a code belongs to: the present one or a neighbour, for clocks that differ by up to half a
 * minute. Undefined when none fits. The caller must refuse a step that was used before.
 */
export async function matchTotpStep(
  secret: Uint8Array,
  code: string,
  now: Date,
): Promise<number | undefined> {
  const present = totpStepAt(now);
  let match: number | undefined;
  // All three are computed, so that time does not tell which one fitted.
  for (const step of [present, present - 1, present + 1])
    if ((await totpCode(secret, step)) === code) match ??= step;
  return match;
}

/** A secret as an authenticator takes it: by hand, and as an otpauth address for a picture code. */
export function describeTotpSecret(secret: Uint8Array, email: string): { secret: string; uri: string } {
  return {
    secret: base32.encode(secret, { includePadding: false }),
    uri: createTOTPKeyURI("Emberladder", email, secret, {
      digits: TWO_STEP_DIGITS,
      period: new TimeSpan(STEP_SECONDS, "s"),
    }),
  };
}
