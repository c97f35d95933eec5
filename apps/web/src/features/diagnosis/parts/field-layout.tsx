import { ladderOf } from "@emberladder/diagnosis";
import type { DiagnosisState } from "@emberladder/diagnosis";
import type { Stage } from "@emberladder/furnace";
import type { ReactNode } from "react";
import { useTranslation } from "react-i18next";
import { useNavigate } from "react-router-dom";
import { LadderStrip } from "#components/ladder/ladder-strip.tsx";
import { useHandedness } from "#lib/handedness.ts";
import { paths } from "#lib/paths.ts";
import { FieldDock } from "./field-dock.tsx";
import { FieldHeader } from "./field-header.tsx";
import { StopBanner } from "./stop-banner.tsx";

/**
 * The frame of every field screen: header, the ladder along the side that this person chose, the question, the pinned act, the dock.
 * The heading of the page is the question. `pinned` stays above the dock; a page that is read before it is
 * answered leaves it out and puts its act at the end.
 */
export function FieldLayout({
  diagnosisId,
  state,
  title,
  subtitle,
  notch,
  door,
  stopped,
  strip = true,
  pinned,
  flush,
  children,
}: {
  diagnosisId: string;
  state: DiagnosisState;
  title: string;
  subtitle: string;
  notch?: Stage;
  door?: { answered: number; of: number };
  stopped?: boolean;
  /** Without the strip where the screen draws the ladder itself. */
  strip?: boolean;
  pinned?: ReactNode;
  /** Drawn over the full width, directly under the header. */
  flush?: ReactNode;
  children: ReactNode;
}) {
  const { t } = useTranslation();
  const navigate = useNavigate();
  const side = useHandedness();
  return (
    <div className="flex h-dvh flex-col bg-ground large-letters:h-auto large-letters:min-h-dvh">
      <FieldHeader title={title} subtitle={subtitle} />
      {!stopped && <StopBanner diagnosisId={diagnosisId} state={state} />}
      {flush}
      <div className={`flex min-h-0 grow ${side === "right" ? "flex-row-reverse" : ""}`}>
        {strip && (
          <LadderStrip
            rungs={ladderOf(state)}
            notch={notch}
            door={door}
            stopped={stopped}
            side={side}
            onOpen={() => void navigate(paths.diagnosis.ladder(diagnosisId))}
          />
        )}
        <main
          className="focus-inside flex min-w-0 grow scroll-py-3 flex-col overflow-y-auto"
          tabIndex={0}
          aria-label={t("field.step")}
        >
          <div className="mx-auto group flex w-full max-w-[560px] grow flex-col gap-3 p-4 short:gap-2 short:py-3">
            {children}
          </div>
        </main>
      </div>
      {pinned && (
        <div className="border-t-1 border-hair bg-ground px-4 py-2">
          <div className="mx-auto max-w-[560px]">{pinned}</div>
        </div>
      )}
      <FieldDock diagnosisId={diagnosisId} state={state} />
    </div>
  );
}
