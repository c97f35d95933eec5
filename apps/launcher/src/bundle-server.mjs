/**
 * Bundles the server's programs with esbuild: `node bundle-server.mjs <output folder>`.
 *
 * The workspace's own packages are TypeScript and are put into the bundle; so are libraries that only they
 * depend on. Libraries that the API itself declares stay outside and are loaded from its node_modules, because
 * some of them bring compiled parts that cannot be bundled.
 */
import { existsSync, readFileSync } from "node:fs";
import { join } from "node:path";
import { build } from "esbuild";
import { root } from "./paths.mjs";

const programs = {
  main: "apps/api/src/main.ts",
  worker: "apps/api/src/worker.ts",
  "mail-server": "apps/api/src/dev/mail-server.ts",
  seed: "db/src/seed/main.ts",
};

const apiFolder = join(root, "apps/api");
const { dependencies } = /** @type {{ dependencies: Record<string, string> }} */ (
  JSON.parse(readFileSync(join(apiFolder, "package.json"), "utf8"))
);
const outside = Object.keys(dependencies).filter((name) => !name.startsWith("@emberladder/"));

try {
  await build({
    entryPoints: Object.fromEntries(
      Object.entries(programs)
        .map(([name, path]) => [name, join(root, path)])
        .filter(([, path]) => existsSync(path ?? "")),
    ),
    outdir: process.argv[2] ?? join(apiFolder, "dist"),
    outExtension: { ".js": ".mjs" },
    bundle: true,
    splitting: true,
    platform: "node",
    target: "node20",
    format: "esm",
    sourcemap: true,
    logLevel: "error",
    external: outside.flatMap((name) => [name, `${name}/*`]),
    banner: {
      // Libraries in the bundle that still call require() get one that works inside a module.
      js: 'import { createRequire as createBundleRequire } from "node:module"; const require = createBundleRequire(import.meta.url);',
    },
  });
} catch {
  // esbuild has printed file, line and reason already; its stack would say nothing more.
  process.exitCode = 1;
}
