/**
 * The moment at which a day begins in a time zone. Where the clock change skips midnight, the first moment of
 * the day that exists.
 *
 * @param day `YYYY-MM-DD`
 * @param timeZone IANA name
 */
export function startOfDay(day: string, timeZone: string): Date {
  const midnightUtc = Date.parse(`${day}T00:00:00Z`);
  // Two steps settle the offset also next to a clock change.
  let guess = midnightUtc - offsetAt(midnightUtc, timeZone);
  guess = midnightUtc - offsetAt(guess, timeZone);
  return new Date(guess);
}

/** The moment at which the day after begins. */
export function endOfDay(day: string, timeZone: string): Date {
  const next = new Date(Date.parse(`${day}T00:00:00Z`) + 86_400_000).toISOString().slice(0, 10);
  return startOfDay(next, timeZone);
}

/** Local time less UTC at a moment, in milliseconds. */
function offsetAt(moment: number, timeZone: string): number {
  const parts = new Intl.DateTimeFormat("en-US", {
    timeZone,
    hourCycle: "h23",
    year: "numeric",
    month: "2-digit",
    day: "2-digit",
    hour: "2-digit",
    minute: "2-digit",
    second: "2-digit",
  }).formatToParts(moment);
  const read = (type: string) => Number(parts.find((part) => part.type === type)?.value);
  const local = Date.UTC(
    read("year"),
    read("month") - 1,
    read("day"),
    read("hour"),
    read("minute"),
    read("second"),
  );
  return local - Math.floor(moment / 1000) * 1000;
}
