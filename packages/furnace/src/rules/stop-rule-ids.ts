/** Rules that block progress until what they ask for is recorded. Their codes are what the trade reads aloud. */
export const STOP_RULE_CODES = {
  co: "CO",
  "co-alarm": "CO-ALARM",
  "co-30": "CO-30",
  "gas-odor": "GAS-ODOR",
  "lel-1": "LEL-1",
  "raw-gas": "RAW-GAS",
  access: "ACCESS",
  "found-off": "FOUND-OFF",
  "lp-empty": "LP-EMPTY",
  "lp-low": "LP-LOW",
  rollout: "ROLLOUT",
  spill: "SPILL",
  "flue-400": "FLUE-400",
  exchanger: "EXCHANGER",
  "leak-by": "LEAK-BY",
  soot: "SOOT",
  "live-cabinet": "LIVE-CABINET",
  flood: "FLOOD",
  "water-wet": "WATER/WET",
  asbestos: "ASBESTOS",
} as const;
export type StopRuleId = keyof typeof STOP_RULE_CODES;

export const STOP_RULE_IDS = Object.keys(STOP_RULE_CODES) as StopRuleId[];

/** Whether a text is the id of a stop rule. */
export function isStopRuleId(id: string): id is StopRuleId {
  return Object.hasOwn(STOP_RULE_CODES, id);
}
