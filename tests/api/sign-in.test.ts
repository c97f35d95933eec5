import { totpCode, totpStepAt } from "@emberladder/api/src/modules/auth/totp.ts";
import { auditLog, sessions } from "@emberladder/db";
import { eq } from "drizzle-orm";
import { Argon2id } from "oslo/password";
import { afterAll, beforeAll, describe, expect, it, vi } from "vitest";
import { createClient } from "./support/client.ts";
import { makeCompany, PASSWORD, TOTP_SECRET } from "./support/company.ts";
import { startTestServer } from "./support/test-server.ts";
import type { TestServer } from "./support/test-server.ts";

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer();
});
afterAll(async () => server.close());

const codeNow = async (shiftSteps = 0) =>
  totpCode(TOTP_SECRET, totpStepAt(new Date(server.dependencies.clock())) + shiftSteps);

// SEC-01, SEC-04 and SEC-08: secrets of a session, its cookie, tries to sign in.
describe("signing in", () => {
  it("gives a technician a session, a device and the permissions of the role", async () => {
    const { people } = await makeCompany(server);
    const client = createClient(server);
    const answer = await client.call("signIn", {
      body: { email: people.technician.email.toUpperCase(), password: PASSWORD, device: { name: "Phone" } },
    });
    expect(answer.status).toBe(200);
    const me = answer.json<{ twoStep: string; deviceId: string; permissions: string[] }>();
    expect(me.twoStep).toBe("off");
    expect(me.deviceId).toMatch(/^[0-9a-f-]{36}$/);
    expect(me.permissions).toContain("diagnosis:record");
    expect(me.permissions).not.toContain("person:manage");
    expect((await client.call("readMe")).json<{ deviceId: string }>().deviceId).toBe(me.deviceId);
  });

  it("sets one cookie with the __Host- prefix, Secure, HttpOnly, SameSite and Path=/", async () => {
    const { people } = await makeCompany(server);
    const answer = await createClient(server).call("signIn", {
      body: { email: people.technician.email, password: PASSWORD },
    });
    const cookies = answer.headers.getSetCookie();
    expect(cookies).toHaveLength(1);
    // Attributes as RFC 6265bis asks of a __Host- cookie: no Domain.
    expect(cookies[0]).toMatch(/^__Host-emberladder=[a-z2-7]{40};/);
    for (const attribute of ["Secure", "HttpOnly", "SameSite=Lax", "Path=/"])
      expect(cookies[0]).toContain(attribute);
    expect(cookies[0]).not.toMatch(/domain=/i);
  });

  it("keeps only a hash of the session's secret in the database", async () => {
    const { people } = await makeCompany(server);
    const client = createClient(server);
    await client.call("signIn", { body: { email: people.technician.email, password: PASSWORD } });
    const token = client.cookie?.split("=")[1] ?? "";
    const rows = await server.database
      .select()
      .from(sessions)
      .where(eq(sessions.userId, people.technician.id));
    expect(rows).toHaveLength(1);
    expect(rows[0]?.id).toMatch(/^[0-9a-f]{64}$/);
    expect(JSON.stringify(rows)).not.toContain(token);
  });

  it("gives one answer for a wrong password, an unknown e-mail and a disabled person", async () => {
    const company = await makeCompany(server);
    const supervisor = await company.clientOf("supervisor");
    await supervisor.call("disablePerson", { params: { personId: company.people.senior.id } });
    const bodies = await Promise.all(
      [
        { email: company.people.technician.email, password: "another long pass phrase" },
        { email: "nobody@company.example", password: PASSWORD },
        { email: company.people.senior.email, password: PASSWORD },
      ].map(async (body) => createClient(server).call("signIn", { body })),
    );
    expect(bodies.map(({ status, code }) => [status, code])).toEqual(
      bodies.map(() => [401, "sign-in-failed"]),
    );
    expect(new Set(bodies.map((answer) => answer.text.replace(/urn:uuid:[0-9a-f-]+/, ""))).size).toBe(1);
  });

  it.each([
    { from: "one address", most: 15, isOneAddress: true },
    { from: "two hundred addresses", most: 40, isOneAddress: false },
  ])("looks at no more than $most of two hundred tries on one account from $from", async (given) => {
    const { people } = await makeCompany(server);
    const guesser = createClient(server);
    const answers = [];
    for (let batch = 0; batch < 10; batch += 1)
      answers.push(
        ...(await Promise.all(
          Array.from({ length: 20 }, async (_none, index) =>
            (given.isOneAddress ? guesser : createClient(server)).call("signIn", {
              body: { email: people.technician.email, password: `wrong guess number ${batch} ${index}` },
            }),
          ),
        )),
      );
    expect(answers.filter(({ status }) => status === 401).length).toBeLessThanOrEqual(given.most);
    const late = answers.filter(({ status }) => status === 429);
    expect(late.length).toBeGreaterThanOrEqual(200 - given.most);
    expect(Number(late[0]?.headers.get("retry-after"))).toBeGreaterThan(0);
    // No hard lock: after the delay the right password works.
    server.moveClock(16 * 60_000);
    const right = await createClient(server).call("signIn", {
      body: { email: people.technician.email, password: PASSWORD },
    });
    expect(right.status).toBe(200);
  });

  it("does the same hashing for an unknown e-mail as for a wrong password, so that time tells nothing", async () => {
    const { people } = await makeCompany(server);
    const verify = vi.spyOn(Argon2id.prototype, "verify");
    for (const email of [people.technician.email, "stranger@company.example"])
      await createClient(server).call("signIn", { body: { email, password: "some long pass phrase" } });
    const hashes = verify.mock.calls.map(([hash]) => hash);
    verify.mockRestore();
    // Memory in KiB, passes and lanes are part of the hash (PHC string format).
    expect(hashes.map((hash) => hash.split("$").slice(1, 4).join(" "))).toEqual([
      "argon2id v=19 m=19456,t=2,p=1",
      "argon2id v=19 m=19456,t=2,p=1",
    ]);
  });

  it("writes good and failed sign-ins to the audit log", async () => {
    const { id, people } = await makeCompany(server);
    await createClient(server).call("signIn", {
      body: { email: people.technician.email, password: "no good at all" },
    });
    await createClient(server).call("signIn", {
      body: { email: people.technician.email, password: PASSWORD },
    });
    const rows = await server.database.select().from(auditLog).where(eq(auditLog.companyId, id));
    expect(rows.map(({ action }) => action)).toEqual(["sign-in.failed", "sign-in.done"]);
  });

  it("keeps a device id across sign-ins, and never gives one person's device to another", async () => {
    const { people } = await makeCompany(server);
    const signIn = async (email: string, id?: string) =>
      (
        await createClient(server).call("signIn", {
          body: { email, password: PASSWORD, device: { id, name: "Phone" } },
        })
      ).json<{ deviceId: string }>().deviceId;
    const first = await signIn(people.technician.email);
    expect(await signIn(people.technician.email, first)).toBe(first);
    expect(await signIn(people.senior.email, first)).not.toBe(first);
  });
});

