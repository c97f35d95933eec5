import { useTranslation } from "react-i18next";
import { Link } from "react-router-dom";
import { ActButton } from "#components/ui/act.tsx";
import { paths } from "#lib/paths.ts";
import { useMe } from "#lib/session.tsx";
import { formatMoment } from "#lib/site-time.ts";
import type { Waiting } from "./use-waiting.ts";

/** One diagnosis that has something to send: where, how much, since when, and why not yet. */
export function WaitingItem({
  item,
  isOwn,
  onRetry,
}: {
  item: Waiting;
  isOwn: boolean;
  onRetry: () => void;
}) {
  const { t, i18n } = useTranslation();
  const { company } = useMe();
  const reason = (code: string) =>
    i18n.exists(`desk:rejections.${code}`)
      ? t(`desk:rejections.${code}`)
      : t("desk:rejections.other", { code });
  return (
    <li className="flex flex-col gap-2 border-b border-hair py-3 last:border-b-0">
      <div className="flex flex-wrap items-center justify-between gap-3">
        <div>
          <Link
            to={paths.diagnosis.next(item.diagnosisId)}
            className="inline-flex min-h-12 items-center text-field font-semibold desk:min-h-8 desk:text-desk"
          >
            {item.place ? `${item.place.unitName}, ${item.place.address}` : t("desk:sync.unknownPlace")}
          </Link>
          <p className="text-field text-quiet desk:text-desk">
            {t("desk:sync.steps", { count: item.count })},{" "}
            {t("desk:sync.since", { at: formatMoment(item.since, company.timeZone) })}
          </p>
          {!isOwn && <p className="text-field font-medium desk:text-desk">{t("desk:sync.other")}</p>}
        </div>
        {item.problems.length > 0 && isOwn && <ActButton onClick={onRetry}>{t("desk:sync.retry")}</ActButton>}
      </div>
      {item.problems.map((problem) => (
        <p
          key={problem.code}
          className="border-l-6 border-ink bg-surface px-3 py-2 text-field desk:text-desk"
        >
          <strong className="font-semibold">{reason(problem.code)}</strong> {problem.detail}
        </p>
      ))}
    </li>
  );
}
