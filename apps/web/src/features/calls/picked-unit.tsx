import { readUnit } from "@emberladder/contract";
import { useQuery } from "@tanstack/react-query";
import { useTranslation } from "react-i18next";
import { ActButton } from "#components/ui/act.tsx";
import { LoadingNote, ProblemNote } from "#components/ui/list-states.tsx";
import { ShutOffLabel } from "#components/ui/shut-off-label.tsx";
import { callApi } from "#lib/api-client.ts";
import { useMe } from "#lib/session.tsx";

/** The unit a call is for, with any open shut-off record, and the way to another. */
export function PickedUnit({ unitId, onChange }: { unitId: string; onChange?: () => void }) {
  const { t } = useTranslation();
  const { company } = useMe();
  const unit = useQuery({
    queryKey: ["unit", unitId],
    queryFn: ({ signal }) => callApi(readUnit, { params: { unitId }, signal }),
  });
  if (unit.isPending) return <LoadingNote />;
  if (unit.isError) return <ProblemNote problem={unit.error} onRetry={() => void unit.refetch()} />;
  const { name, site, customerFirstName, openShutOff } = unit.data;
  return (
    <div className="flex max-w-150 flex-wrap items-center justify-between gap-3">
      <div>
        <p className="text-field font-semibold">{name}</p>
        <p className="text-field text-quiet desk:text-desk">
          {customerFirstName}, {site.address}, {site.town}
        </p>
        {openShutOff && <ShutOffLabel record={openShutOff} timeZone={site.timeZone ?? company.timeZone} />}
      </div>
      {onChange && <ActButton onClick={onChange}>{t("desk:newCall.another")}</ActButton>}
    </div>
  );
}
