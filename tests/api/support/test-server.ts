import { mkdtemp, rm } from "node:fs/promises";
import type { AddressInfo } from "node:net";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { Writable } from "node:stream";
import { readEnvironment } from "@emberladder/api/src/config/environment.ts";
import { createApp } from "@emberladder/api/src/http/create-app.ts";
import { realSources } from "@emberladder/api/src/http/dependencies.ts";
import type { Dependencies } from "@emberladder/api/src/http/dependencies.ts";
import { createLog } from "@emberladder/api/src/log.ts";
import { openDatabase } from "@emberladder/db";
import type { Database } from "@emberladder/db";
import { workerDatabase } from "../../setup/database.ts";

/** The whole server on a free port over this worker's own database. */
export interface TestServer {
  origin: string;
  database: Database;
  dependencies: Dependencies;
  dataDir: string;
  /** Every line that was logged. */
  logged: string[];
  /** Moves the server's clock by some milliseconds. */
  moveClock: (ms: number) => void;
  close: () => Promise<void>;
}

/** An invented secret of the right length. */
export const TEST_SECRET = "2fKx8vQmZ0rTnB7yWcJd4LhGsPeUaXo9";

/**
 * Starts a server.
 *
 * @param variables environment variables beside those that a test server needs
 * @param database address of another database than this worker's
 */
export async function startTestServer(
  variables: Record<string, string> = {},
  database?: { url: string },
): Promise<TestServer> {
  const { url } = database ?? (await workerDatabase());
  const dataDir = await mkdtemp(join(tmpdir(), "emberladder-api-test-"));
  const logged: string[] = [];
  const log = createLog(
    { logLevel: "debug" },
    "api",
    new Writable({
      write: (chunk: Buffer, _encoding, done) => {
        logged.push(chunk.toString());
        done();
      },
    }),
  );
  const connection = openDatabase(url, { connections: 6 });
  let shift = 0;
  const dependencies: Dependencies = {
    ...realSources,
    clock: () => Date.now() + shift,
    database: connection.database,
    log,
    environment: readEnvironment({
      DATABASE_URL: url,
      DATA_DIR: dataDir,
      MAIL_DIR: join(dataDir, "mail"),
      SESSION_SECRET: TEST_SECRET,
      SMTP_URL: "smtp://127.0.0.1:1",
      // Each test client has an address of its own, so that no test spends another's budget.
      TRUST_PROXY: "127.0.0.1",
      ...variables,
    }),
  };
  const server = createApp(dependencies).listen(0, "127.0.0.1");
  await new Promise((resolve) => server.once("listening", resolve));
  return {
    origin: `http://127.0.0.1:${(server.address() as AddressInfo).port}`,
    database: connection.database,
    dependencies,
    dataDir,
    logged,
    moveClock: (ms) => {
      shift += ms;
    },
    close: async () => {
      server.closeAllConnections();
      await new Promise((resolve) => server.close(resolve));
      await connection.close();
      await rm(dataDir, { recursive: true, force: true });
    },
  };
}
