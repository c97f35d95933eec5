/**
 * `npm run bench`: how fast events are taken over HTTP, beside a bare Express and mysql2 that inserts the same
 * rows in one transaction, on the same database and in the same run. Every commit is on the disk in both
 * (innodb_flush_log_at_trx_commit=1). Both
 * are measured visit by visit in turn, so that a busy machine slows them alike; what counts is the median of the ratios. Ends with code 1 where a ratio is under its bound.
 *
 * `npm run bench -- batch` measures the cases with that word in their names; BENCH_TURNS sets how often, and
 * BENCH_PROFILE a folder for a CPU profile of the server.
 */
import { spawn } from "node:child_process";
import { setTimeout as sleep } from "node:timers/promises";
import { fileURLToPath } from "node:url";
import { calls, devices, inTransaction, installShippedTrees, people, treeVersions } from "@emberladder/db";
import { administer, findFreePort } from "@emberladder/db/server";
import { eq } from "drizzle-orm";
import { v7 as uuidv7 } from "uuid";
import { makeCompany } from "../api/support/company.ts";
import { createSessionKeeper } from "@emberladder/api/src/modules/auth/sessions.ts";
import { startTestDatabase } from "../setup/test-database.mjs";
import { makeTestFolder } from "../setup/test-folder.mjs";
import { bundleServer, prepareApiProcess } from "../support/api-process.ts";
import type { ApiProcess } from "../support/api-process.ts";
import { databaseUrl } from "@emberladder/db/server";
import { sendAll } from "./send-all.ts";
import type { Shot } from "./send-all.ts";
import { EVENTS_OF_A_VISIT, makeRows, makeVisit } from "./workload.ts";
import type { Sender } from "./workload.ts";

interface Case {
  name: string;
  bound: number;
  connections: number;
  /** Events in one request. */
  batch: number;
  /** Visits that each connection sends in one turn. */
  visits: number;
}

const CASES: readonly Case[] = [
  { name: "batch of 50 events, 1 connection", bound: 0.5, connections: 1, batch: 50, visits: 20 },
  { name: "one event, 1 connection", bound: 0.5, connections: 1, batch: 1, visits: 6 },
  { name: "one event, 16 connections", bound: 0.3, connections: 16, batch: 1, visits: 2 },
];
const TURNS = Number(process.env["BENCH_TURNS"] ?? 9);
const [only] = process.argv.slice(2);

type Phone = Sender & { cookie: string };

const closers: (() => Promise<unknown>)[] = [];
try {
  const folder = await makeTestFolder();
  closers.push(folder.remove);
  const { facts, stop } = await startTestDatabase(folder);
  closers.push(stop);
  // The same columns and keys; without the foreign keys, which only makes the baseline faster.
  await administer({
    socket: facts.socket,
    sql: `create table ${facts.template}.baseline_events like ${facts.template}.events;`,
  });
  const bundle = await bundleServer();
  closers.push(bundle.remove);
  const url = databaseUrl({ user: facts.users.application, port: facts.port, database: facts.template });
  const profile = process.env["BENCH_PROFILE"];
  const api = await prepareApiProcess(
    bundle,
    url,
    { RATE_LIMIT_SCALE: "10000" },
    profile === undefined ? [] : ["--cpu-prof", `--cpu-prof-dir=${profile}`],
  );
  closers.push(api.close);
  await api.start();
  const baseline = await startBaseline(
    databaseUrl({ user: facts.users.migrator, port: facts.port, database: facts.template }),
  );
  closers.push(baseline.stop);
  const phones = await makePhones(api, 16);
  let isUnder = false;
  for (const one of CASES.filter(({ name }) => only === undefined || name.includes(only)))
    isUnder = !(await measureCase(one, { api, baseline, phones })) || isUnder;
  process.exitCode = isUnder ? 1 : 0;
} finally {
  for (const close of closers.toReversed()) await close();
}

/** Measures one case in turns and prints it. @returns whether the bound is met */
async function measureCase(
  one: Case,
  { api, baseline, phones }: { api: ApiProcess; baseline: { origin: string }; phones: Phone[] },
): Promise<boolean> {
  const senders = phones.slice(0, one.connections);
  const events = one.visits * EVENTS_OF_A_VISIT * one.connections;
  const ratios: number[] = [];
  const speeds: { product: number; bare: number }[] = [];
  // The first turn warms both up and does not count.
  for (let turn = 0; turn <= TURNS; turn += 1) {
    const took = { product: 0, bare: 0 };
    for (let visit = 0; visit < one.visits; visit += 1) {
      const shots = {
        product: senders.map((sender) => shotsOfProduct(api, sender, one)),
        bare: senders.map((sender) => shotsOfBaseline(baseline.origin, sender, one)),
      };
      // Who goes first changes every time.
      const order =
        (turn + visit) % 2 === 0 ? (["product", "bare"] as const) : (["bare", "product"] as const);
      for (const which of order) took[which] += await sendAll(shots[which]);
    }
    if (turn === 0) continue;
    ratios.push(took.bare / took.product);
    speeds.push({ product: (events / took.product) * 1000, bare: (events / took.bare) * 1000 });
  }
  const ratio = medianOf(ratios);
  const isMet = ratio >= one.bound;
  const perSecond = (values: number[]) => `${Math.round(medianOf(values))} events/s`;
  process.stdout.write(
    `${one.name}: ${ratio.toFixed(2)} of the baseline (bound ${one.bound}, ${isMet ? "met" : "NOT MET"}); ` +
      `product ${perSecond(speeds.map(({ product }) => product))}, bare ${perSecond(speeds.map(({ bare }) => bare))}; ` +
      `ratios ${ratios.map((value) => value.toFixed(2)).join(" ")}\n`,
  );
  return isMet;
}

