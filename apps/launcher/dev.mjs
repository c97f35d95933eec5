/**
 * `npm run dev`: the demo with hot reload. Vite serves the client at the product's address and passes everything
 * else on to the API, which starts again when one of its sources changes.
 */
import { join } from "node:path";
import { findFreePort } from "../../db/src/server/server.mjs";
import { keepRunning } from "./src/children.mjs";
import { readSettings } from "./src/environment.mjs";
import { root } from "./src/paths.mjs";
import { startProduct } from "./src/product.mjs";
import { runUntilStopped } from "./src/run-until-stopped.mjs";
import { describeWelcome } from "./src/welcome.mjs";

await runUntilStopped(async ({ shutdown, reporter, fail }) => {
  const settings = readSettings({ ...process.env, EMBERLADDER_MODE: "demo" });
  const { apiOrigin, accounts, environment } = await startProduct({
    settings,
    flavour: "dev",
    apiPort: await findFreePort(),
    shutdown,
    reporter,
    onFailure: fail,
  });
  const vite = keepRunning(
    {
      name: "vite",
      args: [join(root, "apps/launcher/src/serve-web.mjs")],
      cwd: join(root, "apps/web"),
      env: { ...environment, PORT: String(settings.port), API_ORIGIN: apiOrigin },
      logFile: undefined,
    },
    { onStart: () => undefined, report: (text) => reporter.line("vite", text), onGivenUp: fail },
  );
  shutdown.add("vite", vite.stop);
  process.stdout.write(
    describeWelcome({
      mode: settings.mode,
      origin: `http://127.0.0.1:${settings.port}`,
      accounts,
      nowMs: Date.now(),
      logFolder: "this window",
    }),
  );
});
