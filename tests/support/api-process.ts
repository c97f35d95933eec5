import { spawn } from "node:child_process";
import type { ChildProcess } from "node:child_process";
import { mkdtemp, rm } from "node:fs/promises";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { setTimeout as sleep } from "node:timers/promises";
import { fileURLToPath } from "node:url";
import { readEnvironment } from "@emberladder/api/src/config/environment.ts";
import { realSources } from "@emberladder/api/src/http/dependencies.ts";
import { createLog } from "@emberladder/api/src/log.ts";
import { openDatabase } from "@emberladder/db";
import { findFreePort, runCommand } from "@emberladder/db/server";
import { TEST_SECRET } from "../api/support/test-server.ts";
import type { TestServer } from "../api/support/test-server.ts";

const root = fileURLToPath(new URL("../../", import.meta.url));

/** A bundle of the server as `npm start` runs it, in a folder of its own. */
export interface ServerBundle {
  main: string;
  remove: () => Promise<void>;
}

/** Bundles the server for one test run, beside the modules that it loads at run time. */
export async function bundleServer(): Promise<ServerBundle> {
  const folder = join(root, `apps/api/node_modules/.cache/emberladder-${process.pid}`);
  const built = await runCommand(process.execPath, [
    join(root, "apps/launcher/src/bundle-server.mjs"),
    folder,
  ]);
  if (built.code !== 0) throw new Error(`The server could not be bundled: ${built.stderr}`);
  return {
    main: join(folder, "main.mjs"),
    remove: async () => rm(folder, { recursive: true, force: true }),
  };
}

/** The server as a process of its own, and this process's way into the same database. */
export interface ApiProcess extends TestServer {
  /** Starts it, again after it was killed, and waits until it is ready. */
  start: () => Promise<void>;
  /** Ends it at once, as a power cut would. */
  kill: () => Promise<void>;
  /** Everything it printed. */
  printed: () => string;
}

/**
 * Prepares a server process over a database; `start` has to be called. `close` ends it and clears up.
 * @param nodeArgs arguments of node, for measurements
 */
export async function prepareApiProcess(
  bundle: ServerBundle,
  databaseUrl: string,
  variables: Record<string, string> = {},
  nodeArgs: readonly string[] = [],
): Promise<ApiProcess> {
  const port = await findFreePort();
  const dataDir = await mkdtemp(join(tmpdir(), "emberladder-process-"));
  const given = {
    DATABASE_URL: databaseUrl,
    DATA_DIR: dataDir,
    SESSION_SECRET: TEST_SECRET,
    SMTP_URL: "smtp://127.0.0.1:1",
    PORT: String(port),
    LOG_LEVEL: "warn",
    ...variables,
  };
  const environment = readEnvironment(given);
  const connection = openDatabase(databaseUrl, { connections: 4 });
  const origin = `http://127.0.0.1:${port}`;
  let printed = "";
  let child: ChildProcess | undefined;
  let ended: Promise<unknown> = Promise.resolve();
  const end = async (signal: NodeJS.Signals) => {
    child?.kill(signal);
    await ended;
  };
  return {
    origin,
    dataDir,
    database: connection.database,
    dependencies: {
      ...realSources,
      environment,
      database: connection.database,
      log: createLog({ logLevel: "silent" }, "api"),
    },
    logged: [],
    moveClock: () => {
      throw new Error("The clock of another process stays as it is.");
    },
    printed: () => printed,
    start: async () => {
      const started = spawn(
        process.execPath,
        ["--enable-source-maps", "--max-semi-space-size=32", ...nodeArgs, bundle.main],
        {
          env: { PATH: process.env["PATH"], TZ: "UTC", NODE_ENV: "production", ...given },
          stdio: ["ignore", "pipe", "pipe"],
        },
      );
      child = started;
      for (const stream of [started.stdout, started.stderr])
        stream.on("data", (chunk) => (printed += String(chunk)));
      let isOver = false;
      ended = new Promise((resolve) =>
        started.once("close", () => {
          isOver = true;
          resolve(undefined);
        }),
      );
      while (!(await isReady(origin))) {
        if (isOver) throw new Error(`The server ended while it started: ${printed}`);
        await sleep(30);
      }
    },
    kill: async () => end("SIGKILL"),
    close: async () => {
      await end("SIGTERM");
      await connection.close();
      await rm(dataDir, { recursive: true, force: true });
    },
  };
}

async function isReady(origin: string): Promise<boolean> {
  try {
    return (await fetch(`${origin}/health/ready`)).ok;
  } catch {
    return false;
  }
}
