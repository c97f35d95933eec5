/** A moment in a place's own time with its abbreviation, as people read it: "Monday, January 12, 2026 at 8:40 AM MST". */
export function formatMoment(moment: Date, timeZone: string): string {
  return (
    new Intl.DateTimeFormat("en-US", {
      timeZone,
      weekday: "long",
      year: "numeric",
      month: "long",
      day: "numeric",
      hour: "numeric",
      minute: "2-digit",
      timeZoneName: "short",
    })
      .format(moment)
      // Some versions of the language data put narrow spaces that fonts and mail programs lack.
      .replaceAll(/[\u202f\u00a0]/g, " ")
  );
}

/** A day in a place's own time: "January 12, 2026". */
export function formatDay(moment: Date, timeZone: string): string {
  return new Intl.DateTimeFormat("en-US", {
    timeZone,
    year: "numeric",
    month: "long",
    day: "numeric",
  }).format(moment);
}
