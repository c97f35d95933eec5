import { invitePerson, ROLES } from "@emberladder/contract";
import { useQueryClient } from "@tanstack/react-query";
import { useState } from "react";
import { useTranslation } from "react-i18next";
import { Form } from "#components/forms/form.tsx";
import { SelectField } from "#components/forms/select-field.tsx";
import { TextField } from "#components/forms/text-field.tsx";
import { ActButton } from "#components/ui/act.tsx";
import { StatusNote } from "#components/ui/status-note.tsx";
import { callApi } from "#lib/api-client.ts";

/** Invites somebody by e-mail; the role says what they may do. */
export function InviteForm({ onClose }: { onClose: () => void }) {
  const { t } = useTranslation();
  const client = useQueryClient();
  const [invited, setInvited] = useState<{ email: string; count: number }>({ email: "", count: 0 });
  return (
    <div className="flex flex-col gap-4 px-4 py-5 desk:px-6">
      <h2 className="text-[1.1875rem] font-semibold">{t("desk:team.invite")}</h2>
      <StatusNote words={invited.email && t("desk:team.invited", { email: invited.email })} />
      <Form
        key={invited.count}
        schema={invitePerson.body}
        defaults={{ name: "", email: "", role: "technician" }}
        submitLabel={t("desk:team.sendInvite")}
        onSubmit={async (body) => {
          await callApi(invitePerson, { body });
          await client.invalidateQueries({ queryKey: ["people"] });
          setInvited({ email: body.email, count: invited.count + 1 });
        }}
        aside={
          <ActButton kind="words" onClick={onClose}>
            {t("desk:form.leave")}
          </ActButton>
        }
      >
        <TextField name="name" label={t("desk:team.name")} />
        <TextField name="email" type="email" label={t("desk:signIn.email")} inputMode="email" />
        <SelectField
          name="role"
          label={t("desk:team.role")}
          hint={t("desk:team.roleHint")}
          choices={ROLES.map((role) => ({ value: role, label: t(`desk:roles.${role}`) }))}
        />
      </Form>
    </div>
  );
}