function shotsOfProduct(api: ApiProcess, sender: Phone, { batch }: Case): Shot[] {
  return slicesOf(makeVisit(sender), batch).map((part) => ({
    url: `${api.origin}/api/sync/batch`,
    body: JSON.stringify({ events: part }),
    cookie: sender.cookie,
    origin: api.dependencies.environment.publicOrigin,
    check: (status, text) => {
      const { accepted } = JSON.parse(text) as { accepted?: unknown[] };
      if (status !== 200 || accepted?.length !== part.length)
        throw new Error(`The server took ${accepted?.length} of ${part.length} events: ${status} ${text}`);
    },
  }));
}

function shotsOfBaseline(origin: string, sender: Phone, { batch }: Case): Shot[] {
  return slicesOf(makeRows(makeVisit(sender), sender), batch).map((part) => ({
    url: `${origin}/rows`,
    body: JSON.stringify(part),
    check: (status) => {
      if (status !== 200) throw new Error(`The baseline answered ${status}.`);
    },
  }));
}

function slicesOf<T>(list: readonly T[], size: number): T[][] {
  return Array.from({ length: Math.ceil(list.length / size) }, (_none, index) =>
    list.slice(index * size, (index + 1) * size),
  );
}

function medianOf(values: readonly number[]): number {
  const sorted = values.toSorted((a, b) => a - b);
  const middle = Math.floor(sorted.length / 2);
  return sorted.length % 2 === 1
    ? (sorted[middle] ?? 0)
    : ((sorted[middle - 1] ?? 0) + (sorted[middle] ?? 0)) / 2;
}

/** Technicians with a phone and a call each, signed in. */
async function makePhones(api: ApiProcess, count: number): Promise<Phone[]> {
  const company = await makeCompany(api);
  const now = new Date();
  await inTransaction(api.database, async (tx) => installShippedTrees(tx, company.id, now));
  const [tree] = await api.database
    .select({ id: treeVersions.treeId, version: treeVersions.version, hash: treeVersions.hash })
    .from(treeVersions)
    .where(eq(treeVersions.companyId, company.id));
  return Promise.all(
    Array.from({ length: count }, async (_none, index): Promise<Phone> => {
      const [personId, deviceId, callId] = [uuidv7(), uuidv7(), uuidv7()];
      const owner = { companyId: company.id, createdAt: now };
      await api.database.insert(people).values({
        id: personId,
        ...owner,
        name: `Technician ${index}`,
        email: `technician-${personId}@company.example`,
        role: "technician",
      });
      await api.database.insert(devices).values({
        id: deviceId,
        companyId: company.id,
        personId,
        name: "Phone",
        registeredAt: now,
        lastSeenAt: now,
      });
      await api.database.insert(calls).values({
        id: callId,
        ...owner,
        number: index + 1,
        unitId: company.unitId,
        assignedTo: personId,
        status: "open",
        complaint: "No heat.",
        scheduledFor: now,
      });
      const { cookie } = await createSessionKeeper(api.dependencies).begin({
        personId,
        role: "technician",
        deviceId,
        twoStepPassed: true,
        now,
      });
      return {
        companyId: company.id,
        personId,
        deviceId,
        callId,
        unitId: company.unitId,
        tree: tree ?? null,
        nextSeq: 1,
        cookie: cookie.split(";")[0] ?? "",
      };
    }),
  );
}

async function startBaseline(url: string): Promise<{ origin: string; stop: () => Promise<void> }> {
  const port = await findFreePort();
  const child = spawn(process.execPath, [fileURLToPath(new URL("baseline-server.mjs", import.meta.url))], {
    env: { PATH: process.env["PATH"], NODE_ENV: "production", DATABASE_URL: url, PORT: String(port) },
    stdio: ["ignore", "inherit", "inherit"],
  });
  const ended = new Promise<void>((resolve) => child.once("close", () => resolve()));
  const origin = `http://127.0.0.1:${port}`;
  while (
    child.exitCode === null &&
    !(await fetch(origin).then(
      () => true,
      () => false,
    ))
  )
    await sleep(30);
  return {
    origin,
    stop: async () => {
      child.kill("SIGTERM");
      await ended;
    },
  };
}
