/** One rule of the trade that an act is against: its id, for the words, and what the words name. */
export interface Breach {
  rule: string;
  params?: Record<string, string | number | boolean>;
}

/** The breaches of the conditions that hold. */
export function breachWhere(...conditions: (Breach | false | undefined | null)[]): Breach[] {
  return conditions.filter((condition): condition is Breach => Boolean(condition));
}
