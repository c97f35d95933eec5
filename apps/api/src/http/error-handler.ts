import { problemOf } from "@emberladder/contract";
import type { Problem } from "@emberladder/contract";
import { isDatabaseAway, readDatabaseError } from "@emberladder/db";
import type { ErrorRequestHandler, Response } from "express";
import type { Logger } from "pino";
import { ZodError } from "zod";
import { ApiError } from "./api-error.ts";
import { traceOf } from "./serve-route.ts";

/** Seconds after which a client should try again when the database is away. */
const RETRY_AFTER_SECONDS = 2;

/**
 * The last handler: every error becomes a problem document here and nowhere else. Foreseen refusals say what
 * happened; an outage of the database asks to come back; anything else is a fault of ours, told by its
 * request id alone, while the log gets what is needed to find it and none of a query's values.
 */
export function createErrorHandler(log: Logger): ErrorRequestHandler {
  // Express knows an error handler by its four parameters.
  return (error: unknown, request, response, _next) => {
    if (response.headersSent) {
      request.socket.destroy();
      return;
    }
    const problem = readProblem(error, traceOf(response).requestId);
    if (problem.status === 500)
      log.error({ requestId: traceOf(response).requestId, fault: describeFault(error) }, "fault");
    sendProblem(response, problem);
  };
}

/** Sends a problem document. */
export function sendProblem(response: Response, problem: Problem): void {
  if (problem.retryAfterSeconds !== undefined)
    response.setHeader("Retry-After", String(problem.retryAfterSeconds));
  response.status(problem.status).type("application/problem+json").send(JSON.stringify(problem));
}

function readProblem(error: unknown, requestId: string): Problem {
  const instance = `urn:uuid:${requestId}`;
  if (error instanceof ApiError)
    return problemOf(error.code, instance, {
      ...(error.detail === undefined ? {} : { detail: error.detail }),
      ...(error.fields === undefined ? {} : { errors: error.fields }),
      ...(error.retryAfterSeconds === undefined ? {} : { retryAfterSeconds: error.retryAfterSeconds }),
    });
  // Express refuses an address that is not well-formed UTF-8 in this way.
  if (error instanceof URIError)
    return problemOf("invalid-input", instance, { detail: "That address is not well-formed." });
  if (isDatabaseAway(error))
    return problemOf("database-away", instance, { retryAfterSeconds: RETRY_AFTER_SECONDS });
  return problemOf("server-fault", instance);
}

/** What the log may know of a fault: kinds, codes and places, but no message that could hold a value. */
export function describeFault(error: unknown): Record<string, unknown> {
  const database = readDatabaseError(error);
  if (database) return { kind: "database", ...database };
  if (error instanceof ZodError)
    return { kind: "contract", issues: error.issues.map(({ path, code }) => `${path.join("/")} ${code}`) };
  if (error instanceof Error) {
    const frames = error.stack?.split("\n").filter((line) => line.startsWith("    at ")) ?? [];
    // A syntax error quotes what it could not read.
    const message = error instanceof SyntaxError ? undefined : error.message.slice(0, 300);
    return { kind: error.name, message, frames: frames.slice(0, 12) };
  }
  return { kind: typeof error };
}
