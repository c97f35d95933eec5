import { command, ladderOf } from "@emberladder/diagnosis";
import type { Watch } from "@emberladder/diagnosis";
import { dueTimes, sightsOf, stageOfSight } from "@emberladder/furnace";
import type { Sight } from "@emberladder/furnace";
import { useState } from "react";
import { useTranslation } from "react-i18next";
import { HazardLine } from "#components/ui/hazard-line.tsx";
import { formatClock, useNow } from "#lib/use-now.ts";
import { useDiagnosis } from "../diagnosis-context.tsx";
import { FieldLayout } from "../parts/field-layout.tsx";
import { RefusalNote } from "../parts/refusal-note.tsx";
import { useUnitLine } from "../parts/use-unit-line.ts";
import { BlowerQuestion } from "./blower-question.tsx";
import { EndActs } from "./end-acts.tsx";
import { SightRow } from "./sight-row.tsx";

/**
 * The call for heat as it runs: a timer, what can be seen as buttons from the top of the ladder down, and the
 * one act that ends it. Only the highest thing seen is tapped; what lies under it is passed, not read.
 */
export function RunningWatch({ watch }: { watch: Watch }) {
  const { t } = useTranslation();
  const { diagnosisId, state, profile, record, recordAndGoOn } = useDiagnosis();
  const unitLine = useUnitLine();
  const [asksBlower, setAsksBlower] = useState<"stopped" | "nothing" | null>(null);
  const now = useNow(true);
  const elapsed = Math.max(0, (now - watch.at) / 1000);
  const sights = sightsOf(profile);
  const rungs = ladderOf(state);
  const due = dueTimes(profile);
  const highest = sights.findLast((sight) => watch.seen.some((seen) => seen.sight === sight));
  const atS = () => Math.round((Date.now() - watch.at) / 100) / 10;

  const see = (sight: Sight) => void record([command("watch.seen", { sight, atS: atS() })]);
  const end = (how: Parameters<typeof endCommand>[0], blowerWithInducer?: boolean) =>
    void recordAndGoOn([endCommand(how, atS(), blowerWithInducer)]);

  if (asksBlower) {
    return (
      <BlowerQuestion onAnswer={(blower) => end(asksBlower, blower)} onBack={() => setAsksBlower(null)} />
    );
  }

  return (
    <FieldLayout
      diagnosisId={diagnosisId}
      state={state}
      title={t("watch.header")}
      subtitle={unitLine}
      strip={false}
      flush={
        <>
          <HazardLine flush>{t("watch.hazard")}</HazardLine>
          <div className="flex items-center gap-4 border-b-2 border-hair bg-surface px-4 py-2 short:py-1">
            <span className="numeric text-timer font-semibold" role="timer">
              {formatClock(elapsed)}
            </span>
            <h1 className="text-[1.25rem] leading-6.5">{t("watch.tap")}</h1>
          </div>
        </>
      }
      pinned={
        <EndActs
          elapsed={elapsed}
          highest={highest}
          sights={sights}
          due={due}
          onEnd={end}
          onStays={() => setAsksBlower("stopped")}
          onNothing={() => setAsksBlower("nothing")}
        />
      }
    >
      <RefusalNote />
      <ol className="flex flex-col-reverse border-x-3 border-ink" aria-label={t("watch.list")}>
        {sights.map((sight, index) => {
          const stage = stageOfSight(sight);
          const below = sights[index - 1];
          return (
            <SightRow
              key={sight}
              sight={sight}
              seenAtS={watch.seen.find((seen) => seen.sight === sight)?.atS}
              isNext={index === sights.indexOf(highest ?? ("" as Sight)) + 1}
              isUnder={highest !== undefined && index < sights.indexOf(highest)}
              due={due[stage]}
              elapsed={elapsed}
              between={rungs.filter(
                (rung) =>
                  rung.number < (rungs.find((candidate) => candidate.stage === stage)?.number ?? 0) &&
                  rung.number >
                    (below
                      ? (rungs.find((candidate) => candidate.stage === stageOfSight(below))?.number ?? 0)
                      : 0),
              )}
              onSee={() => see(sight)}
            />
          );
        })}
      </ol>
    </FieldLayout>
  );
}

type End =
  "flame-lost" | "no-flame" | "no-glow" | "nothing" | "stopped" | "locked-out" | "limit-cut" | "satisfied";

function endCommand(how: End, atS: number, blowerWithInducer?: boolean) {
  return command("watch.ended", {
    how,
    atS,
    ...(blowerWithInducer === undefined ? {} : { blowerWithInducer }),
  });
}
