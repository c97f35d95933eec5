export type ParsedReading =
  { ok: true; value: number | "OL" } | { ok: false; reason: "empty" | "not-a-number" };

/**
 * Reads a typed reading: point or comma, spaces ignored, a sign allowed, "OL" for beyond the meter's range.
 * Nothing else is guessed.
 */
export function parseReading(text: string): ParsedReading {
  const bare = text.replaceAll(/[\s\u00a0]/g, "");
  if (bare === "") return { ok: false, reason: "empty" };
  if (/^o\.?l\.?$/i.test(bare)) return { ok: true, value: "OL" };
  const normal = bare.replace(",", ".").replace("\u2212", "-");
  if (!/^[+-]?(\d+\.?\d*|\.\d+)$/.test(normal)) return { ok: false, reason: "not-a-number" };
  return { ok: true, value: Number(normal) };
}
