import { routeContracts } from "@emberladder/contract";
import type { InputOf, RouteContract, RouteName } from "@emberladder/contract";
import type { z } from "zod";
import type { Actor } from "./actor.ts";
import type { Dependencies } from "./dependencies.ts";

type Contracts = typeof routeContracts;

/** What a handler knows of its request besides the parsed input. */
export interface RequestContext<A extends Actor | null = Actor | null> extends Dependencies {
  actor: A;
  requestId: string;
  /** The caller's address, by the proxies that are trusted. */
  address: string;
  now: Date;
  /** Sets the one cookie of the product. */
  setCookie: (header: string) => void;
}

/** What a handler gives back, by the kind of its route. */
export type Reply<C extends RouteContract> = C["answer"] extends {
  kind: "json";
  schema: infer S extends z.ZodType;
}
  ? z.input<S>
  : C["answer"] extends { kind: "empty" }
    ? void
    : { content: string | Uint8Array; fileName?: string };

type ContextOf<C extends RouteContract> = RequestContext<C["access"] extends "public" ? null : Actor>;

/** A route with its handler, as the server mounts it. */
export interface Route {
  name: RouteName;
  contract: RouteContract;
  handle: (
    input: { params: unknown; query: unknown; body: unknown },
    context: RequestContext,
  ) => Promise<unknown>;
}

/**
 * Joins a route's contract with its handler. Everything else about the route (who, what shape, how often) is
 * in the contract, so that handler, OpenAPI document and matrix of rights come from one table.
 */
export function defineRoute<N extends RouteName>(
  name: N,
  handle: (
    input: InputOf<Contracts[N]>,
    context: ContextOf<Contracts[N]>,
  ) => Promise<Reply<Contracts[N]>> | Reply<Contracts[N]>,
): Route {
  const anyHandle = handle as (input: never, context: never) => unknown;
  return {
    name,
    contract: routeContracts[name],
    handle: async (input, context) => anyHandle(input as never, context as never),
  };
}
