import { setTimeout as sleep } from "node:timers/promises";
import { openDatabase } from "@emberladder/db";
import { EnvironmentError, readEnvironment } from "#config/environment.ts";
import { tidyUp } from "#modules/auth/housekeeping.ts";
import { runNextJob } from "#modules/jobs/run-next-job.ts";
import { createMailer } from "#modules/mail/mailer.ts";
import { realSources } from "./http/dependencies.ts";
import type { Dependencies } from "./http/dependencies.ts";
import { describeFault } from "./http/error-handler.ts";
import { createLog } from "./log.ts";

/** Pause when nothing is due, and after the database was away. */
const IDLE_MS = 400;
const AWAY_MS = 2000;
const TIDY_EVERY_MS = 3_600_000;

/** Runs jobs one after the other until it is told to stop; the one under way is finished first. */
async function work(): Promise<void> {
  const environment = readEnvironment(process.env);
  const log = createLog(environment, "worker");
  const connection = openDatabase(environment.databaseUrl, { connections: 3 });
  const mailer = createMailer(environment);
  const dependencies: Dependencies = { environment, database: connection.database, log, ...realSources };
  const stopping = new AbortController();
  for (const signal of ["SIGTERM", "SIGINT"] as const) process.on(signal, () => stopping.abort());

  let tidyAt = 0;
  while (!stopping.signal.aborted) {
    let pause = 0;
    try {
      if (Date.now() >= tidyAt) {
        await tidyUp(dependencies);
        tidyAt = Date.now() + TIDY_EVERY_MS;
      }
      if (!(await runNextJob({ ...dependencies, mailer }))) pause = IDLE_MS;
    } catch (error) {
      log.error({ fault: describeFault(error) }, "worker");
      pause = AWAY_MS;
    }
    await sleep(pause, undefined, { signal: stopping.signal }).catch(() => undefined);
  }
  mailer.close();
  await connection.close();
}

try {
  await work();
} catch (error) {
  process.stderr.write(
    error instanceof EnvironmentError
      ? `${error.message}\n`
      : `The worker could not start: ${JSON.stringify(describeFault(error))}\n`,
  );
  process.exitCode = 1;
}
