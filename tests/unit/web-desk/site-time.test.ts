import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  addDays,
  dayOf,
  formatMoment,
  formatTime,
  momentAtSite,
} from "../../../apps/web/src/lib/site-time.ts";

const DENVER = "America/Denver";

describe("times at the site", () => {
  it("shows a moment on the site's clock with the abbreviation of its zone", () => {
    expect(formatMoment("2026-01-13T15:30:00.000Z", DENVER)).toMatch(/^13 Jan( 2026)? 08:30 MST$/);
    expect(formatTime("2026-07-13T15:30:00.000Z", DENVER)).toBe("09:30");
  });

  it("puts a late evening on the site's day, not on the day of UTC", () => {
    expect(dayOf("2026-01-14T05:00:00.000Z", DENVER)).toBe("2026-01-13");
  });

  // In 2026 the clocks of the United States change on 8 March and 1 November (Energy Policy Act of 2005).
  it("moves a time that the spring change skips an hour later", () => {
    expect(momentAtSite("2026-03-08", "02:30", DENVER)).toBe("2026-03-08T09:30:00.000Z");
    expect(formatTime("2026-03-08T09:30:00.000Z", DENVER)).toBe("03:30");
  });

  it("takes the first of two when the autumn change repeats a time", () => {
    expect(momentAtSite("2026-11-01", "01:30", DENVER)).toBe("2026-11-01T07:30:00.000Z");
  });

  it("comes back to the same clock for every other time in every zone", () => {
    const zone = fc.constantFrom(
      DENVER,
      "America/Phoenix",
      "America/St_Johns",
      "Europe/Berlin",
      "Pacific/Apia",
      "UTC",
    );
    const minute = fc.integer({ min: 0, max: 365 * 24 * 60 - 1 });
    fc.assert(
      fc.property(zone, minute, (timeZone, minutes) => {
        const wanted = new Date(Date.UTC(2026, 0, 1) + minutes * 60_000).toISOString();
        const [day, time] = [wanted.slice(0, 10), wanted.slice(11, 16)];
        const moment = momentAtSite(day, time, timeZone);
        const shown = formatTime(moment, timeZone);
        // The hour that a change skips is the one exception: it has no moment.
        const isSkipped = shown !== time && momentAtSite(dayOf(moment, timeZone), shown, timeZone) === moment;
        expect(isSkipped || (shown === time && dayOf(moment, timeZone) === day)).toBe(true);
      }),
      { numRuns: 300 },
    );
  });

  it("counts days over the end of a month and of a year", () => {
    expect(addDays("2026-12-31", 1)).toBe("2027-01-01");
    expect(addDays("2028-03-01", -1)).toBe("2028-02-29");
  });
});
