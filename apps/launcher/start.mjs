/** `npm start`: brings up everything, serves the product, and stops all of it on Ctrl-C. */
const [major = 0] = process.versions.node.split(".").map(Number);
if (major < 20) {
  console.error(`Emberladder needs Node 20 or newer. This is Node ${process.versions.node}.`);
  process.exit(1);
}

const { readSettings } = await import("./src/environment.mjs");
const { startProduct } = await import("./src/product.mjs");
const { runUntilStopped } = await import("./src/run-until-stopped.mjs");
const { describeWelcome } = await import("./src/welcome.mjs");

await runUntilStopped(async ({ shutdown, reporter, fail }) => {
  const settings = readSettings(process.env);
  reporter.line("Emberladder", `mode ${settings.mode}, data in ${settings.dataDir}`);
  const { apiOrigin, accounts } = await startProduct({
    settings,
    flavour: "built",
    apiPort: settings.port,
    shutdown,
    reporter,
    onFailure: fail,
  });
  process.stdout.write(
    describeWelcome({
      mode: settings.mode,
      origin: apiOrigin,
      publicOrigin: settings.publicOrigin,
      accounts,
      nowMs: Date.now(),
      logFolder: `${settings.dataDir}/logs`,
    }),
  );
});
