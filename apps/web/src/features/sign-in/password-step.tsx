import { useQueryClient } from "@tanstack/react-query";
import { useTranslation } from "react-i18next";
import { Link } from "react-router-dom";
import { Form } from "#components/forms/form.tsx";
import { PasswordField } from "#components/forms/password-field.tsx";
import { TextField } from "#components/forms/text-field.tsx";
import { callApi } from "#lib/api-client.ts";
import { describeDevice, lastDeviceId } from "#lib/device-name.ts";
import { enterSession } from "#lib/enter-session.ts";
import { paths } from "#lib/paths.ts";
import { signIn } from "#lib/shell-routes.ts";

// The schema is fetched while the person types.
const loadSchema = () => import("./sign-in-schema.ts").then((module) => module.signInSchema);

/** E-mail and password. The device offers the id it had before, so that its record goes on counting. */
export function PasswordStep() {
  const { t } = useTranslation();
  const client = useQueryClient();
  return (
    <>
      <Form
        schema={loadSchema}
        defaults={{ email: "", password: "" }}
        submitLabel={t("desk:signIn.submit")}
        isForSignIn
        onSubmit={async (values) => {
          const device = { id: lastDeviceId(), name: describeDevice() };
          enterSession(client, await callApi(signIn, { body: { ...values, device } }));
        }}
      >
        <TextField
          name="email"
          type="email"
          label={t("desk:signIn.email")}
          autoComplete="username"
          inputMode="email"
        />
        <PasswordField name="password" label={t("desk:signIn.password")} autoComplete="current-password" />
      </Form>
      <Link
        to={paths.forgot}
        className="inline-flex min-h-12 items-center self-start text-field font-semibold desk:text-desk"
      >
        {t("desk:signIn.forgotten")}
      </Link>
      <p className="border-t-2 border-ink pt-3 text-field desk:text-desk">
        <strong className="font-semibold">{t("desk:signIn.noSignal")}</strong> {t("desk:signIn.noSignalNote")}
      </p>
    </>
  );
}
