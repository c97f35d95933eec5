import { fileURLToPath } from "node:url";
import { defineConfig } from "@playwright/test";

/**
 * Journeys against the whole product, which tests/run.mjs starts and tells of:
 * EMBERLADDER_ORIGIN is its address, EMBERLADDER_ACCOUNTS the file with the demo's people, EMBERLADDER_MAIL_DIR
 * the folder where its mail arrives, EMBERLADDER_DATA_DIR the folder of its data and logs.
 */
export default defineConfig({
  testDir: ".",
  outputDir: fileURLToPath(new URL("../../.cache/e2e", import.meta.url)),
  workers: 1,
  retries: 0,
  timeout: 90_000,
  expect: { timeout: 10_000 },
  forbidOnly: true,
  use: {
    baseURL: process.env["EMBERLADDER_ORIGIN"] ?? "http://127.0.0.1:4310",
    viewport: { width: 360, height: 640 },
    hasTouch: true,
    actionTimeout: 15_000,
    trace: "retain-on-failure",
    launchOptions: {
      executablePath: process.env["CHROMIUM"] ?? "/usr/bin/chromium",
      args: [
        // Chromium refuses its sandbox to root, which is what continuous integration runs as.
        ...(process.getuid?.() === 0 ? ["--no-sandbox"] : []),
        "--disable-gpu",
        "--disable-quic",
        "--no-first-run",
        "--disable-background-networking",
        "--disable-component-update",
        "--disable-sync",
      ],
    },
  },
});
