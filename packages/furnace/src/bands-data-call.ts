import { below, chain, FAIL, GOOD, MARGINAL, upTo } from "./bands-chain.ts";
import type { Band } from "./bands-types.ts";

/** Bands of the checks of the call for heat. Common practice; the marginal edges are judgement. */
export const callBands: readonly Band[] = [
  {
    check: "ck-tstat-batteries",
    key: "all",
    unit: "V",
    quantity: "value",
    chain: chain(FAIL, below(1.3), MARGINAL, below(1.45), GOOD),
  },
  {
    check: "ck-tstat-call-w",
    key: "all",
    unit: "V",
    quantity: "value",
    chain: chain(FAIL, below(18), MARGINAL, below(22), GOOD, upTo(30), FAIL),
  },
  {
    check: "ck-tstat-cable-ohms",
    key: "all",
    unit: "ohm",
    quantity: "value",
    chain: chain(GOOD, below(5), MARGINAL, upTo(20), FAIL),
  },
  {
    check: "ck-anticipator",
    key: "all",
    unit: "A",
    quantity: "magnitude",
    chain: chain(GOOD, upTo(0.05), MARGINAL, upTo(0.1), FAIL),
  },
  {
    check: "ck-smoke-contact",
    key: "all",
    unit: "V",
    quantity: "across",
    chain: chain(GOOD, upTo(0.5), MARGINAL, upTo(3), FAIL),
  },
  {
    check: "ck-overflow-switch",
    key: "all",
    unit: "V",
    quantity: "across",
    chain: chain(GOOD, upTo(0.5), MARGINAL, upTo(3), FAIL),
  },
  {
    check: "ck-twin-link",
    key: "all",
    unit: "V",
    quantity: "magnitude",
    chain: chain(GOOD, upTo(2), MARGINAL, upTo(10), FAIL),
  },
];
