import type { FirstLookHit, FirstLookItem } from "@emberladder/furnace";
import { useTranslation } from "react-i18next";
import { AnswerButton } from "#components/ui/answer-button.tsx";
import { LinkButton } from "#components/ui/button.tsx";
import { OutcomeMark } from "#components/ui/outcome-mark.tsx";
import { useDiagnosis } from "../diagnosis-context.tsx";
import { FieldLayout } from "../parts/field-layout.tsx";
import { RefusalNote } from "../parts/refusal-note.tsx";
import { useUnitLine } from "../parts/use-unit-line.ts";

/** What exactly was found at one item of the first look. */
export function LookDetail({
  item,
  onHit,
  onClose,
}: {
  item: FirstLookItem;
  onHit: (hit: FirstLookHit) => void;
  onClose: () => void;
}) {
  const { t } = useTranslation();
  const { diagnosisId, state } = useDiagnosis();
  const unitLine = useUnitLine();
  return (
    <FieldLayout diagnosisId={diagnosisId} state={state} title={t("look.header")} subtitle={unitLine}>
      <h1 className="text-question">{t(`trade:firstLook.${item.id}.look`)}</h1>
      <RefusalNote />
      <div className="flex flex-col gap-2">
        {item.hits.map((hit) => (
          <AnswerButton
            key={hit.id}
            symbol={<OutcomeMark outcome={hit.fault ? "fail" : "marginal"} />}
            onChoose={() => onHit(hit)}
          >
            {t([
              ["trade:firstLook", item.id, "hits", hit.id].join("."),
              ["trade:findings", hit.check, hit.finding ?? ""].join("."),
            ])}
          </AnswerButton>
        ))}
      </div>
      <LinkButton onClick={onClose}>{t("look.back")}</LinkButton>
    </FieldLayout>
  );
}
