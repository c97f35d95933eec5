import type { ReactNode } from "react";
import { useTranslation } from "react-i18next";
import { ColdLadderDrawing, FailedDrawing, MissingRungDrawing } from "#components/ladder/drawings.tsx";
import { ApiProblem } from "#lib/api-client.ts";
import { useProblemWords } from "#lib/problem-words.ts";
import { ActButton } from "./act.tsx";

/** Says that something is being fetched; the words come late enough not to flash. */
export function LoadingNote() {
  const { t } = useTranslation();
  return (
    <p role="status" className="p-6 text-field text-quiet desk:text-desk">
      {t("desk:states.loading")}
    </p>
  );
}

/** Nothing in a list: a cold ladder, one sentence, what follows, one act. */
export function EmptyNote({ title, note, act }: { title: string; note?: ReactNode; act?: ReactNode }) {
  return (
    <div className="flex flex-col items-start gap-4 p-6">
      <ColdLadderDrawing />
      <div>
        <h2 className="text-question">{title}</h2>
        {note && <div className="mt-1 max-w-130 text-field text-quiet desk:text-desk">{note}</div>}
      </div>
      {act}
    </div>
  );
}

/** A list or thing that could not be read: what happened, what was kept, and one act. */
export function ProblemNote({ problem, onRetry }: { problem: unknown; onRetry?: () => void }) {
  const { t } = useTranslation();
  const words = useProblemWords();
  const isLost = problem instanceof ApiProblem && problem.status === 404;
  // A used-up link does not come back by asking again.
  const isOver = problem instanceof ApiProblem && problem.status === 410;
  return (
    <div role="alert" className="flex flex-col items-start gap-4 p-6">
      {isLost ? <MissingRungDrawing /> : <FailedDrawing />}
      <div>
        <h2 className="text-question">{isLost ? t("desk:states.lost") : t("desk:states.failed")}</h2>
        <p className="mt-1 max-w-130 text-field text-quiet desk:text-desk">
          {isLost ? t("desk:states.lostNote") : words(problem)}
        </p>
      </div>
      {onRetry && !isLost && !isOver && <ActButton onClick={onRetry}>{t("desk:states.retry")}</ActButton>}
    </div>
  );
}

/** Says that what is shown was kept on this phone, and since when. */
export function KeptNote({ at }: { at: string }) {
  const { t } = useTranslation();
  return (
    <p
      role="status"
      className="border-b border-hair border-l-6 border-l-ink bg-surface px-4 py-3 text-field desk:px-6 desk:text-desk"
    >
      {t("desk:states.kept", { at })}
    </p>
  );
}
