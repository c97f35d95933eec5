import { RATE_LIMITS } from "@emberladder/contract";
import type { Access, Answer, RateLimit } from "@emberladder/contract";
import type { Request, RequestHandler, Response } from "express";
import type { Actor } from "./actor.ts";
import { requirePermission } from "./actor.ts";
import { ApiError } from "./api-error.ts";
import type { Dependencies } from "./dependencies.ts";
import type { RateLimiter } from "./rate-limiter.ts";
import { readBody } from "./read-body.ts";
import { refuseForeignOrigin } from "./same-origin.ts";
import type { Route } from "./route.ts";
import { readQuery, validate } from "./validate.ts";

/** What serving needs beside the dependencies. */
export interface Serving {
  dependencies: Dependencies;
  limiter: RateLimiter;
  origins: ReadonlySet<string>;
  /** The signed-in person by the request's cookies, or null. */
  readActor: (cookieHeader: string, now: Date) => Promise<Actor | null>;
}

/** What the log of a request says about its caller. */
export interface RequestTrace {
  requestId: string;
  route: string;
  actor: Actor | null;
}

const CONTENT_TYPES = {
  pdf: "application/pdf",
  html: "text/html; charset=utf-8",
  css: "text/css; charset=utf-8",
} as const;

/**
 * Serves one route in the same steps as every other: origin, rate limit, sign-in, right, input, handler,
 * and the answer parsed by the contract, so that neither side can drift.
 */
export function serveRoute(route: Route, serving: Serving): RequestHandler {
  const { contract } = route;
  return async (request, response) => {
    const trace = traceOf(response);
    trace.route = `${contract.method.toUpperCase()} ${contract.path}`;
    const { dependencies, limiter } = serving;
    const now = new Date(dependencies.clock());
    const address = request.ip ?? "unknown";

    refuseForeignOrigin(request, serving.origins);
    await limiter.take("address", address, now.getTime());
    const actor = await admit(contract.access, request, serving, now);
    trace.actor = actor;
    if (actor) await limiter.take("session", actor.sessionHash, now.getTime());
    if (contract.limit) {
      const { by }: RateLimit = RATE_LIMITS[contract.limit];
      const whose = by === "person" ? actor?.personId : by === "session" ? actor?.sessionHash : address;
      await limiter.take(contract.limit, `${route.name} ${whose ?? address}`, now.getTime());
    }

    const params = validate(contract.params, { ...request.params }, "path");
    const query = validate(contract.query, contract.query && readQuery(request.query), "query");
    const body =
      contract.body && validate(contract.body, await readBody(request, response, contract.maxBytes), "body");

    const value = await route.handle(
      { params, query, body },
      {
        ...dependencies,
        actor,
        requestId: trace.requestId,
        address,
        now,
        setCookie: (header) => response.append("Set-Cookie", header),
      },
    );
    send(response, contract.answer, value);
  };
}

async function admit(access: Access, request: Request, serving: Serving, now: Date): Promise<Actor | null> {
  if (access === "public") return null;
  const actor = await serving.readActor(request.headers.cookie ?? "", now);
  if (!actor) throw new ApiError("signed-out");
  if (access === "session") return actor;
  if (!actor.twoStepPassed)
    throw new ApiError(actor.hasTwoStep ? "two-step-needed" : "two-step-set-up-needed");
  if (access !== "signed-in") requirePermission(actor, access);
  return actor;
}

function send(response: Response, answer: Answer, value: unknown): void {
  if (answer.kind === "json") {
    response.status(answer.status).json(answer.schema.parse(value));
  } else if (answer.kind === "empty") {
    response.status(204).end();
  } else {
    const { content, fileName } = value as { content: string | Uint8Array; fileName?: string };
    if (fileName) response.setHeader("Content-Disposition", `inline; filename="${fileName}"`);
    response.status(answer.status).type(CONTENT_TYPES[answer.kind]).send(Buffer.from(content));
  }
}

/** The trace of a request, put on its response by the first middleware. */
export function traceOf(response: Response): RequestTrace {
  return (response.locals as { trace: RequestTrace }).trace;
}
