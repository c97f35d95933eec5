import { expect, test } from "@playwright/test";
import { measureBudget } from "../load/budget.mjs";

// The product under test was built by its own start, so its manifest is there.
test("UX-33: sign-in and the list of calls stay within their bound of compressed script", () => {
  const sums = measureBudget() ?? [];
  for (const { name, kb, boundKb } of sums) console.log(`${name}: ${kb.toFixed(1)} kB of ${boundKb} kB`);
  const shell = sums.find(({ name }) => name === "sign-in and calls");
  expect(shell?.kb).toBeGreaterThan(0);
  expect(shell?.kb).toBeLessThanOrEqual(shell?.boundKb ?? 0);
});
