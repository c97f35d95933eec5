import { assignCall, idField, listPeople } from "@emberladder/contract";
import type { CallDetail } from "@emberladder/contract";
import { useQuery, useQueryClient } from "@tanstack/react-query";
import { useState } from "react";
import { useTranslation } from "react-i18next";
import { z } from "zod";
import { Form } from "#components/forms/form.tsx";
import { SelectField } from "#components/forms/select-field.tsx";
import { StatusNote } from "#components/ui/status-note.tsx";
import { callApi } from "#lib/api-client.ts";

const schema = z.strictObject({ personId: idField.nullable() });

/** Gives a call to somebody, who is told by e-mail, or takes it back to nobody. */
export function AssignCall({ call }: { call: CallDetail }) {
  const { t } = useTranslation();
  const client = useQueryClient();
  const [done, setDone] = useState<string | null>(null);
  const people = useQuery({ queryKey: ["people"], queryFn: ({ signal }) => callApi(listPeople, { signal }) });
  if (!people.data) return null;
  const choices = people.data.items
    .filter((person) => person.state === "active" || person.id === call.assignedTo?.id)
    .map((person) => ({ value: person.id, label: `${person.name}, ${t(`desk:roles.${person.role}`)}` }));
  return (
    <>
      <Form
        // A newer version of the call is a newer form: what was read is what is changed.
        key={call.version}
        schema={schema}
        defaults={{ personId: call.assignedTo?.id ?? "" }}
        submitLabel={t("desk:call.assign")}
        submitKind="plain"
        onSubmit={async ({ personId }) => {
          await callApi(assignCall, {
            params: { callId: call.id },
            body: { personId, version: call.version },
          });
          await client.invalidateQueries({ queryKey: ["kept"] });
          const name = people.data.items.find((person) => person.id === personId)?.name;
          setDone(name ? t("desk:call.assigned", { name }) : t("desk:call.unassigned"));
        }}
      >
        <SelectField
          name="personId"
          label={t("desk:call.who")}
          choices={choices}
          emptyLabel={t("desk:calls.nobody")}
          empty="null"
        />
      </Form>
      <StatusNote words={done} />
    </>
  );
}
