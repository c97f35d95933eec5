import { resetPassword } from "@emberladder/contract";
import { useState } from "react";
import { useTranslation } from "react-i18next";
import { useParams } from "react-router-dom";
import { Form } from "#components/forms/form.tsx";
import { PasswordField } from "#components/forms/password-field.tsx";
import { ActLink } from "#components/ui/act.tsx";
import { callApi } from "#lib/api-client.ts";
import { paths } from "#lib/paths.ts";
import { SignInFrame } from "./sign-in-frame.tsx";

const schema = resetPassword.body.omit({ token: true });

/** Chooses a new password by the link of a mail. */
export function ResetScreen() {
  const { t } = useTranslation();
  const { token = "" } = useParams();
  const [isDone, setDone] = useState(false);
  if (isDone) {
    return (
      <SignInFrame title={t("desk:reset.doneTitle")} line={t("desk:reset.doneLine")}>
        <ActLink kind="solid" to={paths.signIn}>
          {t("desk:signIn.title")}
        </ActLink>
      </SignInFrame>
    );
  }
  return (
    <SignInFrame title={t("desk:reset.title")} line={t("desk:reset.line")}>
      <Form
        schema={schema}
        defaults={{ password: "" }}
        submitLabel={t("desk:reset.submit")}
        onSubmit={async ({ password }) => {
          await callApi(resetPassword, { body: { token, password } });
          setDone(true);
        }}
        aside={
          <ActLink kind="words" to={paths.forgot}>
            {t("desk:reset.newLink")}
          </ActLink>
        }
      >
        <PasswordField
          name="password"
          label={t("desk:password.new")}
          hint={t("desk:password.hint")}
          autoComplete="new-password"
        />
      </Form>
    </SignInFrame>
  );
}
