import { powerOf, stageForCheck } from "@emberladder/diagnosis";
import { classifyReading, findingsOf, readContact } from "@emberladder/furnace";
import type { ContactReading } from "@emberladder/furnace";
import { useEffect, useRef, useState } from "react";
import { useTranslation } from "react-i18next";
import { PrimaryButton } from "#components/ui/button.tsx";
import { ReadingField } from "#components/ui/reading-field.tsx";
import { parseReading } from "#lib/parse-reading.ts";
import { useDiagnosis } from "../diagnosis-context.tsx";
import { answerCommand } from "./answer-command.ts";
import type { CheckTask, Frame } from "./check-task.ts";
import { ContactDrawing } from "./contact-drawing.tsx";
import { FindingPicker } from "./finding-picker.tsx";

const VERDICTS: ContactReading[] = ["closed", "open", "no-path", "none-fits"];

/**
 * Hop-scotch: black clipped on C, red into and out of the device. Two volts are typed, and what they say of the
 * contact is derived, never tapped. Under 22 V in nothing is known of the device; between open and closed a
 * low-impedance reading is asked for first.
 */
export function InOutAnswer({ task, frame }: { task: CheckTask; frame: Frame }) {
  const { t } = useTranslation();
  const { state, profile, recordAndGoOn } = useDiagnosis();
  const { check, way, node, given } = task;
  const [inText, setIn] = useState(given?.inV === undefined ? "" : String(given.inV));
  const [outText, setOut] = useState(given?.outV === undefined ? "" : String(given.outV));
  const [finding, setFinding] = useState<string | undefined>(given?.finding);
  const [error, setError] = useState<string | null>(null);
  const [readAgain, setReadAgain] = useState(false);
  const first = useRef<HTMLInputElement>(null);
  useEffect(() => first.current?.focus(), []);
  const [inV, outV] = [inText, outText].map((text) => {
    const parsed = parseReading(text);
    return parsed.ok && parsed.value !== "OL" ? parsed.value : undefined;
  });
  const contact = inV === undefined || outV === undefined ? undefined : readContact(inV, outV);
  const classified =
    inV === undefined || outV === undefined
      ? undefined
      : classifyReading(
          {
            check,
            inV,
            outV,
            finding,
            stage: stageForCheck(check, node?.stage),
            power: powerOf(state.unit),
            way,
          },
          profile,
        );
  const fitting = findingsOf(check).filter(
    (candidate) => classified?.outcome && candidate.classes.includes(classified.outcome),
  );

  const record = () => {
    if (inV === undefined || outV === undefined) {
      setError(t("reading.enterBoth"));
      first.current?.focus();
      return;
    }
    if (contact === "none-fits" && !readAgain) {
      setReadAgain(true);
      setOut("");
      setError(t("inOut.lowZ", { value: outText.trim() }));
      return;
    }
    void recordAndGoOn([
      answerCommand({
        state,
        profile,
        task,
        answer: {
          outcome: classified?.outcome,
          finding: classified?.finding ?? finding,
          inV,
          outV,
          value: Math.round((inV - outV) * 100) / 100,
          unit: "V",
          bandUsed: classified?.band?.text,
        },
      }),
    ]);
  };

  return frame(
    <>
      {error && (
        <p role="alert" className="border-l-6 border-ink bg-surface p-3 text-field font-semibold">
          {error}
        </p>
      )}
      <ContactDrawing contact={contact} />
      <div className="flex gap-3">
        <ReadingField
          compact
          inputRef={first}
          label={t("inOut.in")}
          unit="V"
          text={inText}
          onChange={setIn}
          onSubmit={record}
        />
        <ReadingField
          compact
          label={t("inOut.out")}
          unit="V"
          text={outText}
          onChange={setOut}
          onSubmit={record}
        />
      </div>
      <div role="status">
        <ul className="flex flex-col gap-1">
          {VERDICTS.map((verdict) => (
            <li
              key={verdict}
              className={`px-3 py-1.5 text-field ${verdict === contact ? "rounded bg-stopped font-semibold text-on-stopped" : "text-quiet short:hidden"}`}
            >
              {t(`inOut.${verdict}`)}
            </li>
          ))}
        </ul>
      </div>
      {classified?.outcome && classified.outcome !== "good" && (
        <FindingPicker check={check} findings={fitting} chosen={finding} onChoose={setFinding} />
      )}
    </>,
    <PrimaryButton onClick={record}>
      {contact === "none-fits" && !readAgain
        ? t("inOut.setLowZ")
        : contact
          ? t("inOut.record", { what: t(`inOut.short.${contact}`) })
          : t("reading.recordEmpty")}
    </PrimaryButton>,
  );
}
