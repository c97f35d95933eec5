import { command, needsPowerOff, openPutBacks } from "@emberladder/diagnosis";
import type { PutBack } from "@emberladder/diagnosis";
import { format } from "date-fns";
import { useTranslation } from "react-i18next";
import { useNavigate } from "react-router-dom";
import { PrimaryButton } from "#components/ui/button.tsx";
import { paths } from "#lib/paths.ts";
import { formatClock, useNow } from "#lib/use-now.ts";
import { useDiagnosis } from "../diagnosis-context.tsx";
import { FieldLayout } from "../parts/field-layout.tsx";
import { RefusalNote } from "../parts/refusal-note.tsx";
import { UndoLine } from "../parts/undo-line.tsx";
import { useUnitLine } from "../parts/use-unit-line.ts";

/** What is out, in the order in which it is safe to put back; each row's button is named by the act. */
export function PutBackScreen() {
  const { t } = useTranslation();
  const navigate = useNavigate();
  const { diagnosisId, state, record, recordAndGoOn } = useDiagnosis();
  const unitLine = useUnitLine();
  const out = openPutBacks(state);
  const back = state.putBacks.filter((item) => item.restored);
  // The last thing that has to be back before the light-off goes on by itself.
  const isLast = out.filter((item) => item.kind !== "cover-removed").length === 1;
  const restore = (item: PutBack) =>
    void (isLast && item.kind !== "cover-removed" && state.repairs.length > 0 ? recordAndGoOn : record)([
      ...(item.kind === "valve-closed" ? [command("unit-state.set", { gas: "open" })] : []),
      command("put-back.restored", {
        of: item.eventId,
        entry: item.entry,
        ...(needsPowerOff(item) ? { powerWasOff: true } : {}),
      }),
    ]);
  return (
    <FieldLayout
      diagnosisId={diagnosisId}
      state={state}
      title={t("putBack.header")}
      subtitle={unitLine}
      pinned={
        <PrimaryButton onClick={() => void navigate(paths.diagnosis.next(diagnosisId))}>
          {out.length === 0 ? t("putBack.goOn") : t("putBack.later", { count: out.length })}
        </PrimaryButton>
      }
    >
      <h1 className="text-question">
        {out.length === 0 ? t("putBack.none") : t("putBack.title", { count: out.length })}
      </h1>
      <RefusalNote />
      <ul className="flex flex-col gap-3">
        {out.map((item) => (
          <PutBackRow key={`${item.eventId}:${item.entry}`} item={item} onRestore={() => restore(item)} />
        ))}
      </ul>
      {back.length > 0 && (
        <section aria-label={t("putBack.backTitle")}>
          <h2 className="mb-1 text-field font-semibold">{t("putBack.backTitle")}</h2>
          <ul className="flex flex-col divide-y-1 divide-hair border-y-1 border-hair text-field text-quiet">
            {back.map((item) => (
              <li key={`${item.eventId}:${item.entry}`} className="flex justify-between gap-3 py-1.5">
                <span>{t(`trade:putBack.what.${item.what}`)}</span>
                <span className="numeric">{item.restored ? format(item.restored.at, "HH:mm") : ""}</span>
              </li>
            ))}
          </ul>
        </section>
      )}
      <UndoLine />
    </FieldLayout>
  );
}

function PutBackRow({ item, onRestore }: { item: PutBack; onRestore: () => void }) {
  const { t } = useTranslation();
  const timed = item.limitS !== undefined;
  const now = useNow(timed);
  const left = timed ? (item.limitS ?? 0) - (now - item.at) / 1000 : undefined;
  const late = left !== undefined && left <= 0;
  return (
    <li
      className={`flex flex-col gap-2 rounded border-2 p-3 ${late ? "border-ink bg-stopped text-on-stopped" : "border-rule bg-surface"}`}
    >
      <p className="text-field font-semibold">
        {t(`trade:putBack.what.${item.what}`)}
        <span className={`block font-normal ${late ? "" : "text-quiet"}`}>
          {t("putBack.since", {
            time: format(item.at, "HH:mm"),
            why: item.check ? t(`trade:checks.${item.check}.title`) : t("putBack.byHand"),
          })}
        </span>
        {needsPowerOff(item) && <span className="block">{t("putBack.powerOffFirst")}</span>}
        {left !== undefined && (
          <span className="numeric block text-[1.75rem] text-bypassed" role="timer">
            {late ? t("putBack.overTime") : formatClock(left)}
          </span>
        )}
      </p>
      <button
        type="button"
        onClick={onRestore}
        className={`min-h-14 rounded border-2 text-field font-semibold ${late ? "border-on-stopped" : "border-ink bg-ground text-ink"}`}
      >
        {t(`trade:putBack.act.${item.kind}`)}
      </button>
    </li>
  );
}
