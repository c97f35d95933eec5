import type { ReadingUnit } from "@emberladder/furnace";
import { useTranslation } from "react-i18next";
import { useReadingUnits } from "./use-reading-units.ts";

/** A rule that something is against, as the phone's refusals and the server's flags carry it. */
interface Breach {
  rule: string;
  params?: Record<string, unknown>;
}

/** Says what a rule asks, with figures in the units shown and closing checks by their names. */
export function useRuleWords(): (breach: Breach) => string {
  const { t } = useTranslation();
  const { figureOf, signOf } = useReadingUnits();
  return ({ rule, params = {} }) => {
    const closing = params["closing"];
    const unit = params["unit"] as ReadingUnit | undefined;
    // The only check that reads temperatures is the rise.
    const nature = { isDifference: unit === "F" };
    const figures = Object.entries(params).flatMap(([name, value]) =>
      unit && FIGURES.includes(name) && (typeof value === "number" || value === "OL")
        ? [[name, figureOf(value, unit, nature)]]
        : [],
    );
    const values: Record<string, unknown> = {
      ...params,
      ...Object.fromEntries(figures),
      rule,
      ...(unit ? { unit: signOf(unit, nature) } : {}),
      closing: typeof closing === "string" ? t(`trade:closing.${closing}.title`) : "",
    };
    return t([`rules.${rule}`, `review.flagWords.${rule}`, "rules.unknown"], values);
  };
}

const FIGURES = ["value", "least", "most"];
