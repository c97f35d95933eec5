import { useTranslation } from "react-i18next";

/**
 * Smell of gas: one line and nothing else. It takes no tap, photo or typing until the person is outside; the
 * one button is at the foot, away from where a thumb rests.
 */
export function LeaveNow({ onOutside }: { onOutside: () => void }) {
  const { t } = useTranslation();
  return (
    <main className="flex min-h-dvh flex-col justify-between bg-stopped p-6 text-on-stopped">
      <h1 className="pt-16 text-[2.25rem] leading-11 font-bold text-balance" role="alert">
        {t("stop.leaveNow")}
      </h1>
      <button
        type="button"
        onClick={onOutside}
        className="min-h-16 w-full rounded border-3 border-on-stopped text-[1.25rem] font-semibold"
      >
        {t("stop.iAmOutside")}
      </button>
    </main>
  );
}
