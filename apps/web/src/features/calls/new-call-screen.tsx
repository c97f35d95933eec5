import { useTranslation } from "react-i18next";
import { useNavigate, useSearchParams } from "react-router-dom";
import { PageHead, Section } from "#components/ui/page-head.tsx";
import { paths } from "#lib/paths.ts";
import { useSession } from "#lib/session.tsx";
import { NewCallForm } from "./new-call-form.tsx";
import { PickUnit } from "./pick-unit.tsx";
import { PickedUnit } from "./picked-unit.tsx";

/**
 * A new call: which unit, then what is said, when, and who goes. The unit is in the address, so that a unit's own
 * page can start a call on it, and the way back keeps it.
 */
export function NewCallScreen() {
  const { t } = useTranslation();
  const { can } = useSession();
  const navigate = useNavigate();
  const [search, setSearch] = useSearchParams();
  const unitId = search.get("unit");
  const customerId = search.get("customer") ?? undefined;
  return (
    <>
      <PageHead back={{ to: paths.calls, label: t("desk:call.back") }} title={t("desk:newCall.title")} />
      <Section
        title={t("desk:newCall.unit")}
        note={unitId || can("customer:read") ? undefined : t("desk:newCall.fromUnit")}
      >
        {unitId ? (
          <PickedUnit
            unitId={unitId}
            onChange={
              can("customer:read") ? () => setSearch(customerId ? { customer: customerId } : {}) : undefined
            }
          />
        ) : (
          can("customer:read") && (
            <PickUnit
              customerId={customerId}
              onCustomer={(id) => setSearch(id ? { customer: id } : {})}
              onUnit={(id) => setSearch(customerId ? { customer: customerId, unit: id } : { unit: id })}
            />
          )
        )}
      </Section>
      {unitId && (
        <Section title={t("desk:newCall.call")}>
          <NewCallForm
            unitId={unitId}
            onMade={(callId) => void navigate(paths.call(callId), { replace: true })}
          />
        </Section>
      )}
    </>
  );
}
