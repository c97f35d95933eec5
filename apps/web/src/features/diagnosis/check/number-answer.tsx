import { stageForCheck, powerOf } from "@emberladder/diagnosis";
import {
  classifyReading,
  findingsOf,
  getCheck,
  judgeReading,
  lowerByFinding,
  readingLimits,
  resolveBands,
} from "@emberladder/furnace";
import type { Outcome, ReadingUnit } from "@emberladder/furnace";
import { useEffect, useId, useRef, useState } from "react";
import { useTranslation } from "react-i18next";
import { BandScale } from "#components/ui/band-scale.tsx";
import { PrimaryButton } from "#components/ui/button.tsx";
import { OutcomeMark } from "#components/ui/outcome-mark.tsx";
import { ReadingField } from "#components/ui/reading-field.tsx";
import { parseReading } from "#lib/parse-reading.ts";
import { natureOf, useReadingUnits } from "#lib/use-reading-units.ts";
import { useDiagnosis } from "../diagnosis-context.tsx";
import { answerCommand } from "./answer-command.ts";
import type { CheckTask, Frame } from "./check-task.ts";
import { FindingPicker } from "./finding-picker.tsx";
import { UnitPicker } from "./unit-picker.tsx";

/** A reading: typed in the units shown, placed on its band, told in words, recorded by a button that names it. */
export function NumberAnswer({ task, frame }: { task: CheckTask; frame: Frame }) {
  const { t } = useTranslation();
  const { state, profile, recordAndGoOn } = useDiagnosis();
  const { check, way, node, given } = task;
  const readings = useReadingUnits();
  const nature = natureOf(check);
  const definition = getCheck(check);
  const situation = { stage: stageForCheck(check, node?.stage), power: powerOf(state.unit), way };
  const bands = resolveBands(check, profile, situation);
  const [unit, setUnit] = useState<ReadingUnit>(given?.unit ?? bands[0]?.unit ?? definition.units[0] ?? "V");
  const [text, setText] = useState(
    given?.value === undefined ? "" : readings.figureOf(given.value, given.unit ?? unit, nature),
  );
  const [finding, setFinding] = useState<string | undefined>(given?.finding);
  const [error, setError] = useState<string | null>(null);
  const [unlikely, setUnlikely] = useState(false);
  const field = useRef<HTMLInputElement>(null);
  const errorId = useId();
  useEffect(() => field.current?.focus(), []);

  const parsed = parseReading(text);
  const band = bands.find((candidate) => candidate.unit === unit);
  // From here on in the unit that is recorded; only words and the scale's figures are in the one shown.
  const value = parsed.ok
    ? readings.store(
        parsed.value,
        unit,
        nature,
        band?.segments.map((segment) => segment.from),
      )
    : undefined;
  const classified =
    value === undefined ? undefined : classifyReading({ check, value, unit, finding, ...situation }, profile);
  const outcome = classified?.outcome;
  const zone = (name: Outcome) => t([`trade:checks.${check}.zones.${name}`, `check.zones.${name}`]);
  const unitWord = readings.signOf(unit, nature);
  const fitting = findingsOf(check).filter(
    (candidate) =>
      !outcome ||
      candidate.classes.includes(outcome) ||
      lowerByFinding(outcome, check, candidate.id) === outcome,
  );
  const onSight = definition.passesOnSight === true;

  const record = () => {
    if (value === undefined) {
      if (onSight && finding) {
        const seen = lowerByFinding(undefined, check, finding) ?? "fail";
        void recordAndGoOn([answerCommand({ state, profile, task, answer: { outcome: seen, finding } })]);
        return;
      }
      setError(t("reading.enterNumber"));
      field.current?.focus();
      return;
    }
    const judged = judgeReading(check, unit, value);
    if (judged === "impossible") {
      const { least, most } = readingLimits(check, unit);
      setError(
        t("reading.outOfLimits", {
          least: readings.figureOf(least, unit, nature),
          most: readings.figureOf(most, unit, nature),
          unit: unitWord,
        }),
      );
      field.current?.focus();
      return;
    }
    if (judged === "unlikely" && !unlikely) {
      setUnlikely(true);
      setError(t("reading.unlikely", { value: text.trim(), unit: unitWord }));
      return;
    }
    void recordAndGoOn([
      answerCommand({
        state,
        profile,
        task,
        answer: {
          outcome,
          finding,
          value,
          unit,
          bandUsed: band?.text,
          ...(judged === "unlikely" ? { confirmedUnlikely: true } : {}),
        },
      }),
    ]);
  };

  return frame(
    <>
      {error && (
        <p
          id={errorId}
          role="alert"
          className="border-l-6 border-ink bg-surface p-3 text-field font-semibold"
        >
          {error}
        </p>
      )}
      {definition.units.length > 1 && bands.length !== 1 && (
        <UnitPicker
          units={definition.units}
          chosen={unit}
          onChoose={setUnit}
          signOf={(one) => readings.signOf(one, nature)}
        />
      )}
      <ReadingField
        inputRef={field}
        label={t([`trade:checks.${check}.reading`, "reading.label"])}
        unit={unitWord}
        text={text}
        allowNegative={readingLimits(check, unit).least < 0}
        onChange={(next) => {
          setText(next);
          setError(null);
          setUnlikely(false);
        }}
        onSubmit={record}
        invalid={error !== null}
        describedBy={error ? errorId : undefined}
      />
      {band && band.quantity !== "across" && (
        <BandScale
          segments={band.segments}
          value={value === "OL" ? Infinity : value}
          words={{ good: zone("good"), marginal: zone("marginal"), fail: zone("fail") }}
          format={(edge) => readings.figureOf(edge, unit, nature)}
        />
      )}
      {outcome && (
        <p className="flex items-center gap-3 text-field font-semibold" role="status">
          <OutcomeMark outcome={outcome} />
          {zone(outcome)}
        </p>
      )}
      {!band && value !== undefined && <p className="text-field text-quiet">{t("check.noBand")}</p>}
      {(onSight ||
        (outcome && outcome !== "good") ||
        (value !== undefined &&
          fitting.some((candidate) =>
            node?.branches.some((branch) => branch.on === "finding" && branch.finding === candidate.id),
          ))) && (
        <FindingPicker
          check={check}
          findings={onSight && value === undefined ? findingsOf(check) : fitting}
          chosen={finding}
          onChoose={setFinding}
        />
      )}
    </>,
    <PrimaryButton onClick={record}>
      {value !== undefined
        ? t(unlikely ? "reading.recordUnlikely" : "reading.record", { value: text.trim(), unit: unitWord })
        : finding
          ? t("check.recordFinding", { finding: t(`trade:findings.${check}.${finding}`) })
          : t("reading.recordEmpty")}
    </PrimaryButton>,
  );
}
