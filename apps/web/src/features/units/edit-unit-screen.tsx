import { readUnit, updateUnit } from "@emberladder/contract";
import { useQuery, useQueryClient } from "@tanstack/react-query";
import { useTranslation } from "react-i18next";
import { useNavigate, useParams, useSearchParams } from "react-router-dom";
import { LoadingNote, ProblemNote } from "#components/ui/list-states.tsx";
import { PageHead } from "#components/ui/page-head.tsx";
import { callApi } from "#lib/api-client.ts";
import { paths } from "#lib/paths.ts";
import { UnitForm } from "./unit-form.tsx";
import type { UnitDraft } from "./unit-form.tsx";

/** Corrects a unit. Where somebody else changed it meanwhile, that is said and nothing is overwritten. */
export function EditUnitScreen() {
  const { t } = useTranslation();
  const { unitId = "" } = useParams();
  const navigate = useNavigate();
  const [search] = useSearchParams();
  // Opened from a visit: back to it, where the corrected unit is confirmed and recorded.
  const diagnosisId = search.get("diagnosis");
  const backTo = diagnosisId ? paths.diagnosis.confirm(diagnosisId) : paths.unit(unitId);
  const client = useQueryClient();
  const unit = useQuery({
    queryKey: ["unit-to-edit", unitId],
    queryFn: ({ signal }) => callApi(readUnit, { params: { unitId }, signal }),
    // What is being typed must not be drawn over by a newer answer.
    staleTime: Infinity,
    gcTime: 0,
    refetchOnWindowFocus: false,
  });
  if (unit.isPending) return <LoadingNote />;
  if (unit.isError) return <ProblemNote problem={unit.error} onRetry={() => void unit.refetch()} />;
  const { name, profile, version } = unit.data;
  const save = async (changed: UnitDraft) => {
    await callApi(updateUnit, { params: { unitId }, body: { version, ...changed } });
    await client.invalidateQueries();
    await navigate(backTo, { replace: true });
  };
  return (
    <>
      <PageHead back={{ to: backTo, label: name }} title={t("desk:unit.editTitle", { name })} />
      <UnitForm draft={{ name, profile }} submitLabel={t("desk:unit.save")} onSubmit={save} />
    </>
  );
}
