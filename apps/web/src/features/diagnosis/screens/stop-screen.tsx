import { command, nextAct, openStops, urgentStop } from "@emberladder/diagnosis";
import type { Command, DiagnosisState } from "@emberladder/diagnosis";
import { STOP_RULE_CODES } from "@emberladder/furnace";
import { useTranslation } from "react-i18next";
import { Link, Navigate } from "react-router-dom";
import { paths } from "#lib/paths.ts";
import { makeNote } from "#lib/store/append-event.ts";
import { useDiagnosis } from "../diagnosis-context.tsx";
import { FieldLayout } from "../parts/field-layout.tsx";
import { RefusalNote } from "../parts/refusal-note.tsx";
import { UndoLine } from "../parts/undo-line.tsx";
import { useUnitLine } from "../parts/use-unit-line.ts";
import { LeaveNow } from "../stop/leave-now.tsx";
import { StopActRow } from "../stop/stop-act-row.tsx";

/**
 * A stop rule: what stopped the work, the acts in their order, what is left. The acts that are due whatever
 * happens come first; the rest only where work goes on, and ending the visit is always possible.
 */
export function StopScreen() {
  const { t } = useTranslation();
  const { diagnosisId, state, profile, recordAndGoOn } = useDiagnosis();
  const unitLine = useUnitLine();
  const stop = urgentStop(state) ?? openStops(state)[0];
  if (!stop) return <Navigate to={paths.diagnosis.next(diagnosisId)} replace />;
  const outside = stop.acts.find((act) => act.id === "outside");
  if (outside && !outside.done) {
    return (
      <LeaveNow
        onOutside={() =>
          void recordAndGoOn([command("stop.act-recorded", { rule: stop.rule, act: "outside" })])
        }
      />
    );
  }
  const now = nextAct(stop);
  const acts = stop.acts.filter((act) => act.due !== "closing");
  const left = acts.filter((act) => !act.done).length;
  const gateway = profile.codes.location === "RTU" ? t("stop.onRoof") : "";
  return (
    <FieldLayout
      diagnosisId={diagnosisId}
      state={state}
      title={t("stop.header", { code: STOP_RULE_CODES[stop.rule] })}
      subtitle={unitLine}
      door={state.confirmed ? undefined : { answered: 0, of: 3 }}
      stopped
    >
      <section className="-mx-4 -mt-4 flex items-center gap-4 bg-stopped px-4 py-4 text-on-stopped">
        <svg
          viewBox="0 0 34 28"
          width={40}
          height={33}
          fill="none"
          stroke="currentColor"
          strokeWidth={4}
          aria-hidden="true"
          className="shrink-0"
        >
          <path d="M0 14h10M24 14h10M12 2v24M22 2v24" />
        </svg>
        <h1 className="text-question">{t(`trade:stopRules.${stop.rule}.title`)}</h1>
      </section>
      <RefusalNote />
      {gateway && <p className="text-field text-quiet">{gateway}</p>}
      <ol className="flex flex-col gap-2">
        {acts.map((act, index) => (
          <StopActRow
            key={act.id}
            number={index + 1}
            stop={stop}
            act={act}
            isNow={act.id === now?.id}
            onDone={(given) => {
              const note = given.text ? makeNote(given.text) : undefined;
              void recordAndGoOn(
                [
                  ...changesOfAct(act.id, state),
                  command("stop.act-recorded", {
                    rule: stop.rule,
                    act: act.id,
                    ...(given.value === undefined ? {} : { value: given.value }),
                    ...(note ? { noteRef: note.hash } : {}),
                  }),
                ],
                note ? [note] : [],
              );
            }}
          />
        ))}
      </ol>
      <p className="text-field font-semibold" role="status">
        {left > 0 ? t("stop.left", { count: left }) : t("stop.allDone")}
      </p>
      {stop.mayFinish && (
        <Link
          to={paths.diagnosis.close(diagnosisId)}
          className="flex min-h-12 items-center text-field font-semibold"
        >
          {t("stop.endVisit")}
        </Link>
      )}
      <UndoLine />
    </FieldLayout>
  );
}

const SHUTS_GAS = ["gas-shut", "appliances-off", "appliance-off", "shut-down"];
const CUTS_POWER = ["power-off", "breaker-off", "de-energised"];

/** What an act of a stop rule changes on the unit, and on the put-back list: a valve shut has to open again. */
function changesOfAct(act: string, state: DiagnosisState): Command[] {
  if (CUTS_POWER.includes(act) && state.unit.power === "on")
    return [command("unit-state.set", { power: "off" })];
  if (!SHUTS_GAS.includes(act) || state.unit.gas === "shut") return [];
  return [
    command("unit-state.set", { gas: "shut", calling: false }),
    command("put-back.opened", { kind: "valve-closed", what: "unit-gas-valve" }),
  ];
}
