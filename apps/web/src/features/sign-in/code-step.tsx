import { recoveryCodeField, signOut, twoStepCodeField, verifyTwoStep } from "@emberladder/contract";
import type { BodyOf, Me } from "@emberladder/contract";
import { useQueryClient } from "@tanstack/react-query";
import { useState } from "react";
import { useTranslation } from "react-i18next";
import { z } from "zod";
import { Form } from "#components/forms/form.tsx";
import { TextField } from "#components/forms/text-field.tsx";
import { ActButton } from "#components/ui/act.tsx";
import { callApi } from "#lib/api-client.ts";
import { enterSession, leaveSession } from "#lib/enter-session.ts";

const codeSchema = z.strictObject({ code: twoStepCodeField });
const recoverySchema = z.strictObject({ recoveryCode: recoveryCodeField });

/**
 * The code of the authenticator, or a recovery code where it is lost. `onVerified` takes the session over;
 * without it a new session begins.
 */
export function CodeStep({ onVerified }: { onVerified?: (me: Me) => void }) {
  const { t } = useTranslation();
  const client = useQueryClient();
  const [usesRecovery, setUsesRecovery] = useState(false);
  const verify = async (body: BodyOf<typeof verifyTwoStep>) => {
    const me = await callApi(verifyTwoStep, { body });
    if (onVerified) onVerified(me);
    else enterSession(client, me);
  };
  return (
    <>
      {usesRecovery ? (
        <Form
          key="recovery"
          schema={recoverySchema}
          defaults={{ recoveryCode: "" }}
          submitLabel={t("desk:signIn.submitRecovery")}
          isForSignIn
          onSubmit={verify}
        >
          <TextField
            name="recoveryCode"
            label={t("desk:signIn.recoveryCode")}
            hint={t("desk:signIn.recoveryHint")}
          />
        </Form>
      ) : (
        <Form
          key="code"
          schema={codeSchema}
          defaults={{ code: "" }}
          submitLabel={t("desk:signIn.submitCode")}
          isForSignIn
          onSubmit={verify}
        >
          <TextField
            name="code"
            label={t("desk:signIn.code")}
            inputMode="numeric"
            autoComplete="one-time-code"
          />
        </Form>
      )}
      <div className="flex flex-wrap gap-x-6">
        <ActButton kind="words" onClick={() => setUsesRecovery(!usesRecovery)}>
          {usesRecovery ? t("desk:signIn.useCode") : t("desk:signIn.useRecovery")}
        </ActButton>
        <ActButton
          kind="words"
          onClick={() =>
            void callApi(signOut)
              .catch(() => undefined)
              .finally(() => leaveSession(client))
          }
        >
          {t("desk:signIn.somebodyElse")}
        </ActButton>
      </div>
    </>
  );
}
