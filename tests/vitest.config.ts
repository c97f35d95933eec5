import { fileURLToPath } from "node:url";
import { defineConfig } from "vitest/config";

const root = fileURLToPath(new URL("..", import.meta.url));
const withDatabase = {
  globalSetup: ["tests/setup/global-database.ts"],
  testTimeout: 20_000,
  hookTimeout: 60_000,
};

export default defineConfig({
  root,
  test: {
    pool: "forks",
    maxWorkers: 2,
    passWithNoTests: true,
    projects: [
      {
        root,
        test: {
          name: "unit",
          environment: "node",
          include: ["tests/unit/**/*.test.ts", "packages/*/src/**/*.test.ts", "apps/*/src/**/*.test.ts"],
          testTimeout: 20_000,
        },
      },
      {
        root,
        test: {
          name: "screens",
          environment: "jsdom",
          include: ["tests/unit/**/*.test.tsx", "apps/web/src/**/*.test.tsx"],
          testTimeout: 20_000,
        },
      },
      { root, test: { name: "api", include: ["tests/api/**/*.test.ts"], ...withDatabase } },
      { root, test: { name: "outside", include: ["tests/outside/**/*.test.ts"], testTimeout: 60_000 } },
      {
        root,
        test: {
          name: "faults",
          include: ["tests/faults/**/*.test.ts"],
          ...withDatabase,
          testTimeout: 120_000,
        },
      },
    ],
  },
});
