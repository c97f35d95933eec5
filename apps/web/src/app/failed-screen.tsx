import { useTranslation } from "react-i18next";
import { useOutletContext } from "react-router-dom";
import { FailedDrawing } from "#components/ladder/drawings.tsx";
import { PrimaryButton } from "#components/ui/button.tsx";

/** A fault of the product: what was kept, and one act. It never draws a stopped rung of the unit. */
export function FailedScreen() {
  const { t } = useTranslation();
  return <FailedNote title={t("failed.title")} act={t("failed.again")} onAct={() => location.reload()} />;
}

/** What the frame tells the screens in it, so that none draws a second frame. */
export const IN_DESK = "in-desk";

/** What happened, what was kept, and one act: a page of its own, or a part of the desk's page. */
export function FailedNote({ title, act, onAct }: { title: string; act: string; onAct: () => void }) {
  const { t } = useTranslation();
  const isInDesk = useOutletContext() === IN_DESK;
  const Frame = isInDesk ? "div" : "main";
  return (
    <Frame
      className={`mx-auto flex w-full max-w-[560px] flex-col justify-center gap-5 p-6 ${isInDesk ? "grow" : "min-h-dvh"}`}
    >
      <FailedDrawing />
      <h1 className="text-question">{title}</h1>
      <ul className="flex flex-col gap-2 text-field text-quiet">
        <li>{t("failed.kept")}</li>
        <li>{t("failed.sends")}</li>
      </ul>
      <PrimaryButton onClick={onAct}>{act}</PrimaryButton>
    </Frame>
  );
}
