import {
  disablePerson,
  enablePerson,
  endPersonSessions,
  personSchema,
  removePersonTwoStep,
  resendInvite,
  ROLES,
  updatePerson,
} from "@emberladder/contract";
import type { Person } from "@emberladder/contract";
import { useQueryClient } from "@tanstack/react-query";
import { useState } from "react";
import { useTranslation } from "react-i18next";
import { Form } from "#components/forms/form.tsx";
import { SelectField } from "#components/forms/select-field.tsx";
import { TextField } from "#components/forms/text-field.tsx";
import { ActProblem } from "#components/ui/act-problem.tsx";
import { ActButton } from "#components/ui/act.tsx";
import { ConfirmDialog } from "#components/ui/confirm-dialog.tsx";
import { StatusNote } from "#components/ui/status-note.tsx";
import { callApi } from "#lib/api-client.ts";
import { useAct } from "#lib/use-act.ts";
import { PersonDevices } from "./person-devices.tsx";

const schema = personSchema.pick({ role: true }).extend({ name: updatePerson.body.shape.name.unwrap() });

type Asked = "disable" | "endSessions" | "removeTwoStep";

/** One person: name and role, the ways in, and their devices. What shuts somebody out is asked twice. */
export function PersonPanel({ person, onClose }: { person: Person; onClose: () => void }) {
  const { t } = useTranslation();
  const client = useQueryClient();
  const act = useAct();
  const [asked, setAsked] = useState<Asked | null>(null);
  const [done, setDone] = useState<string | null>(null);
  const params = { personId: person.id };
  const finish = async (words: string) => {
    await client.invalidateQueries({ queryKey: ["people"] });
    setDone(words);
  };
  const run = (change: () => Promise<unknown>, words: string) =>
    act.run(async () => {
      setDone(null);
      await change();
      await finish(words);
    });
  const acts: Record<Asked, () => void> = {
    disable: () =>
      run(() => callApi(disablePerson, { params }), t("desk:team.did.disable", { name: person.name })),
    endSessions: () =>
      run(
        () => callApi(endPersonSessions, { params }),
        t("desk:team.did.endSessions", { name: person.name }),
      ),
    removeTwoStep: () =>
      run(
        () => callApi(removePersonTwoStep, { params }),
        t("desk:team.did.removeTwoStep", { name: person.name }),
      ),
  };
  return (
    <div className="flex flex-col gap-5 px-4 py-5 desk:px-6">
      <div className="flex items-start justify-between gap-3">
        <div className="min-w-0">
          <h2 className="text-[1.1875rem] font-semibold break-words">{person.name}</h2>
          <p className="text-field break-words text-quiet desk:text-desk">
            {t(`desk:personStates.${person.state}`)}
          </p>
        </div>
        <ActButton kind="words" onClick={onClose}>
          {t("desk:form.close")}
        </ActButton>
      </div>
      <StatusNote words={done} />
      <ActProblem problem={act.problem} />
      <Form
        key={`${person.name} ${person.role}`}
        schema={schema}
        defaults={{ name: person.name, role: person.role }}
        submitLabel={t("desk:form.save")}
        onSubmit={async (body) => {
          await callApi(updatePerson, { params, body });
          await finish(t("desk:team.did.saved", { name: body.name }));
        }}
      >
        <TextField name="name" label={t("desk:team.name")} />
        <SelectField
          name="role"
          label={t("desk:team.role")}
          hint={t("desk:team.roleChangeHint")}
          choices={ROLES.map((role) => ({ value: role, label: t(`desk:roles.${role}`) }))}
        />
      </Form>
      <div className="flex flex-wrap gap-3">
        {person.state === "invited" && (
          <ActButton
            onClick={() =>
              run(() => callApi(resendInvite, { params }), t("desk:team.did.resend", { name: person.name }))
            }
          >
            {t("desk:team.resend")}
          </ActButton>
        )}
        {person.state === "disabled" ? (
          <ActButton
            onClick={() =>
              run(() => callApi(enablePerson, { params }), t("desk:team.did.enable", { name: person.name }))
            }
          >
            {t("desk:team.enable")}
          </ActButton>
        ) : (
          <ActButton onClick={() => setAsked("disable")}>{t("desk:team.disable")}</ActButton>
        )}
        {person.state === "active" && (
          <ActButton onClick={() => setAsked("endSessions")}>{t("desk:team.endSessions")}</ActButton>
        )}
        {person.hasTwoStep && (
          <ActButton onClick={() => setAsked("removeTwoStep")}>{t("desk:team.removeTwoStep")}</ActButton>
        )}
      </div>
      {asked && (
        <ConfirmDialog
          title={t(`desk:team.ask.${asked}`, { name: person.name })}
          confirmLabel={t(`desk:team.${asked}`)}
          onConfirm={acts[asked]}
          onClose={() => setAsked(null)}
        >
          {t(`desk:team.askNote.${asked}`)}
        </ConfirmDialog>
      )}
      <PersonDevices personId={person.id} />
    </div>
  );
}
