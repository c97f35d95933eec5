import type { Rung } from "@emberladder/diagnosis";
import type { Stage } from "@emberladder/furnace";
import { useTranslation } from "react-i18next";
import type { Handedness } from "#lib/handedness.ts";
import { LadderList } from "./ladder-list.tsx";
import { RungBar } from "./rung-bar.tsx";

const WIDTH = 48;
const TOP = 4;
const HEIGHT = 504;

/**
 * The ladder as a slim strip along one side of a field screen. The whole strip is one button that opens the
 * full ladder; a notch marks the rung that the present check belongs to. Before the watch the foot carries
 * the door's questions; a stop rule closes the foot with a striped bar.
 */
export function LadderStrip({
  rungs,
  notch,
  door,
  stopped,
  side = "left",
  onOpen,
}: {
  rungs: readonly Rung[];
  notch?: Stage;
  /** Door questions under the foot: how many of how many are answered. */
  door?: { answered: number; of: number };
  stopped?: boolean;
  /** Where it stands; the notch points from the question to its rung. */
  side?: Handedness;
  onOpen: () => void;
}) {
  const { t } = useTranslation();
  const foot = door ? HEIGHT - 24 * door.of - 20 : HEIGHT;
  const gap = (foot - TOP) / (rungs.length + 0.6);
  const yOf = (index: number) => foot - gap * (index + 0.8);
  return (
    <button
      type="button"
      onClick={onOpen}
      className={`focus-inside relative w-[48px] shrink-0 border-hair bg-ground p-0 ${side === "right" ? "border-l-2" : "border-r-2"}`}
      aria-label={t("ladder.open")}
    >
      <svg
        viewBox={`0 0 ${WIDTH} ${HEIGHT + 8}`}
        preserveAspectRatio="none"
        className="absolute inset-0 size-full"
        aria-hidden="true"
      >
        <line x1={13} x2={13} y1={TOP} y2={foot} stroke="var(--ink)" strokeWidth="var(--rail)" />
        <line x1={35} x2={35} y1={TOP} y2={foot} stroke="var(--ink)" strokeWidth="var(--rail)" />
        {rungs.map((rung, index) => (
          <RungBar key={rung.stage} rung={rung} left={13} right={35} y={yOf(index)} />
        ))}
        {rungs.map((rung, index) =>
          rung.stage === notch ? (
            <path
              key={rung.stage}
              d={side === "right" ? `M1 ${yOf(index) - 7} v14 l7 -7 z` : `M47 ${yOf(index) - 7} v14 l-7 -7 z`}
              fill="var(--ink)"
            />
          ) : null,
        )}
        {(door || stopped) && (
          <line x1={5} x2={43} y1={foot + 4} y2={foot + 4} stroke="var(--ink)" strokeWidth={4} />
        )}
        {stopped && (
          <line
            x1={5}
            x2={43}
            y1={foot + 12}
            y2={foot + 12}
            stroke="var(--ink)"
            strokeWidth={8}
            strokeDasharray="4 4"
          />
        )}
        {door &&
          Array.from({ length: door.of }, (_, index) => (
            <circle
              key={index}
              cx={24}
              cy={HEIGHT - 12 - 24 * index}
              r={7}
              fill={index < door.answered ? "var(--ink)" : "none"}
              stroke={index < door.answered ? "var(--ink)" : "var(--rule)"}
              strokeWidth={2}
            />
          ))}
      </svg>
      <LadderList rungs={rungs} />
    </button>
  );
}
