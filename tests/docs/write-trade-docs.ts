/** Writes `docs/trade` anew: `npx tsx tests/docs/write-trade-docs.ts`. */
import { mkdirSync, writeFileSync } from "node:fs";
import { fileURLToPath } from "node:url";
import { tradeDocuments } from "./trade-documents.ts";

const folder = fileURLToPath(new URL("../../docs/trade/", import.meta.url));

mkdirSync(folder, { recursive: true });
for (const [name, make] of Object.entries(tradeDocuments)) writeFileSync(`${folder}${name}`, make());
