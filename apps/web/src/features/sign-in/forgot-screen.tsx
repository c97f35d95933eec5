import { requestReset } from "@emberladder/contract";
import { useState } from "react";
import { useTranslation } from "react-i18next";
import { Form } from "#components/forms/form.tsx";
import { TextField } from "#components/forms/text-field.tsx";
import { ActLink } from "#components/ui/act.tsx";
import { callApi } from "#lib/api-client.ts";
import { paths } from "#lib/paths.ts";
import { SignInFrame } from "./sign-in-frame.tsx";

/** Asks for a link to choose a new password. The answer is the same whether the e-mail is known or not. */
export function ForgotScreen() {
  const { t } = useTranslation();
  const [isSent, setSent] = useState(false);
  if (isSent) {
    return (
      <SignInFrame title={t("desk:forgot.sentTitle")} line={t("desk:forgot.sentLine")}>
        <ActLink to={paths.signIn}>{t("desk:forgot.toSignIn")}</ActLink>
      </SignInFrame>
    );
  }
  return (
    <SignInFrame title={t("desk:forgot.title")} line={t("desk:forgot.line")}>
      <Form
        schema={requestReset.body}
        defaults={{ email: "" }}
        submitLabel={t("desk:forgot.submit")}
        onSubmit={async (body) => {
          await callApi(requestReset, { body });
          setSent(true);
        }}
        aside={
          <ActLink kind="words" to={paths.signIn}>
            {t("desk:forgot.toSignIn")}
          </ActLink>
        }
      >
        <TextField
          name="email"
          type="email"
          label={t("desk:signIn.email")}
          autoComplete="username"
          inputMode="email"
        />
      </Form>
    </SignInFrame>
  );
}
