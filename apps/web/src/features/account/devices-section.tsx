import { listOwnDevices } from "@emberladder/contract";
import { useQuery } from "@tanstack/react-query";
import { useTranslation } from "react-i18next";
import { LoadingNote, ProblemNote } from "#components/ui/list-states.tsx";
import { Section } from "#components/ui/page-head.tsx";
import { callApi } from "#lib/api-client.ts";
import { useMe } from "#lib/session.tsx";
import { formatMoment } from "#lib/site-time.ts";

/** The person's own devices, as the record knows them; a supervisor revokes a lost one. */
export function DevicesSection() {
  const { t } = useTranslation();
  const { company, deviceId } = useMe();
  const devices = useQuery({
    queryKey: ["own-devices"],
    queryFn: ({ signal }) => callApi(listOwnDevices, { signal }),
  });
  return (
    <Section title={t("desk:devices.title")} note={t("desk:devices.note")}>
      {devices.isPending && <LoadingNote />}
      {devices.isError && <ProblemNote problem={devices.error} onRetry={() => void devices.refetch()} />}
      <ul className="max-w-180">
        {devices.data?.items.map((device) => (
          <li key={device.id} className="border-b border-hair py-2 text-field desk:text-desk">
            <span className={device.id === deviceId ? "font-semibold" : ""}>{device.name}</span>
            <span className="block text-quiet">
              {device.revokedAt
                ? t("desk:devices.revoked", { at: formatMoment(device.revokedAt, company.timeZone) })
                : t("desk:devices.lastSeen", { at: formatMoment(device.lastSeenAt, company.timeZone) })}
            </span>
          </li>
        ))}
      </ul>
    </Section>
  );
}
