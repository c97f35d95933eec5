import { join } from "node:path";
import { countAsOne } from "./outcome.mjs";
import { runSuiteCommand } from "./run-suite-command.mjs";

/** @typedef {import("./outcome.mjs").Suite} Suite */

/**
 * A suite that is one command of node.
 *
 * @param {string} name
 * @param {string[]} args paths are relative to the repository
 * @returns {Suite}
 */
function defineCommandSuite(name, [script = "", ...args]) {
  return {
    name,
    run: async ({ root, folder, shutdown }) =>
      countAsOne(
        await runSuiteCommand(shutdown, { name, args: [join(root, script), ...args], cwd: root, folder }),
      ),
  };
}

/** Suites that read the sources: types, lint rules and formatting. Each counts as one test. */
export const staticSuites = [
  defineCommandSuite("types", ["tests/typecheck.mjs"]),
  defineCommandSuite("lint", ["node_modules/oxlint/bin/oxlint", "--type-aware", "--deny-warnings"]),
  defineCommandSuite("format", [
    "node_modules/prettier/bin/prettier.cjs",
    "--check",
    "--log-level",
    "warn",
    ".",
  ]),
];
