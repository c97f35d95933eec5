import { dirname, join } from "node:path";
import { fileURLToPath } from "node:url";

/** The folder of the whole product. */
export const root = dirname(dirname(dirname(dirname(fileURLToPath(import.meta.url)))));

/** Where finished builds and their marks are kept; can be deleted at any time. */
export const cacheFolder = join(root, ".cache");

/** The built web client, served by the API. */
export const webDist = join(root, "apps/web/dist");

/** The built server programs. */
export const apiDist = join(root, "apps/api/dist");
