import { existsSync, mkdirSync, readFileSync, renameSync, rmSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { hashContents } from "./content-hash.mjs";
import { apiDist, cacheFolder, root, webDist } from "./paths.mjs";
import { runTool } from "./tools.mjs";

/** @typedef {import("./shutdown.mjs").Shutdown} Shutdown */

const shared = ["packages", "pnpm-lock.yaml", "package.json", "tsconfig.base.json"];

/**
 * Builds the web client into `apps/web/dist`, unless it is of the present sources already.
 *
 * @param {Shutdown} shutdown
 * @returns {Promise<"unchanged" | "built">}
 * @throws {import("../../../db/src/server/server.mjs").PlainError} with what the bundler said
 */
export async function buildWeb(shutdown) {
  return buildWhenChanged({
    name: "web",
    inputs: [...shared, "apps/web"],
    target: webDist,
    build: async (output) => {
      await runTool(shutdown, {
        name: "The build of the web client",
        command: process.execPath,
        args: [
          join(root, "apps/web/node_modules/vite/bin/vite.js"),
          "build",
          "--outDir",
          output,
          "--emptyOutDir",
          "--logLevel",
          "warn",
        ],
        cwd: join(root, "apps/web"),
        env: { NODE_ENV: "production" },
      });
    },
  });
}

/**
 * Bundles the server's programs into `apps/api/dist`, unless they are of the present sources already.
 *
 * @param {Shutdown} shutdown
 * @returns {Promise<"unchanged" | "built">}
 * @throws {import("../../../db/src/server/server.mjs").PlainError} with what the bundler said
 */
export async function buildServer(shutdown) {
  return buildWhenChanged({
    name: "api",
    inputs: [...shared, "apps/api", "db/src", "apps/launcher/src/bundle-server.mjs"],
    target: apiDist,
    build: async (output) => {
      await runTool(shutdown, {
        name: "The build of the server",
        command: process.execPath,
        args: [join(root, "apps/launcher/src/bundle-server.mjs"), output],
        cwd: root,
      });
    },
  });
}

/**
 * A build goes to a folder of its own and is moved into place when it is whole: a killed build leaves the earlier
 * one, and a running product is never served half of each.
 *
 * @param {{ name: string, inputs: string[], target: string, build: (output: string) => Promise<void> }} job
 * @returns {Promise<"unchanged" | "built">}
 */
async function buildWhenChanged({ name, inputs, target, build }) {
  const markPath = join(target, ".build-hash");
  const hash = hashContents(root, inputs);
  if (existsSync(markPath) && readFileSync(markPath, "utf8") === hash) return "unchanged";
  const output = join(cacheFolder, `${name}-${process.pid}`);
  try {
    mkdirSync(output, { recursive: true });
    await build(output);
    writeFileSync(join(output, ".build-hash"), hash);
    rmSync(target, { recursive: true, force: true });
    renameSync(output, target);
  } finally {
    rmSync(output, { recursive: true, force: true });
  }
  return "built";
}
