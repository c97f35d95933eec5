import { pathOf, resolveImport, visitImports } from "./imports.mjs";
import { findLayer } from "./layers.mjs";

/** @typedef {import("./imports.mjs").RuleContext} RuleContext */

/** Arrows between packages and applications go one way; see layers.mjs. */
export const importDirection = {
  /** @param {RuleContext} context */
  create(context) {
    const path = pathOf(context);
    const found = findLayer(path);
    if (found === undefined) {
      if (!/^(packages|apps)\/[^/]+\/src\//.test(path)) return {};
      return {
        /** @param {unknown} node */
        Program(node) {
          context.report({
            node,
            message: `This package is not listed in tests/setup/lint/layers.mjs. Say what it may import.`,
          });
        },
      };
    }
    const { folder, layer } = found;
    return visitImports((node, source) => {
      const problem = judge(path, folder, layer, source);
      if (problem !== undefined) context.report({ node, message: `${problem} ${layer.why}` });
    });
  },
};

/**
 * @param {string} path
 * @param {string} folder
 * @param {import("./layers.mjs").Layer} layer
 * @param {string} source
 * @returns {string | undefined}
 */
function judge(path, folder, layer, source) {
  const [, name] = /^@emberladder\/([^/]+)/.exec(source) ?? [];
  if (name !== undefined && !layer.own.includes(name)) return `${folder} must not import ${source}.`;
  if (layer.outside.some((pattern) => pattern.test(source))) return `${folder} must not import ${source}.`;
  const target = resolveImport(path, source);
  const part = /^(packages\/[^/]+|apps\/[^/]+|db)\//.exec(`${folder}/`)?.[1] ?? folder;
  if (target === undefined || target.startsWith(`${part}/`)) return undefined;
  return layer.reach.some((allowed) => target.startsWith(`${allowed}/`))
    ? undefined
    : `${folder} must not reach into ${target}; import a package by its name.`;
}