// SEC-07: two-step codes.
describe("two-step codes", () => {
  it("limit a supervisor's session to the two-step routes until the code is passed", async () => {
    const { people } = await makeCompany(server);
    const client = createClient(server);
    const me = (
      await client.call("signIn", { body: { email: people.supervisor.email, password: PASSWORD } })
    ).json<{ twoStep: string; permissions: string[] }>();
    expect(me).toMatchObject({ twoStep: "needed", permissions: [] });
    expect((await client.call("listPeople")).code).toBe("two-step-needed");
    const before = client.cookie;
    expect((await client.call("verifyTwoStep", { body: { code: await codeNow() } })).status).toBe(200);
    expect(client.cookie).not.toBe(before);
    expect((await client.call("listPeople")).status).toBe(200);
    expect((await createClient(server, before).call("readMe")).status).toBe(401);
  });

  it("refuse a code that was used before, also when two come at once", async () => {
    const { people } = await makeCompany(server);
    const clients = await Promise.all(
      [1, 2].map(async () => {
        const client = createClient(server);
        await client.call("signIn", { body: { email: people.supervisor.email, password: PASSWORD } });
        return client;
      }),
    );
    const code = await codeNow();
    const answers = await Promise.all(
      clients.map(async (client) => client.call("verifyTwoStep", { body: { code } })),
    );
    expect(answers.map(({ status }) => status).toSorted((a, b) => a - b)).toEqual([200, 422]);
  });

  it("accept the step before and after, for clocks that differ, and no other", async () => {
    for (const [shift, status] of [
      [-1, 200],
      [1, 200],
      [-2, 422],
      [2, 422],
    ] as const) {
      const { people } = await makeCompany(server);
      const client = createClient(server);
      await client.call("signIn", { body: { email: people.supervisor.email, password: PASSWORD } });
      const answer = await client.call("verifyTwoStep", { body: { code: await codeNow(shift) } });
      expect([shift, answer.status]).toEqual([shift, status]);
    }
  });

  it("have to be set up by a supervisor who has none, and show recovery codes once that work once", async () => {
    const { people } = await makeCompany(server, { hasTwoStep: [] });
    const client = createClient(server);
    const body = { email: people.supervisor.email, password: PASSWORD };
    await client.call("signIn", { body });
    expect((await client.call("listPeople")).code).toBe("two-step-set-up-needed");
    const { secret } = (await client.call("setUpTwoStep", { body: {} })).json<{ secret: string }>();
    const { base32 } = await import("oslo/encoding");
    const step = totpStepAt(new Date(server.dependencies.clock()));
    const code = await totpCode(base32.decode(secret, { strict: false }), step);
    const confirmed = await client.call("confirmTwoStep", { body: { code } });
    expect(confirmed.status).toBe(200);
    const { recoveryCodes } = confirmed.json<{ recoveryCodes: string[] }>();
    expect(recoveryCodes).toHaveLength(10);
    expect((await client.call("listPeople")).status).toBe(200);

    for (const expected of [200, 422]) {
      const later = createClient(server);
      await later.call("signIn", { body });
      const answer = await later.call("verifyTwoStep", { body: { recoveryCode: recoveryCodes[0] } });
      expect(answer.status).toBe(expected);
    }
  });

  it("stop evaluating after ten tries in five minutes, over all sessions of the person", async () => {
    const { people } = await makeCompany(server);
    const statuses = [];
    for (let session = 0; session < 2; session += 1) {
      const client = createClient(server);
      await client.call("signIn", { body: { email: people.supervisor.email, password: PASSWORD } });
      for (let i = 0; i < 6; i += 1)
        statuses.push((await client.call("verifyTwoStep", { body: { code: `00000${i}` } })).status);
    }
    expect(statuses.filter((status) => status === 429)).toHaveLength(2);
  });

  it("compute the codes of RFC 6238, appendix B (SHA-1, last six digits)", async () => {
    for (const [seconds, code] of [
      [59, "287082"],
      [1_111_111_109, "081804"],
      [1_234_567_890, "005924"],
      [20_000_000_000, "353130"],
    ] as const)
      expect(await totpCode(TOTP_SECRET, totpStepAt(new Date(seconds * 1000)))).toBe(code);
  });
});

