import { makeSequenceDocument } from "./generate-sequence-diagram.ts";

/** Every generated page of `docs/trade` and what makes it. */
export const tradeDocuments: Record<string, () => string> = {
  "ignition-sequence.md": makeSequenceDocument,
};
