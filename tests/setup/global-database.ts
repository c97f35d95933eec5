import type { TestProject } from "vitest/node";
import { startTestDatabase, type TestDatabaseFacts } from "./test-database.mjs";
import { makeTestFolder } from "./test-folder.mjs";

declare module "vitest" {
  export interface ProvidedContext {
    testDatabase: TestDatabaseFacts;
  }
}

/**
 * Gives every test of a project the database server of this run. A whole run has started one already and hands it
 * over in EMBERLADDER_TEST_DATABASE; a project that is run by itself starts its own.
 *
 * @returns what stops the server again, when it was started here
 */
export default async function provideDatabase(project: TestProject): Promise<() => Promise<void>> {
  const given = process.env["EMBERLADDER_TEST_DATABASE"];
  if (given !== undefined) {
    project.provide("testDatabase", JSON.parse(given) as TestDatabaseFacts);
    return async () => undefined;
  }
  const folder = await makeTestFolder();
  try {
    const { facts, stop } = await startTestDatabase(folder);
    project.provide("testDatabase", facts);
    return async () => {
      await stop();
      await folder.remove();
    };
  } catch (error) {
    await folder.remove();
    throw error;
  }
}
