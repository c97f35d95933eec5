import type { BrowserContext } from "@playwright/test";

/** What the pages of a context were refused by their content policy, as it happens. SEC-14. */
export async function collectViolations(context: BrowserContext): Promise<string[]> {
  const violations: string[] = [];
  await context.exposeBinding("noteViolation", (_source, words: string) => {
    violations.push(words);
  });
  await context.addInitScript(() => {
    document.addEventListener("securitypolicyviolation", (event) => {
      const { noteViolation } = globalThis as unknown as { noteViolation: (words: string) => void };
      noteViolation(`${event.effectiveDirective} ${event.blockedURI} on ${location.pathname}`);
    });
  });
  return violations;
}
