/**
 * The arrows between the parts of the workspace: what each may import, and why. Everything not listed is refused.
 *
 * - `own`: workspace packages it may import by name
 * - `outside`: other packages and node's modules it must not import
 * - `reach`: folders of other parts it may import by a relative path
 * - `why`: the reason, printed with the error
 *
 * @typedef {{ own: string[], outside: RegExp[], reach: string[], why: string }} Layer
 */

const pure = [/^node:/, /^react(-dom)?($|\/)/, /^express($|\/)/, /^drizzle-orm($|\/)/, /^mysql2($|\/)/];

const whyPure =
  "Packages run on the phone, on the server and in tests alike, so they know no framework, database, file or network, " +
  "and only what lies below them: field-math <- furnace <- trees <- diagnosis <- contract.";

/**
 * @param {string[]} own
 * @returns {Layer}
 */
function definePackage(own) {
  return { own, outside: pure, reach: [], why: whyPure };
}

/** @type {Record<string, Layer>} */
export const layers = {
  "packages/field-math": definePackage([]),
  "packages/furnace": definePackage(["field-math"]),
  "packages/trees": definePackage(["field-math", "furnace"]),
  "packages/diagnosis": definePackage(["field-math", "furnace", "trees"]),
  "packages/words": definePackage(["furnace", "trees", "diagnosis"]),
  "packages/contract": definePackage(["field-math", "furnace", "trees", "diagnosis"]),
  "db/src/server": {
    own: [],
    outside: [/^(?!node:|\.)/],
    reach: [],
    why: "It runs on a bare machine before anything is installed, so it may use node's own modules only.",
  },
  db: {
    own: ["field-math", "furnace", "trees", "diagnosis", "words", "contract"],
    outside: [/^react(-dom)?($|\/)/, /^express($|\/)/],
    reach: [],
    why: "The database serves the applications and does not know them.",
  },
  "apps/web": {
    own: ["field-math", "furnace", "trees", "diagnosis", "words", "contract"],
    outside: [/^express($|\/)/, /^drizzle-orm($|\/)/, /^mysql2($|\/)/],
    reach: [],
    why: "The client runs in a browser and meets the server through the contract only.",
  },
  "apps/api": {
    own: ["field-math", "furnace", "trees", "diagnosis", "words", "contract", "db"],
    outside: [/^react(-dom)?($|\/)/],
    reach: [],
    why: "The server meets the client through the contract only.",
  },
  "apps/launcher": {
    own: ["db"],
    outside: [/^(?!node:|\.|esbuild$|@emberladder\/db)/],
    reach: ["db/src/server", "db/src/migrate"],
    why: "The launcher runs on a bare machine before anything is installed, so it may use node's own modules only.",
  },
};

/**
 * Finds the layer a file belongs to: the longest folder that is listed.
 *
 * @param {string} path relative to the repository
 * @returns {{ folder: string, layer: Layer } | undefined} undefined for tests and settings, which may import anything
 */
export function findLayer(path) {
  const folder = Object.keys(layers)
    .filter((name) => path.startsWith(`${name}/`))
    .toSorted((a, b) => b.length - a.length)[0];
  const layer = folder === undefined ? undefined : layers[folder];
  return folder === undefined || layer === undefined ? undefined : { folder, layer };
}
