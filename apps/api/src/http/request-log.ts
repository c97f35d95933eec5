import { randomUUID } from "node:crypto";
import type { RequestHandler } from "express";
import type { Logger } from "pino";
import type { RequestTrace } from "./serve-route.ts";

/**
 * Gives every request an id and writes one line when it is answered. The line names the route and never the
 * address, which may hold the secret of a link; people and sessions appear by id and by hash.
 */
export function createRequestLog(log: Logger, clock: () => number): RequestHandler {
  return (request, response, next) => {
    const trace: RequestTrace = { requestId: randomUUID(), route: "none", actor: null };
    response.locals["trace"] = trace;
    response.setHeader("X-Request-Id", trace.requestId);
    const startedAt = clock();
    response.once("close", () => {
      log.info(
        {
          requestId: trace.requestId,
          route: trace.route,
          method: request.method,
          status: response.statusCode,
          finished: response.writableFinished,
          ms: clock() - startedAt,
          ...(trace.actor
            ? {
                personId: trace.actor.personId,
                companyId: trace.actor.companyId,
                session: trace.actor.sessionHash.slice(0, 12),
              }
            : {}),
        },
        "request",
      );
    });
    next();
  };
}
