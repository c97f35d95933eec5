import { spawnSync } from "node:child_process";
import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { delimiter, dirname, join } from "node:path";
import { fileURLToPath } from "node:url";
import { afterAll, beforeAll, describe, expect, test } from "vitest";

const root = fileURLToPath(new URL("../..", import.meta.url));

interface Sample {
  situation: string;
  path: string;
  code: string;
  /** What the message has to say; null when nothing may be said. */
  says: RegExp | null;
}

const samples: Sample[] = [
  ...[
    ["furnace may import field-math", "packages/furnace/src/a.ts", "@emberladder/field-math", null],
    [
      "field-math may not import furnace",
      "packages/field-math/src/a.ts",
      "@emberladder/furnace",
      /on the phone/,
    ],
    ["trees may not import diagnosis", "packages/trees/src/a.ts", "@emberladder/diagnosis", /on the phone/],
    [
      "diagnosis may not import contract",
      "packages/diagnosis/src/a.ts",
      "@emberladder/contract",
      /on the phone/,
    ],
    ["contract may not import words", "packages/contract/src/a.ts", "@emberladder/words", /on the phone/],
    ["words may import diagnosis", "packages/words/src/a.ts", "@emberladder/diagnosis", null],
    ["words may not import contract", "packages/words/src/b.ts", "@emberladder/contract", /on the phone/],
    ["a package may not import react", "packages/words/src/c.ts", "react", /no framework/],
    ["a package may not import express", "packages/furnace/src/b.ts", "express", /no framework/],
    ["a package may not import node's modules", "packages/furnace/src/c.ts", "node:fs", /no framework/],
    [
      "a package may not import the database",
      "packages/contract/src/b.ts",
      "@emberladder/db",
      /no framework/,
    ],
    [
      "a package may not import an application",
      "packages/contract/src/c.ts",
      "@emberladder/api",
      /no framework/,
    ],
    [
      "a package may not reach into another",
      "packages/trees/src/b.ts",
      "../../furnace/src/codes.ts",
      /by its name/,
    ],
    ["a package may import its own files", "packages/trees/src/c.ts", "./document.ts", null],
    ["the database may not import the API", "db/src/a.ts", "@emberladder/api", /does not know them/],
    [
      "the database server may not need an installed package",
      "db/src/server/a.mjs",
      "mysql2",
      /bare machine/,
    ],
    [
      "the client may not import the database",
      "apps/web/src/lib/a.ts",
      "@emberladder/db",
      /through the contract/,
    ],
    [
      "the client may not import the API",
      "apps/web/src/lib/b.ts",
      "@emberladder/api",
      /through the contract/,
    ],
    [
      "the client may not reach into the API",
      "apps/web/src/lib/c.ts",
      "../../../api/src/a.ts",
      /by its name/,
    ],
    ["the API may not import the client", "apps/api/src/a.ts", "@emberladder/web", /through the contract/],
    ["the launcher may not need an installed package", "apps/launcher/src/a.mjs", "express", /bare machine/],
    ["a new package has to be listed", "packages/gadgets/src/a.ts", "./b.ts", /is not listed/],
    [
      "a feature may not import another by alias",
      "apps/web/src/features/calls/a.ts",
      "#features/units/b.ts",
      /calls must not import the feature units/,
    ],
    [
      "a feature may not import another by path",
      "apps/web/src/features/calls/b.ts",
      "../units/b.ts",
      /calls must not import the feature units/,
    ],
    ["a feature may import its own files", "apps/web/src/features/calls/c.ts", "#features/calls/d.ts", null],
    [
      "a feature may not import the routes",
      "apps/web/src/features/calls/e.ts",
      "#app/router.tsx",
      /Only app\/ knows the routes/,
    ],
    [
      "a shared component may not import a feature",
      "apps/web/src/components/a.ts",
      "#features/calls/a.ts",
      /serve every feature/,
    ],
    ["the routes may import features", "apps/web/src/app/a.ts", "#features/calls/a.ts", null],
    [
      "a use case may not talk SQL",
      "apps/api/src/modules/calls/use-cases.ts",
      "drizzle-orm",
      /Only repository\.ts may talk SQL/,
    ],
    ["a repository may talk SQL", "apps/api/src/modules/calls/repository.ts", "drizzle-orm", null],
  ].map(([situation, path, source, says]) => ({
    situation: String(situation),
    path: String(path),
    code: `export * from "${String(source)}";\n`,
    says: says as RegExp | null,
  })),
  {
    situation: "sql.raw is refused, in a repository too",
    path: "apps/api/src/modules/units/repository.ts",
    code: 'import { sql } from "drizzle-orm";\nexport const order = (by: string) => sql.raw(by);\n',
    says: /unescaped/,
  },
  {
    situation: "a bound sql template is accepted",
    path: "apps/api/src/modules/sites/repository.ts",
    code: 'import { sql } from "drizzle-orm";\nexport const order = (by: string) => sql`${by}`;\n',
    says: null,
  },
  {
    situation: 'type="number" is refused',
    path: "apps/web/src/components/field.tsx",
    code: 'export const Field = () => <input type="number" />;\n',
    says: /a reading is lost/,
  },
  {
    situation: "words in a screen are refused",
    path: "apps/web/src/components/words.tsx",
    code: "export const Words = () => <p>No heat</p>;\n",
    says: /message catalogue/,
  },
  {
    situation: "words in a label are refused",
    path: "apps/web/src/components/label.tsx",
    code: 'export const Label = () => <p aria-label="No heat">{1}</p>;\n',
    says: /message catalogue/,
  },
  {
    situation: "a package may not read the clock",
    path: "packages/diagnosis/src/clock.ts",
    code: "export const now = () => new Date();\n",
    says: /time and random numbers as arguments/,
  },
  {
    situation: "a package may not make up numbers",
    path: "packages/diagnosis/src/chance.ts",
    code: "export const chance = () => Math.random();\n",
    says: /time and random numbers as arguments/,
  },
  {
    situation: "a promise nobody waits for is refused",
    path: "apps/api/src/floating.ts",
    code: "const work = async () => 1;\nexport function start() {\n  work();\n}\n",
    says: /Promises must be awaited/,
  },
  {
    situation: "any is refused",
    path: "apps/api/src/any.ts",
    code: "export const loose = (value: any): unknown => value;\n",
    says: /any/,
  },
  {
    situation: "a comment that silences the compiler is refused",
    path: "apps/api/src/silenced.ts",
    code: "// @ts-ignore\nexport const one = 1;\n",
    says: /@ts-ignore/,
  },
];

