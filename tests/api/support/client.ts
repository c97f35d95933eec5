import { randomBytes } from "node:crypto";
import { addressOf, routeContracts } from "@emberladder/contract";
import type { Problem, RouteName } from "@emberladder/contract";
import type { TestServer } from "./test-server.ts";

/** An answer as a test looks at it. */
export interface TestAnswer {
  status: number;
  headers: Headers;
  text: string;
  /** The body as JSON, of the shape the test expects; for no body, the given one. */
  json: <T = Record<string, unknown>>(forEmpty?: T) => T;
  /** The code of a problem document. */
  code: string | undefined;
}

export interface TestClient {
  /** Calls a route of the contract. */
  call: (
    name: RouteName,
    request?: { params?: Record<string, string>; query?: Record<string, string>; body?: unknown },
  ) => Promise<TestAnswer>;
  /** Sends any request, with this client's cookie and the product's own origin unless told otherwise. */
  send: (
    path: string,
    init?: Omit<RequestInit, "headers"> & { headers?: Record<string, string> },
  ) => Promise<TestAnswer>;
  cookie: string | undefined;
}

/** An address of the range for examples, 2001:db8::/32 (RFC 3849). */
function inventAddress(): string {
  const groups = (randomBytes(12).toString("hex").match(/.{4}/g) ?? []).join(":");
  return `2001:db8:${groups}`;
}

/** A browser as far as the API can tell: it keeps the cookie and sends the product's own origin. */
export function createClient(server: TestServer, cookie?: string): TestClient {
  const address = inventAddress();
  const client: TestClient = {
    cookie,
    call: async (name, { params, query, body } = {}) => {
      const contract = routeContracts[name];
      const search = query ? `?${new URLSearchParams(query).toString()}` : "";
      return client.send(addressOf(contract, params) + search, {
        method: contract.method.toUpperCase(),
        ...(body === undefined
          ? {}
          : { body: JSON.stringify(body), headers: { "content-type": "application/json" } }),
      });
    },
    send: async (path, init = {}) => {
      const response = await fetch(server.origin + path, {
        redirect: "manual",
        ...init,
        headers: {
          origin: server.dependencies.environment.publicOrigin,
          "x-forwarded-for": address,
          ...(client.cookie ? { cookie: client.cookie } : {}),
          ...init.headers,
        },
      });
      const [set] = response.headers.getSetCookie();
      if (set) client.cookie = /max-age=0/i.test(set) ? undefined : set.split(";")[0];
      const text = await response.text();
      return {
        status: response.status,
        headers: response.headers,
        text,
        json: <T>(forEmpty?: T) =>
          text === "" && forEmpty !== undefined ? forEmpty : (JSON.parse(text) as T),
        code: response.headers.get("content-type")?.includes("problem")
          ? (JSON.parse(text) as Problem).code
          : undefined,
      };
    },
  };
  return client;
}
