import { connect, createServer } from "node:net";
import type { AddressInfo, Server, Socket } from "node:net";
import { setTimeout as sleep } from "node:timers/promises";
import { openDatabase } from "@emberladder/db";
import { sql } from "drizzle-orm";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { workerDatabase } from "../setup/database.ts";
import { makeCompany } from "./support/company.ts";
import type { TestCompany } from "./support/company.ts";
import { startRecord } from "./support/record.ts";
import { startTestServer } from "./support/test-server.ts";
import type { TestServer } from "./support/test-server.ts";

/** A wire to the database that can be cut and mended. */
const layWire = async (target: number) => {
  const sockets = new Set<Socket>();
  const listen = async (port: number) => {
    const wire: Server = createServer((near) => {
      const far = connect(target, "127.0.0.1");
      for (const socket of [near, far]) {
        sockets.add(socket);
        socket.on("error", () => undefined);
        socket.on("close", () => sockets.delete(socket));
      }
      near.pipe(far).pipe(near);
      near.on("close", () => far.destroy());
      far.on("close", () => near.destroy());
    });
    await new Promise<void>((resolve) => {
      wire.listen(port, "127.0.0.1", resolve);
    });
    return wire;
  };
  let wire = await listen(0);
  const { port } = wire.address() as AddressInfo;
  return {
    port,
    cut: async () => {
      for (const socket of sockets) socket.destroy();
      await new Promise((resolve) => wire.close(resolve));
    },
    mend: async () => {
      wire = await listen(port);
    },
  };
};

let server: TestServer;
let company: TestCompany;
let wire: Awaited<ReturnType<typeof layWire>>;
beforeAll(async () => {
  const url = new URL((await workerDatabase()).url);
  wire = await layWire(Number(url.port));
  url.port = String(wire.port);
  server = await startTestServer({}, { url: url.href });
  company = await makeCompany(server);
});
afterAll(async () => {
  await server.close();
  await wire.cut();
});

// SEC-17: an outage tells nothing of the inside.
describe("while the database is away", () => {
  it("requests are asked to come back, nothing leaks, and all works again afterwards without a restart", async () => {
    const technician = await company.clientOf("technician");
    const record = startRecord(company);
    const open = record.open();
    await wire.cut();
    for (const request of [
      technician.call("readReady"),
      technician.call("listCalls"),
      technician.call("sendBatch", { body: { events: [open] } }),
      technician.call("signIn", {
        body: { email: company.people.senior.email, password: "any words at all" },
      }),
    ]) {
      const answer = await request;
      expect([answer.status, answer.code]).toEqual([503, "database-away"]);
      expect(Number(answer.headers.get("retry-after"))).toBeGreaterThan(0);
      expect(answer.text).not.toMatch(/ECONN|select|127\.0\.0\.1/i);
    }
    // The process itself is up, and says so.
    expect((await technician.call("readLive")).status).toBe(200);
    await wire.mend();
    await sleep(50);
    const answer = await technician.call("sendBatch", { body: { events: [open] } });
    expect(answer.json<{ accepted: { id: string }[] }>().accepted).toMatchObject([{ id: open.id }]);
  });
});

// SEC-24: rights in the database.
describe("the application's database user", () => {
  it("can neither change nor remove events and audit lines, nor touch the schema", async () => {
    const { url } = await workerDatabase();
    const { database, close } = openDatabase(url, { connections: 1 });
    for (const statement of [
      sql`update events set hash = ''`,
      sql`delete from events`,
      sql`update audit_log set action = ''`,
      sql`delete from audit_log`,
      sql`drop table events`,
      sql`truncate table events`,
      sql`alter table events add column x int`,
      sql`create table x (id int)`,
    ]) {
      // Denied: 1142 for a table, 1044 for a database (MariaDB error codes, from memory).
      const refusal: unknown = await database.execute(statement).catch((error: unknown) => error);
      const cause = (refusal as { cause?: { errno?: number } }).cause;
      expect([1142, 1044]).toContain(cause?.errno);
    }
    await close();
  });
});
