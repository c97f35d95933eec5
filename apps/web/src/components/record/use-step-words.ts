import type { EventBody } from "@emberladder/diagnosis";
import type { ReadingUnit } from "@emberladder/furnace";
import { useTranslation } from "react-i18next";
import { formatNumber } from "#lib/format-number.ts";
import { natureOf, useReadingUnits } from "#lib/use-reading-units.ts";
import type { Step } from "./steps-of.ts";

/** A step in words: what was done, and what it said, readings in the units shown. */
export function useStepWords(): (step: Step) => { title: string; value: string } {
  const { t } = useTranslation();
  const { write, figureOf } = useReadingUnits();
  const finding = (check: string, id: string | undefined) =>
    id ? t([["trade:findings", check, id].join("."), `check.findings.${id}`]) : "";
  const outcome = (value: string | undefined) => (value ? t(`check.zones.${value}`) : "");
  const number = (of: string, value: number | "OL" | undefined, unit: ReadingUnit | undefined) =>
    value === undefined ? "" : unit ? write(value, unit, natureOf(of)) : figureOf(value, "count");

  const words = (event: EventBody): { title: string; value: string } => {
    const title = t(`review.steps.${event.type.replace(".", "-")}`);
    switch (event.type) {
      case "door.answered":
        return { title: t(`trade:door.questions.${event.body.question}`), value: doorValue(event.body) };
      case "stop.raised":
        return { title, value: t(`trade:stopRules.${event.body.rule}.title`) };
      case "stop.act-recorded":
        return {
          title,
          value: [t(`trade:stopRules.${event.body.rule}.acts.${event.body.act}`), event.body.value ?? ""]
            .join(" ")
            .trim(),
        };
      case "look.answered":
        return {
          title: t([`trade:firstLook.${event.body.item}.title`, "look.atUnitName"]),
          value:
            event.body.check && event.body.finding
              ? finding(event.body.check, event.body.finding)
              : t(event.body.answer === "right" ? "check.zones.good" : "look.hit"),
        };
      case "watch.started":
        return {
          title,
          value: t("review.resets", {
            count: event.body.resetsBefore ?? 0,
            unknown: event.body.resetsBefore === null ? "unknown" : "",
          }),
        };
      case "watch.seen":
        return { title: t(`watch.sights.${event.body.sight}`), value: `${formatNumber(event.body.atS)} s` };
      case "watch.ended":
        return { title, value: `${t(`review.ends.${event.body.how}`)}, ${formatNumber(event.body.atS)} s` };
      case "check.started":
        return {
          title: t(`trade:checks.${event.body.check}.title`),
          value: event.body.opens.map((opening) => t(`trade:putBack.out.${opening.what}`)).join(", "),
        };
      case "check.answered": {
        const { check, inV, outV, value, unit } = event.body;
        const reading =
          inV === undefined
            ? number(check, value, unit)
            : t("inOut.values", {
                inV: formatNumber(inV),
                outV: outV === undefined ? "-" : formatNumber(outV),
              });
        return {
          title: t(`trade:checks.${check}.title`),
          value: [reading, finding(check, event.body.finding), outcome(event.body.outcome)]
            .filter(Boolean)
            .join(", "),
        };
      }
      case "check.declined":
        return {
          title: t(`trade:checks.${event.body.check}.title`),
          value: t(`trade:departures.${event.body.reason}`),
        };
      case "tree.left":
        return { title, value: t(`trade:departures.${event.body.reason}`) };
      case "cause.concluded":
        return { title, value: t([`trade:faults.${event.body.cause}.name`, "answers.notProven"]) };
      case "repair.recorded":
        return { title, value: event.body.done.map((id) => t(`trade:repairs.${id}`)).join(", ") };
      case "put-back.opened":
        return { title, value: t(`trade:putBack.what.${event.body.what}`) };
      case "proof.recorded":
        return {
          title: t(`trade:closing.${event.body.closing}.title`),
          value:
            event.body.value === undefined
              ? t("proof.seen")
              : number(event.body.closing, event.body.value, event.body.unit),
        };
      case "diagnosis.closed":
        return { title, value: t(`outcomes.${event.body.outcome}`) };
      case "unit-state.set":
        return {
          title,
          value: [
            event.body.power && t(event.body.power === "on" ? "unitState.powerOn" : "unitState.powerOff"),
            event.body.gas && t(event.body.gas === "open" ? "unitState.gasOpen" : "unitState.gasShut"),
            event.body.calling === undefined
              ? ""
              : t(event.body.calling ? "unitState.calling" : "unitState.notCalling"),
          ]
            .filter(Boolean)
            .join(", "),
        };
      default:
        return { title, value: "" };
    }
  };

  function doorValue(body: Extract<EventBody, { type: "door.answered" }>["body"]): string {
    if (body.question === "people") {
      if (body.unwell) return t("door.unwell");
      return body.alarm ? t("door.alarm") : `CO ${body.coPpm ?? 0} ppm`;
    }
    if (body.question === "smell") return body.smell ? t("door.yes") : `${body.lelPct ?? 0} % LEL`;
    if (body.question === "way-in") return t(body.safe ? "door.yes" : "door.no");
    return body.found.length === 0
      ? t("look.atUnitRight")
      : body.found.map((find) => t(`trade:door.finds.${find}`)).join(", ");
  }

  return (step) => (step.event ? words(step.event) : { title: t("review.unknownStep"), value: step.type });
}
