import { spawn, type ChildProcess } from "node:child_process";
import { mkdtempSync, readFileSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { fileURLToPath } from "node:url";
import { findFreePort, isRunning, type ProcessMark } from "@emberladder/db/server";
import { afterAll, beforeAll, expect, test } from "vitest";

const launcher = fileURLToPath(new URL("../../apps/launcher/start.mjs", import.meta.url));

interface Launch {
  process: ChildProcess;
  output: () => string;
  ended: Promise<number | null>;
}

let data: string;
let port: number;
let current: Launch | undefined;

beforeAll(async () => {
  data = mkdtempSync(join(tmpdir(), "emberladder-launch-"));
  port = await findFreePort();
});
afterAll(async () => {
  current?.process.kill("SIGTERM");
  await current?.ended;
  rmSync(data, { recursive: true, force: true });
});

function launch(): Launch {
  let text = "";
  const child = spawn(process.execPath, [launcher], {
    env: {
      ...process.env,
      EMBERLADDER_MODE: "demo",
      EMBERLADDER_DATA: data,
      PORT: String(port),
      PUBLIC_ORIGIN: undefined,
    },
    stdio: ["ignore", "pipe", "pipe"],
  });
  for (const stream of [child.stdout, child.stderr]) stream.on("data", (chunk) => (text += String(chunk)));
  const ended = new Promise<number | null>((resolve) => child.once("close", resolve));
  return { process: child, output: () => text, ended };
}

/** Starts the product and waits for its welcome. Seconds are what a person would wait. */
async function serve(): Promise<{ seconds: number }> {
  const begin = performance.now();
  const started = launch();
  current = started;
  await expect.poll(started.output, { timeout: 90_000, interval: 50 }).toContain("Emberladder is ready");
  return { seconds: (performance.now() - begin) / 1000 };
}

function readMarks(): ProcessMark[] {
  const read = (path: string) =>
    JSON.parse(readFileSync(join(data, "demo", path), "utf8")) as Record<string, unknown>;
  return [
    ...(read("launcher.json")["children"] as ProcessMark[]),
    read("db/server.json")["server"] as ProcessMark,
  ];
}

async function ready(): Promise<number> {
  return (await fetch(`http://127.0.0.1:${port}/health/ready`)).status;
}

test("a first start serves a demo with accounts, and a second one beside it is told that it is running", async () => {
  await serve();
  expect(await ready()).toBe(200);
  const accounts = JSON.parse(readFileSync(join(data, "demo/accounts.json"), "utf8")) as { role: string }[];
  expect(accounts.map(({ role }) => role)).toContain("supervisor");
  expect(current?.output()).toContain("otpauth://totp/");
  const second = launch();
  expect(await second.ended).toBe(1);
  expect(second.output()).toContain(`Emberladder is already running at http://127.0.0.1:${port}`);
  expect(await ready()).toBe(200);
});

test("a launcher that was killed leaves nothing that the next start cannot take over", async () => {
  const left = readMarks();
  expect(left.length).toBeGreaterThanOrEqual(4);
  current?.process.kill("SIGKILL");
  await current?.ended;
  expect(left.every((mark) => isRunning(mark))).toBe(true);
  const accounts = readFileSync(join(data, "demo/accounts.json"), "utf8");
  await serve();
  expect(left.some((mark) => isRunning(mark))).toBe(false);
  expect(await ready()).toBe(200);
  expect(readFileSync(join(data, "demo/accounts.json"), "utf8")).toBe(accounts);
});

test.each(["SIGTERM", "SIGINT"] as const)(
  "%s ends everything that was started, and the next start is warm",
  async (signal) => {
    const marks = readMarks();
    current?.process.kill(signal);
    expect(await current?.ended).toBe(0);
    expect(marks.filter((mark) => isRunning(mark))).toEqual([]);
    await expect(fetch(`http://127.0.0.1:${port}/health/ready`)).rejects.toThrow("fetch failed");
    const { seconds } = await serve();
    // The limit of a warm start in the project's requirements.
    expect(seconds).toBeLessThan(12);
  },
);

test("the API is started again when it ends by itself", async () => {
  const [api] = readMarks().slice(-2);
  process.kill(api?.pid ?? 0, "SIGKILL");
  await expect.poll(() => current?.output(), { timeout: 20_000 }).toContain("starting it again");
  await expect.poll(async () => ready().catch(() => 0), { timeout: 20_000 }).toBe(200);
});
