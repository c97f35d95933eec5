import { command } from "@emberladder/diagnosis";
import type { ProofItem } from "@emberladder/diagnosis";
import { getClosingCheck } from "@emberladder/furnace";
import { useState } from "react";
import { useTranslation } from "react-i18next";
import { PlainButton } from "#components/ui/button.tsx";
import { ReadingField } from "#components/ui/reading-field.tsx";
import { parseReading } from "#lib/parse-reading.ts";
import { natureOf, useReadingUnits } from "#lib/use-reading-units.ts";
import { useDiagnosis } from "../diagnosis-context.tsx";

/** Fields that go with a number where this unit or this reading needs them. */
const ALWAYS_ASKED: Record<string, string[]> = {
  "close-inlet-run": ["dropInwc"],
  "close-room-co": ["sourceFound", "occupantTold"],
};

/** A closing check that is a number: typed here in the units shown, with what has to go with it, recorded by a button that names it. */
export function ProofNumber({ item, stays }: { item: ProofItem; stays: boolean }) {
  const { t } = useTranslation();
  const { profile, record, recordAndGoOn } = useDiagnosis();
  const keep = stays ? record : recordAndGoOn;
  const definition = getClosingCheck(item.id);
  const twoStage = profile.codes.staging === "2S";
  const wanted = new Set([
    ...(ALWAYS_ASKED[item.id] ?? []),
    ...item.verdict.missing,
    ...(twoStage && item.id === "close-manifold" ? ["lowInwc"] : []),
    ...(item.id === "close-draft" && profile.plate.highSwitchMakeInwc !== undefined
      ? ["highSuctionInwc"]
      : []),
    ...(item.id === "close-draft" && profile.plate.switchMakeInwc === undefined ? ["makeInwc"] : []),
    ...(item.id === "close-co" ? ["causeSought"] : []),
  ]);
  const extras = definition.also.filter((field) => wanted.has(field.id));
  const [text, setText] = useState("");
  const [also, setAlso] = useState<Record<string, string | boolean>>({});
  const [error, setError] = useState<string | null>(null);
  const readings = useReadingUnits();
  const nature = natureOf(item.id);
  const parsed = parseReading(text);
  const value =
    parsed.ok && parsed.value !== "OL" ? readings.store(parsed.value, definition.unit, nature) : undefined;
  const unit = readings.signOf(definition.unit, nature);

  const handleRecord = () => {
    if (value === undefined) {
      setError(t("reading.enterNumber"));
      return;
    }
    const extra: Record<string, number | boolean> = {};
    for (const field of extras) {
      const given = also[field.id];
      if (field.unit === "yes-no") {
        if (given !== undefined) extra[field.id] = given === true;
        continue;
      }
      const number = parseReading(typeof given === "string" ? given : "");
      if (number.ok && number.value !== "OL") extra[field.id] = readings.store(number.value, field.unit);
    }
    setError(null);
    void keep([
      command("proof.recorded", {
        closing: item.id,
        value,
        unit: definition.unit,
        ...(Object.keys(extra).length > 0 ? { also: extra } : {}),
      }),
    ]);
  };

  return (
    <div className="flex flex-col gap-2">
      {error && (
        <p role="alert" className="border-l-6 border-ink bg-surface p-3 text-field font-semibold">
          {error}
        </p>
      )}
      <ReadingField
        compact
        label={t(`trade:closing.${item.id}.title`)}
        unit={unit}
        text={text}
        onChange={setText}
        onSubmit={handleRecord}
      />
      {extras.map((field) =>
        field.unit === "yes-no" ? (
          <label key={field.id} className="flex min-h-12 items-center gap-3 text-field">
            <input
              type="checkbox"
              className="size-6 accent-ink"
              checked={also[field.id] === true}
              onChange={(event) => setAlso({ ...also, [field.id]: event.target.checked })}
            />
            {t(`proof.also.${field.id}`)}
          </label>
        ) : (
          <ReadingField
            key={field.id}
            compact
            label={t(`proof.also.${field.id}`)}
            unit={readings.signOf(field.unit)}
            text={typeof also[field.id] === "string" ? String(also[field.id]) : ""}
            onChange={(next) => setAlso({ ...also, [field.id]: next })}
          />
        ),
      )}
      <PlainButton onClick={handleRecord}>
        {value === undefined ? t("reading.recordEmpty") : t("reading.record", { value: text.trim(), unit })}
      </PlainButton>
    </div>
  );
}
