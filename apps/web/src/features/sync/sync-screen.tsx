import { useTranslation } from "react-i18next";
import { ActButton } from "#components/ui/act.tsx";
import { EmptyNote } from "#components/ui/list-states.tsx";
import { PageHead, Section } from "#components/ui/page-head.tsx";
import { saveFile } from "#lib/save-file.ts";
import { useMe, useSession } from "#lib/session.tsx";
import { formatMoment } from "#lib/site-time.ts";
import { requestSend } from "#lib/store/sender.ts";
import { useSaved } from "#lib/store/use-saved.ts";
import { exportWaiting } from "./export-waiting.ts";
import { retryDiagnosis } from "./retry-diagnosis.ts";
import { useWaiting } from "./use-waiting.ts";
import { WaitingItem } from "./waiting-item.tsx";

/** What of the record is only on this phone: what waits, what was refused and why, and a way to keep a copy. */
export function SyncScreen() {
  const { t } = useTranslation();
  const { person, company } = useMe();
  const session = useSession();
  const saved = useSaved();
  const waiting = useWaiting();
  const save = async () => saveFile("emberladder-waiting.json", "application/json", await exportWaiting());
  return (
    <>
      <PageHead
        title={t("desk:sync.title")}
        line={
          saved.onServerAt
            ? t("desk:sync.lastSent", { at: formatMoment(saved.onServerAt, company.timeZone) })
            : t(`desk:sync.kinds.${saved.kind}`)
        }
        acts={
          waiting &&
          waiting.length > 0 && <ActButton onClick={() => void save()}>{t("desk:sync.export")}</ActButton>
        }
      />
      {waiting?.length === 0 && <EmptyNote title={t("desk:sync.none")} note={t("desk:sync.noneNote")} />}
      {waiting && waiting.length > 0 && (
        <Section
          title={t("desk:sync.waiting", { count: saved.waiting })}
          note={t(`desk:sync.kinds.${saved.kind}`)}
          acts={
            saved.kind === "needs-sign-in" ? (
              // The session ended on the server; giving it up here leads to the form and back to this screen.
              <ActButton kind="solid" onClick={() => session.set(null)}>
                {t("desk:signIn.submit")}
              </ActButton>
            ) : (
              <ActButton onClick={requestSend}>{t("desk:sync.sendNow")}</ActButton>
            )
          }
        >
          <ul>
            {waiting.map((item) => (
              <WaitingItem
                key={`${item.diagnosisId} ${item.authorId}`}
                item={item}
                isOwn={item.authorId === person.id}
                onRetry={() => void retryDiagnosis(item.diagnosisId)}
              />
            ))}
          </ul>
        </Section>
      )}
    </>
  );
}
