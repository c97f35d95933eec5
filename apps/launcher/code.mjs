/** Prints the present two-step code of every demo account that has one: `node apps/launcher/code.mjs`. */
import { readSettings } from "./src/environment.mjs";
import { computeTwoStepCode } from "./src/two-step-code.mjs";
import { readAccounts } from "./src/welcome.mjs";

const { dataDir } = readSettings({ ...process.env, EMBERLADDER_MODE: "demo" });
const accounts = readAccounts(dataDir).filter((account) => account.totpSecretUri !== undefined);
if (accounts.length === 0) console.log("No demo account has a two-step code yet. Run npm start first.");
for (const { email, totpSecretUri = "" } of accounts) {
  const { code, secondsLeft } = computeTwoStepCode(totpSecretUri, Date.now());
  console.log(`${email}  ${code}  (${secondsLeft} more seconds)`);
}
