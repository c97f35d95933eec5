/**
 * Times as they are read at the site: storage is UTC, every screen and report shows the site's own clock with
 * its abbreviation. All functions take an ISO moment or UTC milliseconds and an IANA time zone.
 */
type Moment = string | number;

const parts = (moment: Moment, timeZone: string, options: Intl.DateTimeFormatOptions) =>
  new Intl.DateTimeFormat("en-US", { timeZone, ...options }).formatToParts(new Date(moment));

/** The clock at the site, such as `08:30`. */
export function formatTime(moment: Moment, timeZone: string): string {
  return new Intl.DateTimeFormat("en-GB", { timeZone, hour: "2-digit", minute: "2-digit" }).format(
    new Date(moment),
  );
}

/** The abbreviation of the site's time zone at that moment, such as `MST`. */
export function zoneName(moment: Moment, timeZone: string): string {
  return (
    parts(moment, timeZone, { timeZoneName: "short" }).find((part) => part.type === "timeZoneName")?.value ??
    ""
  );
}

/** A day, such as `14 Nov`, with the year where it is not the present one. */
export function formatDay(moment: Moment, timeZone: string, now: number = Date.now()): string {
  const year = (at: Moment) => dayOf(at, timeZone).slice(0, 4);
  return new Intl.DateTimeFormat("en-GB", {
    timeZone,
    day: "numeric",
    month: "short",
    ...(year(moment) === year(now) ? {} : { year: "numeric" }),
  }).format(new Date(moment));
}

/** A day in full, such as `Tuesday 13 January`. */
export function formatLongDay(moment: Moment, timeZone: string): string {
  return new Intl.DateTimeFormat("en-GB", { timeZone, weekday: "long", day: "numeric", month: "long" })
    .format(new Date(moment))
    .replace(",", "");
}

/** Day and clock with the zone, such as `13 Jan 08:30 MST`. */
export function formatMoment(moment: Moment, timeZone: string): string {
  return `${formatDay(moment, timeZone)} ${formatTime(moment, timeZone)} ${zoneName(moment, timeZone)}`;
}

/** The calendar day at the site as `YYYY-MM-DD`, as addresses and the API write it. */
export function dayOf(moment: Moment, timeZone: string): string {
  const found = parts(moment, timeZone, { year: "numeric", month: "2-digit", day: "2-digit" });
  const part = (type: string) => found.find((item) => item.type === type)?.value ?? "";
  return `${part("year")}-${part("month")}-${part("day")}`;
}

/** A calendar day moved by whole days; days of the calendar have no time zone. */
export function addDays(day: string, days: number): string {
  const moment = new Date(`${day}T00:00:00Z`);
  moment.setUTCDate(moment.getUTCDate() + days);
  return moment.toISOString().slice(0, 10);
}

/**
 * The moment at which the site's clock shows a day and a time. A time that a clock change skips becomes the one
 * an hour later; one that comes twice is the first.
 * @returns ISO 8601 in UTC.
 */
export function momentAtSite(day: string, time: string, timeZone: string): string {
  const wanted = Date.parse(`${day}T${time}:00Z`);
  const offsetAt = (moment: number) =>
    Date.parse(`${dayOf(moment, timeZone)}T${formatTime(moment, timeZone)}:00Z`) - moment;
  // No zone changes its clock twice within two days, so the offset is the one before or the one after.
  const [before, after] = [offsetAt(wanted - 86_400_000), offsetAt(wanted + 86_400_000)];
  const shown = [wanted - before, wanted - after].filter((moment) => moment + offsetAt(moment) === wanted);
  return new Date(shown.length > 0 ? Math.min(...shown) : wanted - before).toISOString();
}
