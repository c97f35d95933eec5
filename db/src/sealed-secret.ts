import { createCipheriv, createDecipheriv, hkdfSync, randomBytes } from "node:crypto";

/**
 * Keeps a short secret (an authenticator's key) unreadable in the database: AES-256-GCM under a key derived
 * from the installation's secret, which is in the environment and never in the database.
 */

function keyOf(installationSecret: string): Buffer {
  return Buffer.from(hkdfSync("sha256", installationSecret, "emberladder", "two-step-secret-v1", 32));
}

/** Seals bytes; the result is text of `nonce.tag.data` in base64url. */
export function sealSecret(secret: Uint8Array, installationSecret: string): string {
  const nonce = randomBytes(12);
  const cipher = createCipheriv("aes-256-gcm", keyOf(installationSecret), nonce);
  const data = Buffer.concat([cipher.update(secret), cipher.final()]);
  return [nonce, cipher.getAuthTag(), data].map((part) => part.toString("base64url")).join(".");
}

/**
 * Opens what `sealSecret` sealed.
 * @throws when the text was altered or sealed under another secret.
 */
export function openSecret(sealed: string, installationSecret: string): Uint8Array {
  const [nonce, tag, data] = sealed.split(".").map((part) => Buffer.from(part, "base64url"));
  if (!nonce || !tag || !data) throw new Error("A sealed secret has three parts.");
  const decipher = createDecipheriv("aes-256-gcm", keyOf(installationSecret), nonce);
  decipher.setAuthTag(tag);
  return Buffer.concat([decipher.update(data), decipher.final()]);
}