// SEC-02 and SEC-03: how sessions end.
describe("sessions", () => {
  it("end at once when the person is disabled", async () => {
    const company = await makeCompany(server);
    const technician = await company.clientOf("technician");
    expect((await technician.call("readMe")).status).toBe(200);
    const supervisor = await company.clientOf("supervisor");
    await supervisor.call("disablePerson", { params: { personId: company.people.technician.id } });
    expect((await technician.call("readMe")).status).toBe(401);
  });

  it("end when the person signs out, and the cookie goes", async () => {
    const company = await makeCompany(server);
    const client = await company.clientOf("technician");
    const copy = createClient(server, client.cookie);
    expect((await client.call("signOut")).status).toBe(204);
    expect(client.cookie).toBeUndefined();
    expect((await copy.call("readMe")).code).toBe("signed-out");
  });

  it("of a supervisor end after thirty minutes unused; a technician's lasts", async () => {
    const company = await makeCompany(server);
    const [supervisor, technician] = [
      await company.clientOf("supervisor"),
      await company.clientOf("technician"),
    ];
    server.moveClock(31 * 60_000);
    expect((await supervisor.call("readMe")).status).toBe(401);
    expect((await technician.call("readMe")).status).toBe(200);
  });

  it("are listed and ended one by one or all others, and only one's own", async () => {
    const company = await makeCompany(server);
    const [one, two, three] = [
      await company.clientOf("technician"),
      await company.clientOf("technician"),
      await company.clientOf("technician"),
    ];
    const other = await company.clientOf("senior");
    const { items } = (await one.call("listSessions")).json<{ items: { id: string; isThis: boolean }[] }>();
    expect(items.filter(({ isThis }) => isThis)).toHaveLength(1);
    const thatOfTwo = (await two.call("listSessions"))
      .json<{ items: typeof items }>()
      .items.find(({ isThis }) => isThis);
    expect((await other.call("endSession", { params: { sessionId: thatOfTwo?.id ?? "" } })).status).toBe(404);
    expect((await one.call("endSession", { params: { sessionId: thatOfTwo?.id ?? "" } })).status).toBe(204);
    expect((await two.call("readMe")).status).toBe(401);
    expect((await one.call("endOtherSessions")).status).toBe(204);
    expect((await three.call("readMe")).status).toBe(401);
    expect((await one.call("readMe")).status).toBe(200);
    expect((await other.call("readMe")).status).toBe(200);
  });
});
