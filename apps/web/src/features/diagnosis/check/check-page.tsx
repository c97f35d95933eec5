import { command, openingsToAdd } from "@emberladder/diagnosis";
import type { Observation } from "@emberladder/diagnosis";
import { getCheck } from "@emberladder/furnace";
import type { CheckId } from "@emberladder/furnace";
import type { AskingNode } from "@emberladder/trees";
import { useState } from "react";
import { useTranslation } from "react-i18next";
import { LinkButton } from "#components/ui/button.tsx";
import { HazardLine } from "#components/ui/hazard-line.tsx";
import { useDiagnosis } from "../diagnosis-context.tsx";
import { FieldLayout } from "../parts/field-layout.tsx";
import { RefusalNote } from "../parts/refusal-note.tsx";
import { UndoLine } from "../parts/undo-line.tsx";
import { useClimbLine, useUnitLine } from "../parts/use-unit-line.ts";
import { InOutAnswer } from "./in-out-answer.tsx";
import type { CheckTask, Frame } from "./check-task.ts";
import { CannotDo } from "./cannot-do.tsx";
import { LookAnswer } from "./look-answer.tsx";
import { NumberAnswer } from "./number-answer.tsx";
import { rungOfCheck } from "./rung-of-check.ts";
import { StartCheck } from "./start-check.tsx";
import { UnitStateBar } from "./unit-state-bar.tsx";
import { worstHazards } from "./worst-hazards.ts";

/**
 * One check on one page: hazard, instruction, state of the unit, the answer, what it means, the act. A check
 * that opens something is started first, so that the put-back list holds it while it is out.
 */
export function CheckPage({
  check,
  node,
  given,
}: {
  check: CheckId;
  node: AskingNode | undefined;
  given?: Observation;
}) {
  const { t } = useTranslation();
  const work = useDiagnosis();
  const { diagnosisId, state, profile } = work;
  const unitLine = useUnitLine();
  const climb = useClimbLine();
  const [showing, setShowing] = useState<"answer" | "why" | "cannot">("answer");
  const definition = getCheck(check);
  const started = state.current?.check === check ? state.current : null;
  const way = started?.way ?? node?.way ?? given?.way;
  const ways = definition.ways ?? [];
  const mustStart =
    !started &&
    ((ways.length > 1 && node?.way === undefined && given?.way === undefined) ||
      openingsToAdd(state, check, way).length > 0);
  const task: CheckTask = { check, node, way, given };
  const afterRepair = state.repairs.length > 0;

  if (showing === "cannot") return <CannotDo task={task} onBack={() => setShowing("answer")} />;

  const links = (
    <div className="flex items-center justify-between gap-4">
      <LinkButton
        onClick={() => setShowing(showing === "why" ? "answer" : "why")}
        aria-expanded={showing === "why"}
      >
        {t("check.why")}
      </LinkButton>
      <LinkButton onClick={() => setShowing("cannot")}>{t("check.cannot")}</LinkButton>
    </div>
  );
  const frame = (content: React.ReactNode, pinned?: React.ReactNode) => (
    <FieldLayout
      diagnosisId={diagnosisId}
      state={state}
      title={unitLine}
      subtitle={climb}
      notch={rungOfCheck(check, node)}
      pinned={pinned}
    >
      {node?.safety && <HazardLine>{node.safety}</HazardLine>}
      {worstHazards(definition.hazards, profile).map((hazard) => (
        <HazardLine key={hazard}>{t(`trade:hazards.${hazard}`)}</HazardLine>
      ))}
      <h1 className="text-question short:text-[1.375rem] short:leading-6.5">
        {t(`trade:checks.${check}.title`)}
        {afterRepair && <span className="font-normal text-quiet">{`, ${t("check.again")}`}</span>}
      </h1>
      <RefusalNote />
      <UnitStateBar check={check} node={node} />
      <p className="text-field short:group-has-[input:not(:placeholder-shown)]:hidden">
        {t(`trade:checks.${check}.do`)}
      </p>
      {content}
      {showing === "why" && (
        <aside className="border-l-6 border-rule bg-surface p-3 text-field">
          <p>{t(`trade:checks.${check}.why`)}</p>
          {node?.note && <p className="mt-2 text-quiet">{node.note}</p>}
          <p className="mt-2 text-quiet">{t("check.plateOutranks")}</p>
        </aside>
      )}
      <UndoLine />
      {links}
    </FieldLayout>
  );

  if (mustStart) {
    return frame(
      <StartCheck
        task={task}
        onStart={(chosenWay, before) =>
          void work.record([
            ...before,
            command("check.started", {
              check,
              ...(chosenWay ? { way: chosenWay } : {}),
              ...(node ? { treeNode: node.id } : {}),
              opens: openingsToAdd(state, check, chosenWay),
            }),
          ])
        }
      />,
    );
  }
  const Answer = ANSWERS[panelOf(definition.reading, way)];
  return <Answer key={way} task={task} frame={frame} />;
}

type Panel = "look" | "number" | "in-out";

const ANSWERS: Record<Panel, (props: { task: CheckTask; frame: Frame }) => React.ReactNode> = {
  look: LookAnswer,
  number: NumberAnswer,
  "in-out": InOutAnswer,
};

/** How an answer is given: the check's own kind, unless the way of taking it says by eye or in ohms. */
function panelOf(reading: Panel, way: string | undefined): Panel {
  if (way === "look") return "look";
  if (way === "ohms" || way === "fuse-out-ohms") return "number";
  return reading;
}
