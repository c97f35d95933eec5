import { existsSync, readFileSync, readdirSync } from "node:fs";
import { fileURLToPath } from "node:url";
import { describe, expect, it } from "vitest";
import { tradeDocuments } from "../docs/trade-documents.ts";

const folder = fileURLToPath(new URL("../../docs/trade/", import.meta.url));

describe("the generated pages in docs/trade", () => {
  it.each(Object.entries(tradeDocuments))("%s says what the product says now", (name, make) => {
    const path = `${folder}${name}`;
    const committed = existsSync(path) ? readFileSync(path, "utf8") : "";
    expect(committed === make(), `${name} is stale: run npx tsx tests/docs/write-trade-docs.ts`).toBe(true);
  });

  it("are all there is in the folder", () => {
    expect(readdirSync(folder).toSorted()).toEqual(Object.keys(tradeDocuments).toSorted());
  });
});
