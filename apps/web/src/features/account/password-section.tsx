import { changePassword } from "@emberladder/contract";
import { useState } from "react";
import { useTranslation } from "react-i18next";
import { Form } from "#components/forms/form.tsx";
import { PasswordField } from "#components/forms/password-field.tsx";
import { Section } from "#components/ui/page-head.tsx";
import { StatusNote } from "#components/ui/status-note.tsx";
import { callApi } from "#lib/api-client.ts";
import { useMe, useSession } from "#lib/session.tsx";

/** Changes the password; every other session ends. */
export function PasswordSection() {
  const { t } = useTranslation();
  const { person } = useMe();
  const { set } = useSession();
  const [changes, setChanges] = useState(0);
  return (
    <Section title={t("desk:password.title")} note={t("desk:password.note")}>
      <div className="flex max-w-110 flex-col gap-4">
        <StatusNote words={changes > 0 ? t("desk:password.changed") : null} />
        <Form
          // A new form after each change: no password stays on the screen.
          key={changes}
          schema={changePassword.body}
          defaults={{ current: "", next: "" }}
          submitLabel={t("desk:password.change")}
          onSubmit={async (body) => {
            set(await callApi(changePassword, { body }));
            setChanges(changes + 1);
          }}
        >
          {/* Password managers ask which account a new password is for. */}
          <input type="text" name="username" autoComplete="username" value={person.email} readOnly hidden />
          <PasswordField name="current" label={t("desk:password.current")} autoComplete="current-password" />
          <PasswordField
            name="next"
            label={t("desk:password.new")}
            hint={t("desk:password.hint")}
            autoComplete="new-password"
          />
        </Form>
      </div>
    </Section>
  );
}
