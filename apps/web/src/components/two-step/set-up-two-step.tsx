import { confirmTwoStep, setUpTwoStep, twoStepCodeField } from "@emberladder/contract";
import type { AnswerOf } from "@emberladder/contract";
import { useEffect, useRef, useState } from "react";
import { useTranslation } from "react-i18next";
import { z } from "zod";
import { Form } from "#components/forms/form.tsx";
import { TextField } from "#components/forms/text-field.tsx";
import { ProblemNote } from "#components/ui/list-states.tsx";
import { callApi } from "#lib/api-client.ts";
import { QrCode } from "./qr-code.tsx";

const schema = z.strictObject({ code: twoStepCodeField });

/** A new secret as a picture and in text, confirmed by the first code it makes. */
export function SetUpTwoStep({
  onConfirmed,
}: {
  onConfirmed: (answer: AnswerOf<typeof confirmTwoStep>) => void;
}) {
  const { t } = useTranslation();
  const [made, setMade] = useState<AnswerOf<typeof setUpTwoStep> | null>(null);
  const [problem, setProblem] = useState<unknown>(null);
  const asked = useRef(false);
  const ask = () => {
    setProblem(null);
    callApi(setUpTwoStep, { body: {} }).then(setMade, setProblem);
  };
  useEffect(() => {
    // Each request makes a new secret, so a second one would void the picture already scanned.
    if (asked.current) return;
    asked.current = true;
    ask();
  }, []);
  if (problem) return <ProblemNote problem={problem} onRetry={ask} />;
  if (!made) return null;
  return (
    <div className="flex flex-col gap-5">
      <p className="text-field desk:text-desk">{t("desk:twoStep.scan")}</p>
      <QrCode text={made.uri} label={t("desk:twoStep.picture")} />
      <div>
        <p className="text-field text-quiet desk:text-desk">{t("desk:twoStep.typeSecret")}</p>
        <p className="numeric text-field font-semibold break-all select-all">{groupsOfFour(made.secret)}</p>
      </div>
      <Form
        schema={schema}
        defaults={{ code: "" }}
        submitLabel={t("desk:twoStep.turnOn")}
        onSubmit={async (body) => onConfirmed(await callApi(confirmTwoStep, { body }))}
      >
        <TextField
          name="code"
          label={t("desk:twoStep.firstCode")}
          inputMode="numeric"
          autoComplete="one-time-code"
        />
      </Form>
    </div>
  );
}

const groupsOfFour = (text: string) => text.replaceAll(/(.{4})(?=.)/g, "$1 ");
