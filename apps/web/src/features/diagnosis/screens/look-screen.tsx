import { command } from "@emberladder/diagnosis";
import type { BodyOf } from "@emberladder/diagnosis";
import { firstLookFor } from "@emberladder/furnace";
import type { FirstLookHit, FirstLookItem } from "@emberladder/furnace";
import { useState } from "react";
import { useTranslation } from "react-i18next";
import { useNavigate } from "react-router-dom";
import { LinkButton, PrimaryButton } from "#components/ui/button.tsx";
import { paths } from "#lib/paths.ts";
import { useDiagnosis } from "../diagnosis-context.tsx";
import { AtUnitQuestions } from "../look/at-unit-questions.tsx";
import { LookDetail } from "../look/look-detail.tsx";
import { LookRow } from "../look/look-row.tsx";
import { FieldLayout } from "../parts/field-layout.tsx";
import { RefusalNote } from "../parts/refusal-note.tsx";
import { UndoLine } from "../parts/undo-line.tsx";
import { useUnitLine } from "../parts/use-unit-line.ts";

/**
 * The first look, before any watch: seven looks, each optional. A hit that settles the cause goes straight to
 * the conclusion; what the status light says is noted and points on.
 */
export function LookScreen() {
  const { t } = useTranslation();
  const navigate = useNavigate();
  const { diagnosisId, state, profile, record, recordAndGoOn } = useDiagnosis();
  const unitLine = useUnitLine();
  const [open, setOpen] = useState<FirstLookItem | "at-unit" | null>(null);
  const items = firstLookFor({ codes: profile.codes, options: profile.options });

  const answerRight = (item: FirstLookItem) =>
    void record([command("look.answered", { item: item.id, answer: "right" })]);
  const answerHit = (item: FirstLookItem, hit: FirstLookHit, noteRef?: string) => {
    const settles = hit.fault !== undefined;
    const body: BodyOf<"look.answered"> = {
      item: item.id,
      answer: settles ? "hit" : "note",
      check: hit.check,
      ...(hit.finding ? { finding: hit.finding } : {}),
      outcome: settles ? "fail" : item.id === "status-light" ? "marginal" : "fail",
      ...(noteRef ? { noteRef } : {}),
    };
    setOpen(null);
    void (settles || hit.rule ? recordAndGoOn : record)([command("look.answered", body)]);
  };

  if (open === "at-unit") return <AtUnitQuestions onClose={() => setOpen(null)} />;
  if (open)
    return <LookDetail item={open} onHit={(hit) => answerHit(open, hit)} onClose={() => setOpen(null)} />;

  return (
    <FieldLayout
      diagnosisId={diagnosisId}
      state={state}
      title={t("look.header")}
      subtitle={unitLine}
      pinned={
        <PrimaryButton onClick={() => void navigate(paths.diagnosis.watch(diagnosisId))}>
          {t("look.toWatch")}
        </PrimaryButton>
      }
    >
      <h1 className="text-question short:text-[1.375rem] short:leading-6.5">{t("look.title")}</h1>
      <RefusalNote />
      <ul className="flex flex-col gap-2">
        {items.map((item) => (
          <LookRow
            key={item.id}
            item={item.id}
            look={state.looks.find((look) => look.item === item.id)}
            onRight={() => answerRight(item)}
            onHit={() => setOpen(item)}
          />
        ))}
        <LookRow
          item="at-unit"
          atUnit={state.door["at-unit"]}
          onRight={() => void record([command("door.answered", { question: "at-unit", found: [] })])}
          onHit={() => setOpen("at-unit")}
        />
      </ul>
      <div className="flex flex-wrap gap-x-6">
        <LinkButton onClick={() => void recordAndGoOn([command("watch.skipped", { why: "no-power" })])}>
          {t("look.dead")}
        </LinkButton>
        <LinkButton onClick={() => void recordAndGoOn([command("watch.skipped", { why: "not-safe" })])}>
          {t("look.noWatch")}
        </LinkButton>
      </div>
      <UndoLine />
    </FieldLayout>
  );
}
