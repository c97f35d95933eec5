import { listPersonDevices, revokeDevice } from "@emberladder/contract";
import { useQuery, useQueryClient } from "@tanstack/react-query";
import { useState } from "react";
import { useTranslation } from "react-i18next";
import { ActProblem } from "#components/ui/act-problem.tsx";
import { ActButton } from "#components/ui/act.tsx";
import { ConfirmDialog } from "#components/ui/confirm-dialog.tsx";
import { LoadingNote, ProblemNote } from "#components/ui/list-states.tsx";
import { callApi } from "#lib/api-client.ts";
import { useMe } from "#lib/session.tsx";
import { formatMoment } from "#lib/site-time.ts";
import { useAct } from "#lib/use-act.ts";

/** The devices of a person; a lost one is revoked, and can then send nothing more. */
export function PersonDevices({ personId }: { personId: string }) {
  const { t } = useTranslation();
  const { company } = useMe();
  const client = useQueryClient();
  const act = useAct();
  const [asked, setAsked] = useState<{ id: string; name: string } | null>(null);
  const devices = useQuery({
    queryKey: ["devices", personId],
    queryFn: ({ signal }) => callApi(listPersonDevices, { params: { personId }, signal }),
  });
  const revoke = async (deviceId: string) => {
    await callApi(revokeDevice, { params: { deviceId } });
    await client.invalidateQueries({ queryKey: ["devices", personId] });
  };
  return (
    <section>
      <h3 className="mb-2 text-field font-semibold desk:text-desk">{t("desk:devices.title")}</h3>
      {devices.isPending && <LoadingNote />}
      {devices.isError && <ProblemNote problem={devices.error} onRetry={() => void devices.refetch()} />}
      {devices.data?.items.length === 0 && (
        <p className="text-field text-quiet desk:text-desk">{t("desk:devices.none")}</p>
      )}
      <ul>
        {devices.data?.items.map((device) => (
          <li
            key={device.id}
            className="flex flex-wrap items-center justify-between gap-3 border-b border-hair py-2"
          >
            <span className="text-field desk:text-desk">
              {device.name}
              <span className="block text-quiet">
                {device.revokedAt
                  ? t("desk:devices.revoked", { at: formatMoment(device.revokedAt, company.timeZone) })
                  : t("desk:devices.lastSeen", { at: formatMoment(device.lastSeenAt, company.timeZone) })}
              </span>
            </span>
            {!device.revokedAt && (
              <ActButton
                aria-label={t("desk:devices.revokeOf", { name: device.name })}
                onClick={() => setAsked(device)}
              >
                {t("desk:devices.revoke")}
              </ActButton>
            )}
          </li>
        ))}
      </ul>
      <ActProblem problem={act.problem} />
      {asked && (
        <ConfirmDialog
          title={t("desk:devices.ask", { name: asked.name })}
          confirmLabel={t("desk:devices.revoke")}
          onConfirm={() => act.run(() => revoke(asked.id))}
          onClose={() => setAsked(null)}
        >
          {t("desk:devices.askNote")}
        </ConfirmDialog>
      )}
    </section>
  );
}
