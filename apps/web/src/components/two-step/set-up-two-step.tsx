import { confirmTwoStep, setUpTwoStep, twoStepCodeField } from "@emberladder/contract";
import type { AnswerOf } from "@emberladder/contract";
import { useQuery } from "@tanstack/react-query";
import { useTranslation } from "react-i18next";
import { z } from "zod";
import { Form } from "#components/forms/form.tsx";
import { TextField } from "#components/forms/text-field.tsx";
import { LoadingNote, ProblemNote } from "#components/ui/list-states.tsx";
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
  // Each request makes a new secret, so it is asked for once and never again behind a picture already scanned.
  const made = useQuery({
    queryKey: ["two-step-set-up"],
    queryFn: () => callApi(setUpTwoStep, { body: {} }),
    staleTime: Infinity,
    gcTime: 0,
    retry: false,
    refetchOnWindowFocus: false,
    refetchOnReconnect: false,
  });
  if (made.isError) return <ProblemNote problem={made.error} onRetry={() => void made.refetch()} />;
  if (made.isPending) return <LoadingNote />;
  return (
    <div className="flex flex-col gap-5">
      <p className="text-field desk:text-desk">{t("desk:twoStep.scan")}</p>
      <QrCode text={made.data.uri} label={t("desk:twoStep.picture")} />
      <div>
        <p className="text-field text-quiet desk:text-desk">{t("desk:twoStep.typeSecret")}</p>
        <p className="numeric text-field font-semibold select-all">{groupsOfFour(made.data.secret)}</p>
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
