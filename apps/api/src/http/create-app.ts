import { ROUTE_NAMES, routeContracts } from "@emberladder/contract";
import type { RouteContract } from "@emberladder/contract";
import { MAX_ADDRESS_LENGTH } from "@emberladder/contract";
import express from "express";
import { createSessionKeeper } from "#modules/auth/sessions.ts";
import { routes } from "../routes.ts";
import { ApiError } from "./api-error.ts";
import type { Dependencies } from "./dependencies.ts";
import { createErrorHandler } from "./error-handler.ts";
import { createRateLimiter } from "./rate-limiter.ts";
import { createRequestLog } from "./request-log.ts";
import { ownOrigins } from "./same-origin.ts";
import { securityHeaders } from "./security-headers.ts";
import { serveRoute } from "./serve-route.ts";
import { serveClient } from "./static-files.ts";

/**
 * The whole HTTP application, ready to listen. It keeps nothing that another process would have to know.
 * @throws when a route of the contract has no handler.
 */
export function createApp(dependencies: Dependencies): express.Express {
  const { environment, database, log, clock } = dependencies;
  const sessions = createSessionKeeper(dependencies);
  const serving = {
    dependencies,
    limiter: createRateLimiter(database, environment.rateLimitScale),
    origins: ownOrigins(environment.publicOrigin, environment.mode),
    readActor: sessions.readActor,
  };

  const app: express.Express = express();
  app.disable("x-powered-by");
  app.set("trust proxy", environment.trustProxy.length > 0 ? environment.trustProxy : false);
  app.set("query parser", "simple");
  // Answers of the API are never kept, so a hash of each would be work for nothing.
  app.set("etag", false);
  app.use(createRequestLog(log, clock));
  app.use(securityHeaders({ isHttps: environment.publicOrigin.startsWith("https:") }));
  app.use((request, response, next) => {
    if (request.originalUrl.length > MAX_ADDRESS_LENGTH) throw new ApiError("too-large");
    if (/^\/(?:api|health|dev)(?:\/|$)/.test(request.path)) response.setHeader("Cache-Control", "no-store");
    next();
  });

  for (const route of mountedRoutes(environment.mode))
    app[route.contract.method](toExpressPath(route.contract), serveRoute(route, serving));
  app.use(serveClient(environment.webDist));
  app.use(() => {
    throw new ApiError("not-found");
  });
  app.use(createErrorHandler(log));
  return app;
}

/**
 * The routes that a mode serves.
 * @throws when the contract names a route that nobody handles, or two handle the same.
 */
export function mountedRoutes(mode: "demo" | "live"): typeof routes {
  const handled = routes.map((route) => route.name);
  const wrong = ROUTE_NAMES.filter((name) => handled.filter((other) => other === name).length !== 1);
  if (wrong.length > 0) throw new Error(`These routes need exactly one handler: ${wrong.join(", ")}.`);
  return routes.filter(
    ({ name }) => mode === "demo" || (routeContracts[name] as RouteContract).demoOnly !== true,
  );
}

function toExpressPath({ path }: RouteContract): string {
  return path.replaceAll(/\{(\w+)\}/g, ":$1");
}
