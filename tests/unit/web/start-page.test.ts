import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";

/** The page the client starts in. UX-10: WCAG 2.2, 1.3.4 orientation and 1.4.4 resize text. */
const web = new URL("../../../apps/web/", import.meta.url);
const page = readFileSync(new URL("index.html", web), "utf8");
const manifest = JSON.parse(readFileSync(new URL("public/manifest.webmanifest", web), "utf8")) as Record<
  string,
  unknown
>;
const styles = ["index.css", "tokens.css"].map((name) =>
  readFileSync(new URL(`src/styles/${name}`, web), "utf8"),
);

describe("the start page", () => {
  it("lets people enlarge it", () => {
    const viewport = /<meta name="viewport" content="([^"]+)"/.exec(page)?.[1] ?? "";
    expect(viewport).toContain("width=device-width");
    expect(viewport).not.toMatch(/user-scalable\s*=\s*(no|0)|maximum-scale|minimum-scale/);
  });

  it("may be turned: neither the installed product nor a style holds it upright", () => {
    expect(["any", "natural", undefined]).toContain(manifest["orientation"]);
    for (const css of styles) expect(css).not.toMatch(/orientation:\s*(portrait|landscape)/);
  });

  it("says its language", () => {
    expect(page).toMatch(/<html lang="en"/);
  });
});
