import { makeChecksPage, makeFaultsPage } from "./generate-catalogue-pages.ts";
import { makeBandsPage, makeStopRulesPage } from "./generate-limit-pages.ts";
import { makeSequenceDocument } from "./generate-sequence-diagram.ts";

/** Every generated page of `docs/trade` and what makes it. */
export const tradeDocuments: Record<string, () => string> = {
  "bands.md": makeBandsPage,
  "checks.md": makeChecksPage,
  "faults.md": makeFaultsPage,
  "ignition-sequence.md": makeSequenceDocument,
  "stop-rules.md": makeStopRulesPage,
};
