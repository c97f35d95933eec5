import { changeForCheck, command, openingsToAdd } from "@emberladder/diagnosis";
import type { Command } from "@emberladder/diagnosis";
import { getCheck } from "@emberladder/furnace";
import { useTranslation } from "react-i18next";
import { AnswerButton } from "#components/ui/answer-button.tsx";
import { useDiagnosis } from "../diagnosis-context.tsx";
import type { CheckTask } from "./check-task.ts";

/**
 * Starts a check: one button a way of taking it, whose label says what changes on the unit and what comes off.
 * The put-back list holds it from this tap on.
 */
export function StartCheck({
  task,
  onStart,
}: {
  task: CheckTask;
  onStart: (way: string | undefined, before: readonly Command[]) => void;
}) {
  const { t } = useTranslation();
  const { state } = useDiagnosis();
  const { check, node } = task;
  const ways = node?.way ? [node.way] : (getCheck(check).ways ?? []).map((way) => way.id);
  const offered: (string | undefined)[] = ways.length > 0 ? ways : [undefined];
  return (
    <div className="flex flex-col gap-2">
      {offered.map((way) => {
        const change = changeForCheck(state.unit, check, way);
        const opens = openingsToAdd(state, check, way);
        const acts = [
          change.power === "off"
            ? t("check.start.powerOff")
            : change.power === "on"
              ? t("check.start.powerOn")
              : "",
          change.calling === true
            ? t("check.start.call")
            : change.calling === false && change.power !== "off"
              ? t("check.start.endCall")
              : "",
          ...opens.map(
            (opening) =>
              `${t(`trade:putBack.what.${opening.what}`)} ${t(`trade:putBack.state.${opening.kind}`)}.`,
          ),
        ].filter(Boolean);
        return (
          <AnswerButton
            key={way ?? "only"}
            symbol={<StartMark />}
            onChoose={() =>
              onStart(way, Object.keys(change).length > 0 ? [command("unit-state.set", change)] : [])
            }
          >
            <span className="block">{way ? t(`trade:ways.${way}`) : t("check.start.now")}</span>
            {acts.length > 0 && <span className="block font-normal text-quiet">{acts.join(" ")}</span>}
          </AnswerButton>
        );
      })}
    </div>
  );
}

function StartMark() {
  return (
    <svg viewBox="0 0 24 24" width={24} height={24} aria-hidden="true">
      <path d="M7 4l12 8-12 8z" fill="currentColor" />
    </svg>
  );
}
