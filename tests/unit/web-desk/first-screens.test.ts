import { readdirSync, readFileSync } from "node:fs";
import { fileURLToPath } from "node:url";
import {
  CALL_STATUSES as CONTRACT_STATUSES,
  listCalls,
  readCall,
  readMe,
  readUnit,
  signIn,
} from "@emberladder/contract";
import { describe, expect, it } from "vitest";
import { z } from "zod";
import { CALL_STATUSES, isPlain, readCallFilter } from "../../../apps/web/src/features/calls/calls-query.ts";
import { forbidZodEval } from "../../../apps/web/src/lib/forbid-zod-eval.ts";
import * as shellRoutes from "../../../apps/web/src/lib/shell-routes.ts";
import { desk } from "../../../apps/web/src/messages/en/desk.ts";
import { shell } from "../../../apps/web/src/messages/en/shell.ts";

const webSource = fileURLToPath(new URL("../../../apps/web/src/", import.meta.url));

describe("what the first screens take from elsewhere", () => {
  it("calls the routes at the contract's own addresses", () => {
    const pairs = [
      [listCalls, shellRoutes.listCalls],
      [readCall, shellRoutes.readCall],
      [readMe, shellRoutes.readMe],
      [readUnit, shellRoutes.readUnit],
      [signIn, shellRoutes.signIn],
    ] as const;
    for (const [{ method, path }, route] of pairs) expect(route).toEqual({ method, path });
  });

  it("knows every state of a call that the contract has", () => {
    expect([...CALL_STATUSES].toSorted()).toEqual([...CONTRACT_STATUSES].toSorted());
  });

  it("forbids zod to make code before zod is here, by the name zod itself reads", () => {
    forbidZodEval();
    expect(Reflect.get(globalThis, "__zod_globalConfig")).toEqual({ jitless: true });
    z.config({ jitless: false });
    expect(z.config().jitless).toBe(false);
  });
});

describe("the filter of the calls in the address", () => {
  const read = (address: string) => readCallFilter(new URLSearchParams(address));

  it("is plain without anything in the address", () => {
    expect(isPlain(read(""))).toBe(true);
    expect(read("").scope).toBe("mine");
  });

  it("reads whose, which day, which state and which page", () => {
    expect(read("scope=all&date=2026-01-13&status=done&page=2")).toEqual({
      scope: "all",
      date: "2026-01-13",
      status: "done",
      page: 2,
    });
  });

  it.each(["date=2026-13-40", "date=tomorrow", "status=lost", "page=-1", "page=1.5", "scope=theirs"])(
    "leaves out what it does not understand: %s",
    (address) => {
      expect(read(address)).toEqual(read(""));
    },
  );
});

describe("words of the screens outside of a diagnosis", () => {
  const sources = readdirSync(webSource, { recursive: true, encoding: "utf8" })
    .filter((name) => /\.tsx?$/.test(name))
    .map((name) => readFileSync(webSource + name, "utf8"));
  const used = [
    ...new Set(
      sources.flatMap((text) =>
        [...text.matchAll(/["`]desk:([\w.-]+?)(?:["`]|\.?\$\{)/g)].map((match) => match[1] ?? ""),
      ),
    ),
  ];
  const words: object = { ...shell, ...desk };
  const find = (key: string) => {
    const parts = key.split(".");
    return parts.reduce<unknown>((node, part, index) => {
      if (typeof node !== "object" || node === null) return undefined;
      const isLast = index === parts.length - 1;
      return Reflect.get(node, part) ?? (isLast ? Reflect.get(node, `${part}_other`) : undefined);
    }, words);
  };

  it("are used by the screens at all", () => {
    expect(used.length).toBeGreaterThan(200);
  });

  it("are all in the catalogue", () => {
    expect(used.filter((key) => key !== "" && find(key) === undefined)).toEqual([]);
  });
});
