import { createHash } from "node:crypto";
import { RECOVERY_CODES } from "@emberladder/contract";
import { base32 } from "oslo/encoding";

/** Secrets of links and recovery codes: made from random bytes, kept only as SHA-256. */

const TOKEN_BYTES = 32;
const RECOVERY_CODE_BYTES = 15;

/** SHA-256 in hex. Enough for secrets of 120 bits and more, which nobody can try out. */
export function hashSecret(secret: string): string {
  return createHash("sha256").update(secret).digest("hex");
}

/** A secret for a link: 256 bits in base64url. */
export function makeToken(random: (bytes: number) => Uint8Array): string {
  return Buffer.from(random(TOKEN_BYTES)).toString("base64url");
}

/** Recovery codes of 120 bits each, as people write them: six groups of four. */
export function makeRecoveryCodes(random: (bytes: number) => Uint8Array): string[] {
  return Array.from({ length: RECOVERY_CODES }, () => {
    const code = base32.encode(random(RECOVERY_CODE_BYTES), { includePadding: false }).toLowerCase();
    return code.match(/.{4}/g)?.join("-") ?? code;
  });
}

/** The hash of a recovery code, however its groups were written. */
export function hashRecoveryCode(code: string): string {
  return hashSecret(code.toLowerCase().replaceAll(/[^a-z2-7]/g, ""));
}
