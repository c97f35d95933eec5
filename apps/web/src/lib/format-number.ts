/** A figure as it is shown beside a scale: at most three decimals, no trailing zeros, thousands kept plain. */
export function formatNumber(value: number): string {
  if (!Number.isFinite(value)) return value > 0 ? "OL" : "-OL";
  return Number(value.toFixed(3)).toString();
}
