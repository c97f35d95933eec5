import { pathOf, resolveImport, visitImports } from "./imports.mjs";

/** @typedef {import("./imports.mjs").RuleContext} RuleContext */

const featurePattern = /^apps\/web\/src\/features\/([^/]+)\//;

/** In the client: features do not import each other, and what they share imports neither them nor the routes. */
export const clientLayers = {
  /** @param {RuleContext} context */
  create(context) {
    const path = pathOf(context);
    if (!path.startsWith("apps/web/src/")) return {};
    const feature = featurePattern.exec(path)?.[1];
    const isShared = /^apps\/web\/src\/(components|lib|messages|styles)\//.test(path);
    return visitImports((node, source) => {
      const target = resolveImport(path, source) ?? "";
      const other = featurePattern.exec(target)?.[1];
      if (feature !== undefined && other !== undefined && other !== feature) {
        context.report({
          node,
          message: `The feature ${feature} must not import the feature ${other}. Features are put together by routes in app/, so that each can be changed and loaded alone; move what both need to lib/ or components/.`,
        });
      }
      if ((feature !== undefined || isShared) && target.startsWith("apps/web/src/app/")) {
        context.report({
          node,
          message:
            "Only app/ knows the routes and providers: it imports features, never the other way round.",
        });
      }
      if (isShared && other !== undefined) {
        context.report({
          node,
          message: `What is shared must not know the feature ${other}: components/ and lib/ serve every feature.`,
        });
      }
    });
  },
};

/** A reading is typed on our own keypad or a text field with a decimal keypad. */
export const noNumberInput = {
  /** @param {RuleContext} context */
  create(context) {
    return {
      /** @param {{ name: { name: unknown }, value: { value?: unknown, expression?: { value?: unknown } } | null }} node */
      JSXAttribute(node) {
        const value = node.value?.value ?? node.value?.expression?.value;
        if (node.name.name === "type" && value === "number") {
          context.report({
            node,
            message:
              'type="number" drops what it cannot read and changes with a scroll or an arrow key, so a reading is lost or wrong. Use inputMode="decimal" and parse the text.',
          });
        }
      },
    };
  },
};

const spokenAttributes = new Set(["alt", "aria-label", "aria-description", "placeholder", "title", "label"]);

/** Words people read come from the message catalogues. */
export const wordsFromCatalogue = {
  /** @param {RuleContext} context */
  create(context) {
    if (!/^apps\/web\/src\/.*\.tsx$/.test(pathOf(context)) || pathOf(context).includes(".test.")) return {};
    /**
     * @param {unknown} node
     * @param {unknown} text
     */
    const check = (node, text) => {
      if (typeof text === "string" && /\p{L}{2,}/u.test(text)) {
        context.report({
          node,
          message: `"${text.trim()}" is written into the screen. Put it into the message catalogue, so that it can be said in another language.`,
        });
      }
    };
    return {
      /** @param {{ value: string }} node */
      JSXText: (node) => check(node, node.value),
      /** @param {{ name: { name: unknown }, value: { value?: unknown } | null }} node */
      JSXAttribute(node) {
        if (typeof node.name.name === "string" && spokenAttributes.has(node.name.name))
          check(node, node.value?.value);
      },
    };
  },
};
