import { openDatabase } from "@emberladder/db";
import { EnvironmentError, readEnvironment } from "#config/environment.ts";
import { createApp } from "./http/create-app.ts";
import { realSources } from "./http/dependencies.ts";
import type { Dependencies } from "./http/dependencies.ts";
import { describeFault } from "./http/error-handler.ts";
import { createLog } from "./log.ts";
import { isDataOfMode, openFirstRun } from "#modules/company/first-run.ts";

/** Milliseconds given to requests under way when the server is told to stop. */
const GRACE_MS = 5000;

/** Serves HTTP until it is told to stop. */
async function serve(): Promise<void> {
  const environment = readEnvironment(process.env);
  const log = createLog(environment, "api");
  const connection = openDatabase(environment.databaseUrl);
  const dependencies: Dependencies = { environment, database: connection.database, log, ...realSources };
  process.on("unhandledRejection", (error) => {
    log.fatal({ fault: describeFault(error) }, "unhandled");
    process.exit(1);
  });

  if (!(await isDataOfMode(dependencies)))
    throw new EnvironmentError(
      `This database holds companies of another mode than ${environment.mode}. Each mode needs a database of its own.`,
    );
  if (environment.mode === "live") {
    const link = await openFirstRun(dependencies);
    if (link) process.stdout.write(`Set up this installation, once, within a day: ${link}\n`);
  }

  if (environment.mode === "demo") {
    const { seedDemoRecords } = await import("./dev/seed-demo-records.ts");
    await seedDemoRecords(dependencies);
  }

  const server = createApp(dependencies).listen(environment.port, environment.host, (error?: Error) => {
    if (!error) {
      log.info({ port: environment.port }, "listening");
      return;
    }
    process.stderr.write(`The server cannot listen on ${environment.host}:${environment.port}.\n`);
    process.exit(1);
  });
  server.headersTimeout = 15_000;
  server.requestTimeout = 30_000;
  server.keepAliveTimeout = 10_000;

  let isStopping = false;
  const stop = (): void => {
    if (isStopping) return;
    isStopping = true;
    server.close(() => void connection.close().finally(() => process.exit(0)));
    server.closeIdleConnections();
    setTimeout(() => process.exit(0), GRACE_MS).unref();
  };
  process.on("SIGTERM", stop);
  process.on("SIGINT", stop);
}

try {
  await serve();
} catch (error) {
  process.stderr.write(
    error instanceof EnvironmentError
      ? `${error.message}\n`
      : `The server could not start: ${JSON.stringify(describeFault(error))}\n`,
  );
  process.exit(1);
}
