import { lastStageOf, ladderOf } from "@emberladder/diagnosis";
import { useTranslation } from "react-i18next";
import { useDiagnosis } from "../diagnosis-context.tsx";

/** The unit and its place in one line, for the header. */
export function useUnitLine(): string {
  const { call } = useDiagnosis();
  return call ? `${call.unit.name}, ${call.site.address}` : "";
}

/** How far the unit climbed, in words, for the header of a check; the unit where nothing was watched. */
export function useClimbLine(): string {
  const { t } = useTranslation();
  const { state } = useDiagnosis();
  const unitLine = useUnitLine();
  const rungs = ladderOf(state);
  const stopped = rungs.find((rung) => rung.state === "stopped");
  if (!stopped || lastStageOf(state) === "any") return unitLine;
  return t("field.stoppedAt", { number: stopped.number, count: rungs.length });
}
