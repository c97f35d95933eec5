import { stageOfSight } from "@emberladder/furnace";
import type { Sight, Span, Stage } from "@emberladder/furnace";
import { useTranslation } from "react-i18next";
import { LinkButton, PlainButton, PrimaryButton } from "#components/ui/button.tsx";
import { formatClock } from "#lib/use-now.ts";

type End = "flame-lost" | "no-flame" | "no-glow" | "limit-cut" | "satisfied";

/**
 * The one act that ends the watch, by what was seen last. "No glow" is armed from the end of the purge, because
 * gas opens next; before that the place says when it will arm.
 */
export function EndActs({
  elapsed,
  highest,
  sights,
  due,
  onEnd,
  onStays,
  onNothing,
}: {
  elapsed: number;
  highest: Sight | undefined;
  sights: readonly Sight[];
  due: Partial<Record<Stage, Span>>;
  onEnd: (how: End) => void;
  onStays: () => void;
  onNothing: () => void;
}) {
  const { t } = useTranslation();
  const source = sights.find((sight) => sight === "glow" || sight === "spark");
  const reached = highest ? sights.indexOf(highest) : -1;
  const sourceAt = source ? sights.indexOf(source) : -1;
  const purgeEnds = due.prepurge?.least ?? 0;

  if (highest === "blower") {
    return (
      <div className="flex flex-col gap-2">
        <PrimaryButton onClick={() => onEnd("limit-cut")} detail={t("watch.limitCutDetail")}>
          {t("watch.limitCut")}
        </PrimaryButton>
        <div className="grid grid-cols-2 large-letters:grid-cols-1 gap-2">
          <PlainButton compact onClick={() => onEnd("flame-lost")}>
            {t("watch.flameLost")}
          </PlainButton>
          <PlainButton compact onClick={() => onEnd("satisfied")}>
            {t("watch.satisfied")}
          </PlainButton>
        </div>
      </div>
    );
  }
  if (highest && stageOfSight(highest) !== "inducer" && reached > sourceAt) {
    return (
      <PrimaryButton onClick={() => onEnd("flame-lost")} detail={t("watch.flameLostDetail")}>
        {t("watch.flameLost")}
      </PrimaryButton>
    );
  }
  if (source && reached === sourceAt) {
    return (
      <PrimaryButton onClick={() => onEnd("no-flame")} detail={t("watch.noFlameDetail")}>
        {t("watch.noFlame")}
      </PrimaryButton>
    );
  }
  if (!highest) {
    return (
      <PrimaryButton onClick={onNothing} detail={t("watch.nothingDetail")}>
        {t("watch.nothing")}
      </PrimaryButton>
    );
  }
  return (
    <div className="flex flex-col gap-1">
      {elapsed < purgeEnds ? (
        <p className="rounded border-2 border-rule px-3 py-2 text-field text-quiet">
          {t("watch.armsAt", {
            act: t(source === "spark" ? "watch.noSpark" : "watch.noGlow"),
            time: formatClock(purgeEnds),
          })}
        </p>
      ) : (
        <PrimaryButton onClick={() => onEnd("no-glow")} detail={t("watch.noGlowDetail")}>
          {t(source === "spark" ? "watch.noSpark" : "watch.noGlow")}
        </PrimaryButton>
      )}
      <LinkButton onClick={onStays}>{t("watch.stays")}</LinkButton>
    </div>
  );
}
