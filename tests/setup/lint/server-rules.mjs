import { pathOf, visitImports } from "./imports.mjs";

/** @typedef {import("./imports.mjs").RuleContext} RuleContext */
/** @typedef {{ object: { name?: string }, property: { name?: string }, computed: boolean }} MemberNode */

/** In the API, SQL lives in repositories. */
export const sqlInRepositories = {
  /** @param {RuleContext} context */
  create(context) {
    const path = pathOf(context);
    if (!path.startsWith("apps/api/src/") || /(^|[/-])repository\.ts$/.test(path)) return {};
    return visitImports((node, source) => {
      if (/^drizzle-orm($|\/)/.test(source)) {
        context.report({
          node,
          message:
            "Only repository.ts may talk SQL. There every query names the company, and one file can be read to see that no other company's rows can come out.",
        });
      }
    });
  },
};

/** No SQL from text. */
export const noRawSql = {
  /** @param {RuleContext} context */
  create(context) {
    return {
      /** @param {MemberNode} node */
      MemberExpression(node) {
        if (node.object.name === "sql" && node.property.name === "raw") {
          context.report({
            node,
            message:
              "sql.raw puts text into a statement unescaped. Use sql`...` with ${values}, which are bound.",
          });
        }
      },
    };
  },
};

const impure = {
  Date: ["now"],
  Math: ["random"],
  performance: ["now"],
  crypto: ["randomUUID", "getRandomValues"],
};

/** Packages get time and chance as arguments. */
export const noClockOrChance = {
  /** @param {RuleContext} context */
  create(context) {
    const path = pathOf(context);
    if (!path.startsWith("packages/") || path.includes(".test.")) return {};
    /** @param {unknown} node */
    const report = (node) =>
      context.report({
        node,
        message:
          "Packages take the time and random numbers as arguments, so that the same record always folds to the same state and a test can say what time it is.",
      });
    return {
      /** @param {MemberNode} node */
      MemberExpression(node) {
        const members = /** @type {Record<string, string[]>} */ (impure)[node.object.name ?? ""];
        if (members?.includes(node.property.name ?? "")) report(node);
      },
      /** @param {{ callee: { name?: string }, arguments: unknown[] }} node */
      NewExpression(node) {
        if (node.callee.name === "Date" && node.arguments.length === 0) report(node);
      },
    };
  },
};