interface Diagnostic {
  message: string;
  filename: string;
}

// SEC-13: no SQL from text. UX-16: no number inputs. UX-36: words come from the catalogues.
describe("lint rules", () => {
  let folder: string;
  let diagnostics: Diagnostic[];

  beforeAll(() => {
    folder = mkdtempSync(join(tmpdir(), "emberladder-lint-"));
    const settings = {
      compilerOptions: { strict: true, jsx: "react-jsx", module: "esnext", moduleResolution: "bundler" },
    };
    writeFileSync(join(folder, "tsconfig.json"), JSON.stringify(settings));
    for (const { path, code } of samples) {
      mkdirSync(dirname(join(folder, path)), { recursive: true });
      writeFileSync(join(folder, path), code);
    }
    const result = spawnSync(
      process.execPath,
      [
        join(root, "node_modules/oxlint/bin/oxlint"),
        "--type-aware",
        "--config",
        join(root, ".oxlintrc.json"),
        "--format",
        "json",
      ],
      {
        cwd: folder,
        encoding: "utf8",
        env: { ...process.env, PATH: [join(root, "node_modules/.bin"), process.env["PATH"]].join(delimiter) },
      },
    );
    diagnostics = (JSON.parse(result.stdout) as { diagnostics: Diagnostic[] }).diagnostics;
  }, 60_000);
  afterAll(() => rmSync(folder, { recursive: true, force: true }));

  test.each(samples)("$situation ($path)", ({ path, says }) => {
    const messages = diagnostics
      .filter(({ filename }) => filename.endsWith(path))
      .map(({ message }) => message);
    expect(messages.join("\n")).toMatch(says ?? /^$/);
  });
});
