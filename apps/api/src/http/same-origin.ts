import type { Request } from "express";
import { ApiError } from "./api-error.ts";

/** The origins under which the product's own pages are served. */
export function ownOrigins(publicOrigin: string, mode: "demo" | "live"): Set<string> {
  const origins = new Set([publicOrigin]);
  const url = new URL(publicOrigin);
  // A demo on this machine answers to both names of the loopback address.
  if (mode === "demo" && url.hostname === "127.0.0.1") origins.add(`${url.protocol}//localhost:${url.port}`);
  return origins;
}

/**
 * Refuses a state-changing request that another site may have caused. Browsers say where a request comes from
 * in `Sec-Fetch-Site`; where that is absent (older ones), `Origin` has to be our own. A request with neither
 * is refused too: all browsers in use send one of them.
 * @throws ApiError `foreign-origin`.
 */
export function refuseForeignOrigin(
  request: Pick<Request, "method" | "headers">,
  origins: ReadonlySet<string>,
): void {
  if (["GET", "HEAD", "OPTIONS"].includes(request.method)) return;
  const site = request.headers["sec-fetch-site"];
  const { origin } = request.headers;
  const isOwnOrigin = origin !== undefined && origins.has(origin);
  if (site === undefined ? !isOwnOrigin : site !== "same-origin" || (origin !== undefined && !isOwnOrigin))
    throw new ApiError("foreign-origin");
}
