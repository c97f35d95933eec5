import type { z } from "zod";
import type { ErrorCode } from "./error-codes.ts";
import type { RateLimitName } from "./limits.ts";
import type { Permission } from "./roles.ts";

/**
 * Who may call a route: anybody; any session, also one that has not passed its two-step code; any session
 * that has; or those whose role has a permission.
 */
export type Access = "public" | "session" | "signed-in" | Permission;

export type Method = "get" | "post" | "patch" | "delete";

/** What a route answers with: JSON by its schema, nothing, or a document of another kind. */
export type Answer =
  | { kind: "json"; status: 200 | 201 | 202; schema: z.ZodType }
  | { kind: "empty"; status: 204 }
  | { kind: "pdf" | "html" | "css"; status: 200 };

/**
 * One route of the API: the single place that says its address, who may call it, what it takes and what it
 * gives. The server's handlers, the OpenAPI document, the client and the matrix of rights all read it.
 */
export interface RouteContract {
  method: Method;
  /** Address with `{name}` for each parameter. */
  path: string;
  access: Access;
  tag: string;
  summary: string;
  params?: z.ZodObject;
  query?: z.ZodObject;
  body?: z.ZodType;
  answer: Answer;
  /** Errors beyond those that every route can give. */
  errors?: readonly ErrorCode[];
  /** A rate limit beside the general ones. */
  limit?: RateLimitName;
  /** Bytes the body may have, where it is not the common limit. */
  maxBytes?: number;
  /** Served in demo mode only. */
  demoOnly?: boolean;
}

/** Declares a route and keeps the types of its parts. */
export function defineContract<const C extends RouteContract>(contract: C): C {
  return contract;
}

type OutputOf<C, K extends string> = C extends { [key in K]: infer S extends z.ZodType }
  ? z.output<S>
  : undefined;
type SentOf<C, K extends string> = C extends { [key in K]: infer S extends z.ZodType }
  ? z.input<S>
  : undefined;

/** What a handler receives of a route: everything parsed. */
export interface InputOf<C extends RouteContract> {
  params: OutputOf<C, "params">;
  query: OutputOf<C, "query">;
  body: OutputOf<C, "body">;
}

/** What a client sends as the body of a route. */
export type BodyOf<C extends RouteContract> = SentOf<C, "body">;
/** What a client may send as the query of a route. */
export type QueryOf<C extends RouteContract> = SentOf<C, "query">;
/** What a route answers with, parsed. */
export type AnswerOf<C extends RouteContract> = OutputOf<C["answer"], "schema">;

/**
 * The address of a route with its parameters filled in and escaped.
 * @throws when a parameter is missing.
 */
export function addressOf(contract: { path: string }, params: Readonly<Record<string, string>> = {}): string {
  return contract.path.replaceAll(/\{(\w+)\}/g, (_all, name: string) => {
    const value = params[name];
    if (value === undefined) throw new Error(`The address ${contract.path} needs ${name}.`);
    return encodeURIComponent(value);
  });
}
