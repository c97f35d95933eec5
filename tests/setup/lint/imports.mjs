import { dirname, join, relative } from "node:path/posix";

/**
 * The parts of a lint rule's surroundings that the rules here use.
 *
 * @typedef {{ filename: string, cwd: string, report: (problem: { node: unknown, message: string }) => void }} RuleContext
 * @typedef {{ source: { value: string } | null }} ImportNode
 */

/**
 * The file being checked, relative to the repository.
 *
 * @param {RuleContext} context
 * @returns {string}
 */
export function pathOf({ cwd, filename }) {
  return relative(cwd.replaceAll("\\", "/"), filename.replaceAll("\\", "/"));
}

/**
 * Where an import points, relative to the repository, when it points at a file of the same package: `./x.ts` or
 * the package's own alias `#x`.
 *
 * @param {string} from file that imports, relative to the repository
 * @param {string} source what it imports
 * @returns {string | undefined} undefined for a package or one of node's modules
 */
export function resolveImport(from, source) {
  if (source.startsWith(".")) return join(dirname(from), source);
  const [, app] = /^(apps\/[^/]+)\//.exec(from) ?? [];
  return source.startsWith("#") && app !== undefined ? join(app, "src", source.slice(1)) : undefined;
}

/**
 * The visitor that calls one function for every import and re-export, static or dynamic.
 *
 * @param {(node: unknown, source: string) => void} check
 * @returns {Record<string, (node: ImportNode) => void>}
 */
export function visitImports(check) {
  /** @param {ImportNode} node */
  const visit = (node) => {
    if (typeof node.source?.value === "string") check(node, node.source.value);
  };
  return {
    ImportDeclaration: visit,
    ImportExpression: visit,
    ExportNamedDeclaration: visit,
    ExportAllDeclaration: visit,
  };
}
