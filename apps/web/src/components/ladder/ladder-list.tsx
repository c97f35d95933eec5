import type { Rung } from "@emberladder/diagnosis";
import { useTranslation } from "react-i18next";

/** The ladder as words, for screen readers: one item a rung, from the foot up, with its state and reading. */
export function LadderList({ rungs }: { rungs: readonly Rung[] }) {
  const { t } = useTranslation();
  return (
    <ol className="sr-only">
      {rungs.map((rung) => (
        <li key={rung.stage}>
          {t("ladder.item", {
            number: rung.number,
            count: rungs.length,
            name: t(`trade:stages.${rung.stage}.name`),
            state: t(`ladder.states.${rung.state}`),
          })}
          {rung.reading?.inV !== undefined
            ? `, ${t("ladder.inOut", { inV: rung.reading.inV, outV: rung.reading.outV ?? "-" })}`
            : ""}
        </li>
      ))}
    </ol>
  );
}
