/** Vite's development server for `npm run dev`. Reads PORT and API_ORIGIN. */
import { createRequire } from "node:module";
import { join } from "node:path";
import { pathToFileURL } from "node:url";
import { root } from "./paths.mjs";

const webFolder = join(root, "apps/web");
const vitePath = createRequire(join(webFolder, "package.json")).resolve("vite");
/** @type {{ createServer: (options: object) => Promise<{ listen: () => Promise<unknown>, close: () => Promise<void> }> }} */
const { createServer } = await import(pathToFileURL(vitePath).href);

const target = process.env["API_ORIGIN"] ?? "http://127.0.0.1:4311";
const server = await createServer({
  root: webFolder,
  server: {
    host: "127.0.0.1",
    port: Number(process.env["PORT"] ?? 4310),
    strictPort: true,
    // The Host header stays as the browser sent it, so that the server sees one origin.
    proxy: Object.fromEntries(
      ["/api", "/health", "/dev"].map((path) => [path, { target, changeOrigin: false }]),
    ),
  },
});
await server.listen();
process.on("SIGTERM", () => {
  void server.close().then(() => process.exit(0));
});
