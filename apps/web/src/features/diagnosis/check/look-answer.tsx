import { findingsOf, lowerByFinding } from "@emberladder/furnace";
import type { Outcome } from "@emberladder/furnace";
import { useTranslation } from "react-i18next";
import { AnswerButton } from "#components/ui/answer-button.tsx";
import { OutcomeMark } from "#components/ui/outcome-mark.tsx";
import { useDiagnosis } from "../diagnosis-context.tsx";
import type { CheckTask, Frame } from "./check-task.ts";
import { answerCommand } from "./answer-command.ts";

/**
 * A look: one button an answer, and the tap records it. The undo line stays on the next page, so a wrong tap
 * with a glove costs one more.
 */
export function LookAnswer({ task, frame }: { task: CheckTask; frame: Frame }) {
  const { t } = useTranslation();
  const { state, profile, recordAndGoOn } = useDiagnosis();
  const { check, node, given } = task;
  const findings = findingsOf(check);
  const inTree = new Set(
    (node?.branches ?? []).flatMap((branch) => (branch.on === "finding" ? [branch.finding] : [])),
  );
  const ordered =
    inTree.size > 0
      ? findings.toSorted((a, b) => Number(inTree.has(b.id)) - Number(inTree.has(a.id)))
      : findings;
  const hasGood = findings.some((finding) => finding.classes.includes("good"));
  const record = (answer: { outcome: Outcome; finding?: string }) =>
    void recordAndGoOn([answerCommand({ state, profile, task, answer })]);

  return frame(
    <div className="flex flex-col gap-2">
      {!(hasGood && check === "ck-board-status") && (
        <AnswerButton
          symbol={<OutcomeMark outcome="good" />}
          chosen={given?.outcome === "good" && !given.finding}
          onChoose={() => record({ outcome: "good" })}
        >
          {t([`trade:checks.${check}.zones.good`, "check.allRight"])}
        </AnswerButton>
      )}
      {ordered.map((finding) => {
        const outcome = lowerByFinding(undefined, check, finding.id) ?? finding.classes.at(-1) ?? "fail";
        return (
          <AnswerButton
            key={finding.id}
            symbol={<OutcomeMark outcome={outcome} />}
            chosen={given?.finding === finding.id}
            onChoose={() => record({ outcome, finding: finding.id })}
          >
            {t(`trade:findings.${check}.${finding.id}`)}
          </AnswerButton>
        );
      })}
      {findings.length === 0 && (
        <AnswerButton
          symbol={<OutcomeMark outcome="fail" />}
          chosen={given?.outcome === "fail"}
          onChoose={() => record({ outcome: "fail" })}
        >
          {t([`trade:checks.${check}.zones.fail`, "check.notRight"])}
        </AnswerButton>
      )}
    </div>,
  );
}
