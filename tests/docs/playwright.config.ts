import { defineConfig } from "@playwright/test";
import e2e from "../e2e/playwright.config.ts";

/** Pictures for the documents, taken from the running product; not part of the tests. */
export default defineConfig({ ...e2e, testDir: ".", testMatch: "take-screenshots.spec.ts" });
