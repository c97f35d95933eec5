import { createHmac } from "node:crypto";

const alphabet = "ABCDEFGHIJKLMNOPQRSTUVWXYZ234567";
const stepSeconds = 30;

/**
 * Computes the six digits an authenticator application shows now (RFC 6238: SHA-1, 30 seconds, 6 digits).
 *
 * @param {string} uri `otpauth://totp/...?secret=BASE32`
 * @param {number} nowMs milliseconds since 1970
 * @returns {{ code: string, secondsLeft: number }}
 */
export function computeTwoStepCode(uri, nowMs) {
  const seconds = Math.floor(nowMs / 1000);
  const counter = Buffer.alloc(8);
  counter.writeBigUInt64BE(BigInt(Math.floor(seconds / stepSeconds)));
  const digest = createHmac("sha1", decodeBase32(readTwoStepSecret(uri)))
    .update(counter)
    .digest();
  const offset = (digest.at(-1) ?? 0) & 0x0f;
  const number = (digest.readUInt32BE(offset) & 0x7fffffff) % 1_000_000;
  return { code: String(number).padStart(6, "0"), secondsLeft: stepSeconds - (seconds % stepSeconds) };
}

/**
 * Reads the secret a person may type into an authenticator application by hand.
 *
 * @param {string} uri
 * @returns {string} base 32, without padding
 */
export function readTwoStepSecret(uri) {
  return (new URL(uri).searchParams.get("secret") ?? "").replaceAll("=", "").toUpperCase();
}

/**
 * @param {string} text
 * @returns {Buffer}
 */
function decodeBase32(text) {
  const bits = Array.from(text, (letter) => alphabet.indexOf(letter).toString(2).padStart(5, "0")).join("");
  const bytes = bits.match(/.{8}/g) ?? [];
  return Buffer.from(bytes.map((byte) => Number.parseInt(byte, 2)));
}
