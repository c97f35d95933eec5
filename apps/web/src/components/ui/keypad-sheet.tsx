import { useEffect, useId, useRef, useState } from "react";
import { useTranslation } from "react-i18next";
import { parseReading } from "#lib/parse-reading.ts";
import { LinkButton, PrimaryButton } from "./button.tsx";
import { ReadingField } from "./reading-field.tsx";

/** A number asked for on a page of its own: what, where to take it, the field, one act that names it. */
export function KeypadSheet({
  title,
  hint,
  label,
  unit,
  limits,
  onSave,
  onCancel,
}: {
  title: string;
  hint: string;
  label: string;
  unit: string;
  limits: { least: number; most: number };
  onSave: (value: number) => void;
  onCancel: () => void;
}) {
  const { t } = useTranslation();
  const [text, setText] = useState("");
  const [error, setError] = useState<string | null>(null);
  const errorId = useId();
  const field = useRef<HTMLInputElement>(null);
  useEffect(() => field.current?.focus(), []);
  const parsed = parseReading(text);

  const save = () => {
    if (!parsed.ok || parsed.value === "OL") {
      setError(t("reading.enterNumber"));
      field.current?.focus();
      return;
    }
    if (parsed.value < limits.least || parsed.value > limits.most) {
      setError(t("reading.outOfLimits", { least: limits.least, most: limits.most, unit }));
      field.current?.focus();
      return;
    }
    onSave(parsed.value);
  };

  return (
    <main className="mx-auto flex min-h-dvh max-w-[560px] flex-col gap-4 p-4">
      <h1 className="text-question">{title}</h1>
      <p className="text-field text-quiet">{hint}</p>
      {error && (
        <p
          id={errorId}
          role="alert"
          className="border-l-6 border-ink bg-surface p-3 text-field font-semibold"
        >
          {error}
        </p>
      )}
      <ReadingField
        inputRef={field}
        label={label}
        unit={unit}
        text={text}
        onChange={setText}
        onSubmit={save}
        invalid={error !== null}
        describedBy={error ? errorId : undefined}
      />
      <PrimaryButton onClick={save}>
        {parsed.ok && parsed.value !== "OL"
          ? t("reading.record", { value: text.trim(), unit })
          : t("reading.recordEmpty")}
      </PrimaryButton>
      <LinkButton onClick={onCancel}>{t("reading.cancel")}</LinkButton>
    </main>
  );
}
