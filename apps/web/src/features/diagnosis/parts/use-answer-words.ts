import type { Look, Observation } from "@emberladder/diagnosis";
import { format } from "date-fns";
import { useTranslation } from "react-i18next";
import { formatNumber } from "#lib/format-number.ts";
import { natureOf, useReadingUnits } from "#lib/use-reading-units.ts";

/** What an answer says, in words: what was taken, its value or finding, the unit's state and the time. */
export interface AnswerWords {
  what: string;
  /** Figures, drawn in the figures' type; empty where there are none. */
  figures: string;
  /** What was found, in words. */
  found: string;
  /** Both together. */
  value: string;
  state: string;
}

/** Words of readings and looks, for lists of evidence and for checking answers. */
export function useAnswerWords() {
  const { t } = useTranslation();
  const { write, figureOf } = useReadingUnits();
  const findingWord = (check: string, finding: string) =>
    t([`trade:findings.${check}.${finding}`, `check.findings.${finding}`]);
  const ofObservation = (one: Observation): AnswerWords => {
    const reading =
      one.inV !== undefined
        ? t("inOut.values", {
            inV: formatNumber(one.inV),
            outV: one.outV === undefined ? "-" : formatNumber(one.outV),
          })
        : one.value === undefined
          ? ""
          : one.unit
            ? write(one.value, one.unit, natureOf(one.check))
            : figureOf(one.value, "count");
    const finding = one.finding ? findingWord(one.check, one.finding) : "";
    const plain = one.outcome ? t(`check.zones.${one.outcome}`) : "";
    return {
      what: t(`trade:checks.${one.check}.title`),
      figures: reading,
      found: finding || (reading ? "" : plain),
      value: [reading, finding].filter(Boolean).join(", ") || plain,
      state: t("conclude.readState", {
        state: t(`unitState.short.${one.power}`),
        time: format(one.at, "HH:mm"),
      }),
    };
  };
  const ofLook = (look: Look): AnswerWords => {
    const found =
      look.check && look.finding
        ? findingWord(look.check, look.finding)
        : t(look.answer === "right" ? "check.zones.good" : "check.zones.fail");
    return {
      what: t(`trade:firstLook.${look.item}.title`),
      figures: "",
      found,
      value: found,
      state: t("conclude.lookState", { time: format(look.at, "HH:mm") }),
    };
  };
  return { ofObservation, ofLook };
}
