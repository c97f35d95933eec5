import type { VisitOutcome } from "@emberladder/diagnosis";
import type { ReportContent } from "@emberladder/contract";

/** Sentences of the customer's report that are not the trade's own words, in English. */

export const SAFE_WORDS: Readonly<Record<VisitOutcome, ReportContent["safe"]>> = {
  fixed: { state: "safe", text: "Your furnace is running and passed the tests we make before leaving." },
  "part-needed": {
    state: "not-running",
    text: "Your furnace is off until a part is fitted. Please leave it off.",
  },
  "shut-off": {
    state: "shut-off",
    text: "Your furnace is shut off because it is not safe to run. Please do not turn it on.",
  },
  referred: {
    state: "not-running",
    text: "Your furnace is left off until somebody else has done their part.",
  },
  "not-found": {
    state: "not-running",
    text: "We have not proven the cause yet. Call us if the heat stops again.",
  },
};

export const NEXT_WORDS: Readonly<Record<VisitOutcome, string[]>> = {
  fixed: ["Nothing to do now. Change the filter as usual and have the furnace looked at once a year."],
  "part-needed": ["We have ordered what is missing and will call you to fit it."],
  "shut-off": [
    "Keep the building warm in another way that is safe indoors.",
    "Call us before anybody works on it.",
  ],
  referred: ["We will tell you who has to come and what they have to do."],
  "not-found": ["If the heat stops again, note the time and leave the furnace as it is until we come."],
};

export const CAUTION_WORDS = [
  "If you smell gas, leave the building at once and call from outside.",
  "If a carbon monoxide alarm sounds or anyone feels unwell, leave and call for help.",
  "The maker's instructions and the rules that hold where you live come before anything written here.",
];

export const VERDICT_WORDS = {
  good: "as it should be",
  marginal: "borderline",
  fail: "out of range",
} as const;

export const NOT_PROVEN = "The cause could not be proven on this visit.";
export const NOTHING_DONE = "Nothing was repaired or replaced on this visit.";
export const OVER_RANGE = "beyond the meter's range";
export const AFTER_REPAIR = "after the repair";
export const PART_FITTED = "fitted";
export const PART_ORDERED = "ordered";
