import { PlainError } from "../../../db/src/server/server.mjs";
import { staticSuites } from "./static-suites.mjs";
import { defineVitestSuite } from "./vitest-suite.mjs";

/** @typedef {import("./outcome.mjs").Suite} Suite */

/**
 * The browser suite is loaded when it is run: it needs the dependencies.
 *
 * @type {Suite}
 */
const browserSuite = {
  name: "e2e",
  run: async (context) => (await import("./browser-suite.mjs")).browserSuite.run(context),
};

/**
 * Stages run one after the other; the lanes of a stage side by side; the suites of a lane one after the other. The
 * suites that measure time or kill servers have the machine to themselves.
 *
 * @type {Suite[][][]}
 */
const plan = [
  [staticSuites, [defineVitestSuite("unit", ["unit", "screens"])]],
  [[defineVitestSuite("api", ["api"])], [defineVitestSuite("outside", ["outside"])]],
  [[defineVitestSuite("faults", ["faults"])]],
  [[browserSuite]],
];

const suitesWithDatabase = new Set(["api", "faults"]);

/**
 * Chooses what to run.
 *
 * @param {string[]} args of the command line: nothing, or `--only` with names, then parts of file names to which the
 * chosen suites keep
 * @returns {{ stages: Suite[][][], needsDatabase: boolean, files: string[] }}
 * @throws {PlainError} when a name is not known
 */
export function chooseSuites(args) {
  const names = plan.flat(2).map((suite) => suite.name);
  const [option, value = "", ...files] = args.flatMap((arg) =>
    arg.startsWith("--only=") ? arg.split("=") : [arg],
  );
  if (option !== undefined && option !== "--only") {
    throw new PlainError(`"${option}" is not an option. Use --only with some of: ${names.join(", ")}.`);
  }
  const wanted = option === undefined ? names : value.split(",").map((name) => name.trim());
  const unknown = wanted.filter((name) => !names.includes(name));
  if (unknown.length > 0) {
    throw new PlainError(`There is no suite "${unknown.join(", ")}". The suites are: ${names.join(", ")}.`);
  }
  const stages = plan
    .map((lanes) => lanes.map((lane) => lane.filter((suite) => wanted.includes(suite.name))))
    .map((lanes) => lanes.filter((lane) => lane.length > 0))
    .filter((lanes) => lanes.length > 0);
  return { stages, needsDatabase: wanted.some((name) => suitesWithDatabase.has(name)), files };
}
