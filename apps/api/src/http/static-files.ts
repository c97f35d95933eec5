import { existsSync } from "node:fs";
import { join } from "node:path";
import express from "express";
import type { RequestHandler, Router } from "express";

/**
 * Serves the built client: files whose names carry a hash for ever, everything else fresh, and the start page
 * for any other address that a browser asks a page for.
 *
 * @param folder the client's `dist`; undefined or missing where it is not built
 */
export function serveClient(folder: string | undefined): Router {
  const router = express.Router();
  if (folder === undefined || !existsSync(join(folder, "index.html"))) return router;
  router.use(
    "/assets",
    express.static(join(folder, "assets"), { immutable: true, maxAge: "1y", index: false, redirect: false }),
  );
  router.use(
    express.static(folder, {
      index: false,
      redirect: false,
      setHeaders: (response) => response.setHeader("Cache-Control", "no-cache"),
    }),
  );
  router.use(sendStartPage(folder));
  return router;
}

function sendStartPage(folder: string): RequestHandler {
  return (request, response, next) => {
    const isPage =
      (request.method === "GET" || request.method === "HEAD") &&
      request.accepts(["html", "json"]) === "html" &&
      !/^\/(?:api|assets|health|dev)(?:\/|$)/.test(request.path) &&
      !/\.[a-z0-9]+$/i.test(request.path);
    if (!isPage) {
      next();
      return;
    }
    response.setHeader("Cache-Control", "no-cache");
    response.sendFile("index.html", { root: folder });
  };
}
