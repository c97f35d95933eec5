import { createCall, dateField, idField, listPeople, readUnit } from "@emberladder/contract";
import { useQuery, useQueryClient } from "@tanstack/react-query";
import { useState } from "react";
import { useTranslation } from "react-i18next";
import { z } from "zod";
import { Form } from "#components/forms/form.tsx";
import { SelectField } from "#components/forms/select-field.tsx";
import { AreaField, TextField } from "#components/forms/text-field.tsx";
import { callApi } from "#lib/api-client.ts";
import { useMe, useSession } from "#lib/session.tsx";
import { dayOf, formatTime, momentAtSite, zoneName } from "#lib/site-time.ts";

const schema = z.strictObject({
  complaint: createCall.body.shape.complaint,
  day: dateField,
  time: z.iso.time({ precision: -1 }),
  assignedTo: idField.nullable(),
});

/** What is said, when, and who goes, on a unit already chosen. Day and time are those of the site. */
export function NewCallForm({ unitId, onMade }: { unitId: string; onMade: (callId: string) => void }) {
  const { t } = useTranslation();
  const me = useMe();
  const [now] = useState(() => Date.now());
  const { can } = useSession();
  const client = useQueryClient();
  const unit = useQuery({
    queryKey: ["unit", unitId],
    queryFn: ({ signal }) => callApi(readUnit, { params: { unitId }, signal }),
  });
  const people = useQuery({
    queryKey: ["people"],
    queryFn: ({ signal }) => callApi(listPeople, { signal }),
    enabled: can("call:assign") && can("person:list"),
  });
  if (!unit.data) return null;
  const timeZone = unit.data.site.timeZone ?? me.company.timeZone;
  const others = people.data?.items.filter((person) => person.state === "active") ?? [me.person];
  return (
    <div className="max-w-150">
      <Form
        schema={schema}
        defaults={{
          complaint: "",
          day: dayOf(now, timeZone),
          time: formatTime(now, timeZone),
          assignedTo: can("call:assign") ? "" : me.person.id,
        }}
        submitLabel={t("desk:newCall.submit")}
        onSubmit={async ({ complaint, day, time, assignedTo }) => {
          const body = { unitId, complaint, assignedTo, scheduledFor: momentAtSite(day, time, timeZone) };
          const call = await callApi(createCall, { body });
          await client.invalidateQueries({ queryKey: ["kept"] });
          onMade(call.id);
        }}
      >
        <AreaField
          name="complaint"
          label={t("desk:newCall.complaint")}
          hint={t("desk:newCall.complaintHint")}
        />
        <div className="grid gap-4 min-[26rem]:grid-cols-2">
          <TextField name="day" type="date" label={t("desk:newCall.day")} />
          <TextField
            name="time"
            type="time"
            label={t("desk:newCall.time", { zone: zoneName(now, timeZone) })}
          />
        </div>
        <SelectField
          name="assignedTo"
          label={t("desk:call.who")}
          choices={others.map((person) => ({ value: person.id, label: person.name }))}
          emptyLabel={t("desk:calls.nobody")}
          empty="null"
        />
      </Form>
    </div>
  );
}
