import { OpenApiGeneratorV31, OpenAPIRegistry } from "@asteasolutions/zod-to-openapi";
import type { RouteConfig } from "@asteasolutions/zod-to-openapi";
import { ERRORS } from "./error-codes.ts";
import type { ErrorCode } from "./error-codes.ts";
import { problemSchema } from "./problem.ts";
import { ROUTE_NAMES, routeContracts } from "./route-contracts.ts";
import type { RouteContract } from "./route-contract.ts";

const CONTENT_TYPES = { pdf: "application/pdf", html: "text/html", css: "text/css" } as const;

type Responses = RouteConfig["responses"];
export type OpenApiDocument = ReturnType<OpenApiGeneratorV31["generateDocument"]>;

/** The OpenAPI 3.1 document of the whole API, built from the very contracts that the server enforces. */
export function buildOpenApi(options: { demo: boolean }): OpenApiDocument {
  const registry = new OpenAPIRegistry();
  registry.registerComponent("securitySchemes", "session", {
    type: "apiKey",
    in: "cookie",
    name: "__Host-emberladder",
  });
  for (const name of ROUTE_NAMES) {
    const contract: RouteContract = routeContracts[name];
    if (contract.demoOnly && !options.demo) continue;
    registry.registerPath({
      method: contract.method,
      path: contract.path,
      operationId: name,
      summary: contract.summary,
      description: describeAccess(contract),
      tags: [contract.tag],
      ...(contract.access === "public" ? {} : { security: [{ session: [] }] }),
      request: {
        ...(contract.params ? { params: contract.params } : {}),
        ...(contract.query ? { query: contract.query } : {}),
        ...(contract.body ? { body: { content: { "application/json": { schema: contract.body } } } } : {}),
      },
      responses: responsesOf(contract),
    });
  }
  return new OpenApiGeneratorV31(registry.definitions).generateDocument({
    openapi: "3.1.0",
    info: {
      title: "Emberladder",
      version: "1",
      description:
        "Times are UTC. Errors are problem documents (RFC 9457). State-changing requests are taken from the product's own pages only.",
    },
  });
}

function describeAccess({ access }: RouteContract): string {
  if (access === "public") return "No session needed.";
  if (access === "session") return "Any session, also before its two-step code.";
  return access === "signed-in" ? "Any signed-in person." : `Needs the permission ${access}.`;
}

/** The errors that a route can give: its own, and those that follow from what it takes. */
export function errorsOf(contract: RouteContract): ErrorCode[] {
  const codes: ErrorCode[] = [
    ...(contract.errors ?? []),
    "too-many-requests",
    "server-fault",
    "database-away",
  ];
  if (contract.body) codes.push("malformed-body", "invalid-input", "too-large", "wrong-content-type");
  if (contract.params || contract.query) codes.push("invalid-input");
  if (contract.method !== "get") codes.push("foreign-origin");
  if (contract.access !== "public") codes.push("signed-out");
  if (contract.access !== "public" && contract.access !== "session")
    codes.push("two-step-needed", "two-step-set-up-needed");
  if (contract.access.includes(":")) codes.push("not-allowed");
  return [...new Set(codes)];
}

function responsesOf(contract: RouteContract): Responses {
  const { answer } = contract;
  const responses: Responses = {};
  if (answer.kind === "json")
    responses[answer.status] = {
      description: "Done.",
      content: { "application/json": { schema: answer.schema } },
    };
  else if (answer.kind === "empty") responses[answer.status] = { description: "Done; nothing to say." };
  else
    responses[answer.status] = {
      description: "The document.",
      content: { [CONTENT_TYPES[answer.kind]]: { schema: { type: "string" } } },
    };
  const codes = errorsOf(contract);
  for (const status of new Set(codes.map((code) => ERRORS[code].status))) {
    const here = codes.filter((code) => ERRORS[code].status === status);
    responses[status] = {
      description: here.map((code) => `\`${code}\`: ${ERRORS[code].title}`).join("\n\n"),
      content: { "application/problem+json": { schema: problemSchema } },
    };
  }
  return responses;
}
