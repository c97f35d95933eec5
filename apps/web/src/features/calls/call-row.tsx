import type { Call } from "@emberladder/contract";
import { useId } from "react";
import { useTranslation } from "react-i18next";
import { Link } from "react-router-dom";
import { CallLadder } from "#components/ladder/call-ladder.tsx";
import { ShutOffLabel } from "#components/ui/shut-off-label.tsx";
import { paths } from "#lib/paths.ts";
import { formatDay, formatTime, zoneName } from "#lib/site-time.ts";

/** One call of the list: when, who, where, what is said, what must not be overlooked, how far it climbed. */
export function CallRow({
  call,
  isNext = false,
  showsDay = false,
}: {
  call: Call;
  isNext?: boolean;
  showsDay?: boolean;
}) {
  const { t } = useTranslation();
  const { site, unit } = call;
  const nameId = useId();
  const isOver = call.status === "done" || call.status === "cancelled";
  return (
    <li
      className={`relative border-b px-4 py-3 desk:px-6 ${isNext ? "border-b-2 border-ink bg-surface shadow-[inset_6px_0_0_var(--ink)]" : "border-hair"}`}
    >
      {/* The whole row is the target. */}
      <Link
        to={paths.call(call.id)}
        aria-labelledby={nameId}
        className="absolute inset-0 -outline-offset-3"
      />
      <div className="grid grid-cols-[3.75rem_1fr_auto] items-start gap-x-2 desk:grid-cols-[7rem_minmax(0,5fr)_minmax(0,6fr)_12rem_auto] desk:gap-x-6">
        <p className="numeric text-field font-semibold">
          {formatTime(call.scheduledFor, call.timeZone)}
          <span className="block font-sans text-label font-normal text-quiet desk:text-small">
            {showsDay
              ? formatDay(call.scheduledFor, call.timeZone)
              : zoneName(call.scheduledFor, call.timeZone)}
          </span>
        </p>
        <div className="min-w-0">
          <h3 id={nameId} className="text-[1.1875rem] leading-6 font-semibold">
            {call.customerFirstName}
          </h3>
          <p className="text-field text-quiet desk:text-desk">
            {site.address}, {site.town}
          </p>
          <p className="text-field text-quiet desk:text-desk">{unit.name}</p>
        </div>
        <div className="col-span-2 col-start-2 row-start-2 min-w-0 pt-1 desk:col-span-1 desk:col-start-3 desk:row-start-1 desk:pt-0">
          <p className="text-field font-medium desk:text-desk">
            {t("desk:calls.quote", { complaint: call.complaint })}
          </p>
          {unit.codes.location === "RTU" && (
            <p className="mt-2 border-l-4 border-ink pl-3 text-field font-semibold desk:text-desk">
              {site.accessNote ?? t("desk:calls.roof")}
            </p>
          )}
          {call.openShutOff && <ShutOffLabel record={call.openShutOff} timeZone={call.timeZone} />}
        </div>
        <p className="col-span-2 col-start-2 row-start-3 pt-1 text-field text-quiet desk:col-span-1 desk:col-start-4 desk:row-start-1 desk:pt-0 desk:text-desk">
          <span
            className={`mr-2 inline-block rounded border-2 px-2 text-label font-semibold desk:text-small ${isNext ? "border-ink bg-ink text-ground" : "border-rule text-ink"}`}
          >
            {isNext && call.status === "open" ? t("desk:calls.next") : t(`desk:callStatus.${call.status}`)}
          </span>
          {call.assignedTo?.name ?? t("desk:calls.nobody")}
        </p>
        <div className="col-start-3 row-start-1 desk:col-start-5">
          {!isOver && <CallLadder diagnosisId={call.openDiagnosisId} isShutOff={call.openShutOff !== null} />}
        </div>
      </div>
    </li>
  );
}
