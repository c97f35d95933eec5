import { join } from "node:path";
import { apiDist, root, webDist } from "./paths.mjs";

/** @typedef {import("./children.mjs").Program} Program */
/** @typedef {import("./environment.mjs").Settings} Settings */

/** `built` runs the bundles; `dev` runs the sources and starts again when one changes. @typedef {"built" | "dev"} Flavour */

const apiFolder = join(root, "apps/api");

const sources = {
  api: "apps/api/src/main.ts",
  worker: "apps/api/src/worker.ts",
  "mail-server": "apps/api/src/dev/mail-server.ts",
  seed: "db/src/seed/main.ts",
};

const bundles = { api: "main.mjs", worker: "worker.mjs", "mail-server": "mail-server.mjs", seed: "seed.mjs" };

// Most of what a request makes is thrown away with it: with more room for it, less time goes into clearing up.
const roomForShortLived = "--max-semi-space-size=32";

/**
 * Describes one program of the server.
 *
 * @param {keyof typeof sources} name
 * @param {{ flavour: Flavour, settings: Settings, env: NodeJS.ProcessEnv }} options
 * @returns {Program}
 */
export function describeProgram(name, { flavour, settings, env }) {
  const watch = name === "seed" ? [] : ["--watch", "--watch-preserve-output"];
  return {
    name,
    args:
      flavour === "built"
        ? ["--enable-source-maps", roomForShortLived, join(apiDist, bundles[name])]
        : ["--import", "tsx", ...watch, join(root, sources[name])],
    cwd: apiFolder,
    env,
    logFile:
      settings.mode === "demo" && flavour === "built"
        ? join(settings.dataDir, "logs", `${name}.log`)
        : undefined,
  };
}

/**
 * The environment variables that the server's programs read.
 *
 * @param {{ settings: Settings, flavour: Flavour, apiPort: number, databaseUrl: string, smtpUrl: string,
 *   smtpPort: number | undefined, secrets: Record<string, string> }} facts `databaseUrl` is the application's, which
 * cannot change the schema; `smtpPort` is where the demo's own mail server listens
 * @returns {NodeJS.ProcessEnv}
 */
export function describeEnvironment({ settings, flavour, apiPort, databaseUrl, smtpUrl, smtpPort, secrets }) {
  return {
    ...process.env,
    ...secrets,
    NODE_ENV: flavour === "built" ? "production" : "development",
    EMBERLADDER_MODE: settings.mode,
    HOST: "127.0.0.1",
    PORT: String(apiPort),
    PUBLIC_ORIGIN: settings.publicOrigin,
    DATABASE_URL: databaseUrl,
    DATA_DIR: settings.dataDir,
    WEB_DIST: webDist,
    SMTP_URL: smtpUrl,
    MAIL_DIR: join(settings.dataDir, "mail"),
    ...(smtpPort === undefined ? {} : { SMTP_PORT: String(smtpPort) }),
  };
}
