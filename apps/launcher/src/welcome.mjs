import { join } from "node:path";
import { readJson } from "../../../db/src/server/server.mjs";
import { computeTwoStepCode, readTwoStepSecret } from "./two-step-code.mjs";

/**
 * An invented person of the demo, as the seed writes them to `accounts.json`.
 *
 * @typedef {{ role: string, name: string, email: string, password: string, company?: string, totpSecretUri?: string }}
 *   DemoAccount
 */

/**
 * Reads the demo's accounts.
 *
 * @param {string} dataDir
 * @returns {DemoAccount[]} empty when there are none
 */
export function readAccounts(dataDir) {
  const value = readJson(join(dataDir, "accounts.json"));
  return Array.isArray(value) ? /** @type {DemoAccount[]} */ (value) : [];
}

/**
 * Says where the product is and how to sign in.
 *
 * @param {{ mode: string, origin: string, publicOrigin?: string, accounts: DemoAccount[], nowMs: number, logFolder: string }} facts
 * @returns {string} several lines
 */
export function describeWelcome({ mode, origin, publicOrigin = origin, accounts, nowMs, logFolder }) {
  const lines = ["", `Emberladder is ready: ${origin}`, ""];
  if (publicOrigin !== origin)
    lines.push(`People reach it at ${publicOrigin}, through the proxy in front of it.`, "");
  if (mode === "demo") {
    lines.push("Everything in it is invented. Sign in as:");
    const width = Math.max(0, ...accounts.map((account) => account.email.length));
    for (const { role, name, email, password, company } of accounts) {
      const who = company === undefined ? name : `${name}, ${company}`;
      lines.push(`  ${role.padEnd(11)} ${email.padEnd(width)}  ${password}  (${who})`);
    }
    for (const { name, totpSecretUri } of accounts) {
      if (totpSecretUri !== undefined) lines.push("", ...describeTwoStep(name, totpSecretUri, nowMs));
    }
    lines.push("", `Mail that the demo sends: ${origin}/dev/mail`);
    lines.push(`Logs: ${logFolder}`);
  }
  lines.push("Ctrl-C stops everything.", "");
  return lines.join("\n");
}

/**
 * @param {string} name
 * @param {string} uri
 * @param {number} nowMs
 * @returns {string[]}
 */
function describeTwoStep(name, uri, nowMs) {
  const { code, secondsLeft } = computeTwoStepCode(uri, nowMs);
  return [
    `${name} signs in with a second step. In an authenticator application add`,
    `  ${uri}`,
    `  (by hand: secret ${readTwoStepSecret(uri)}, based on time, 6 digits)`,
    `Without one: the code is ${code} for ${secondsLeft} more seconds; node apps/launcher/code.mjs prints the next.`,
  ];
}
