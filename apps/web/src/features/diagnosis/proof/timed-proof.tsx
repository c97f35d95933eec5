import { command } from "@emberladder/diagnosis";
import type { ProofItem } from "@emberladder/diagnosis";
import { useState } from "react";
import { useTranslation } from "react-i18next";
import { PlainButton } from "#components/ui/button.tsx";
import { useNow } from "#lib/use-now.ts";
import { useDiagnosis } from "../diagnosis-context.tsx";
import { StepTimer } from "../parts/step-timer.tsx";

/** The draft switch proven to open: inducer unplugged, gas shut, a call that reaches nothing for a minute. */
export function TimedProof({ item, seconds, stays }: { item: ProofItem; seconds: number; stays: boolean }) {
  const { t } = useTranslation();
  const { record, recordAndGoOn } = useDiagnosis();
  const keep = stays ? record : recordAndGoOn;
  const [since, setSince] = useState<number | null>(null);
  const now = useNow(since !== null);
  const waited = since === null ? 0 : (now - since) / 1000;
  return (
    <div className="flex flex-col gap-2">
      <p className="text-field">{t("proof.draftOpensHow")}</p>
      <StepTimer
        label={t("proof.callReachesNothing")}
        seconds={seconds}
        since={since}
        onStart={() => setSince(Date.now())}
      />
      <PlainButton
        disabled={waited < seconds}
        onClick={() =>
          void keep([
            command("proof.recorded", {
              closing: item.id,
              value: Math.floor(waited),
              unit: "s",
              also: { ignitionStarted: false },
            }),
          ])
        }
      >
        {t("proof.nothingStarted")}
      </PlainButton>
    </div>
  );
}
