import { useTranslation } from "react-i18next";
import { PlainButton } from "#components/ui/button.tsx";
import { formatClock, useNow } from "#lib/use-now.ts";

/** A wait that the trade asks for: started by hand, counting down, told by words when it is over. */
export function StepTimer({
  label,
  seconds,
  since,
  onStart,
}: {
  label: string;
  seconds: number;
  since: number | null;
  onStart: () => void;
}) {
  const { t } = useTranslation();
  const now = useNow(since !== null);
  if (since === null) return <PlainButton onClick={onStart}>{t("timer.start", { label })}</PlainButton>;
  const left = seconds - (now - since) / 1000;
  return (
    <p className="flex items-baseline justify-between gap-3 border-2 border-rule bg-surface px-3 py-2 text-field font-semibold">
      <span>{label}</span>
      <span className="numeric text-[1.75rem]" role="timer">
        {left > 0 ? formatClock(left) : t("timer.over")}
      </span>
    </p>
  );
}
