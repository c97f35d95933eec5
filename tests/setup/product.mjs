/**
 * The whole product (database, API, worker, mail server, built client) with the demo's data, in a temporary
 * folder, for browser tests.
 *
 * By itself, `PORT=4390 node tests/setup/product.mjs` serves it until it is told to stop.
 */
import { join } from "node:path";
import { fileURLToPath } from "node:url";
import { startProduct } from "../../apps/launcher/src/product.mjs";
import { silentReporter } from "../../apps/launcher/src/report.mjs";
import { runUntilStopped } from "../../apps/launcher/src/run-until-stopped.mjs";
import { findFreePort } from "../../db/src/server/server.mjs";
import { makeTestFolder } from "./test-folder.mjs";

/** @typedef {import("../../apps/launcher/src/report.mjs").Reporter} Reporter */
/** @typedef {import("../../apps/launcher/src/shutdown.mjs").Shutdown} Shutdown */

/**
 * Where a test finds the product: its address, the file with the demo's accounts, the folder where the demo's mail
 * server puts messages, and the folder of logs.
 *
 * @typedef {{ origin: string, accountsFile: string, mailDir: string, dataDir: string }} TestProduct
 */

/**
 * Starts the product for tests. Everything is ended through `shutdown`.
 *
 * @param {{ folder: import("./test-folder.mjs").TestFolder, shutdown: Shutdown, reporter?: Reporter, port?: number,
 *   onFailure?: (error: Error) => void }} options `port` defaults to any free one
 * @returns {Promise<TestProduct>}
 */
export async function startTestProduct({
  folder,
  shutdown,
  reporter = silentReporter,
  port,
  onFailure = () => undefined,
}) {
  const ownPort = port ?? (await findFreePort());
  const origin = `http://127.0.0.1:${ownPort}`;
  const dataDir = join(folder.path, "demo");
  const product = await startProduct({
    settings: { mode: "demo", port: ownPort, dataDir, publicOrigin: origin, smtpUrl: undefined, secrets: {} },
    flavour: "built",
    apiPort: ownPort,
    shutdown,
    reporter,
    onFailure,
  });
  return { origin, accountsFile: join(dataDir, "accounts.json"), mailDir: product.mailDir, dataDir };
}

/**
 * How a test process learns where the product is.
 *
 * @param {TestProduct} product
 * @returns {Record<string, string>} environment variables
 */
export function describeTestProduct({ origin, accountsFile, mailDir, dataDir }) {
  return {
    EMBERLADDER_ORIGIN: origin,
    EMBERLADDER_ACCOUNTS: accountsFile,
    EMBERLADDER_MAIL_DIR: mailDir,
    EMBERLADDER_DATA_DIR: dataDir,
  };
}

if (process.argv[1] === fileURLToPath(import.meta.url)) {
  await runUntilStopped(async ({ shutdown, reporter, fail }) => {
    const folder = await makeTestFolder();
    shutdown.add("the test folder", folder.remove);
    const port = Number(process.env["PORT"] ?? 4390);
    const product = await startTestProduct({ folder, shutdown, reporter, port, onFailure: fail });
    reporter.line("product", JSON.stringify(describeTestProduct(product)));
  });
}
