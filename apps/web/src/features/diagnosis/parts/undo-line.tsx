import { command, lastUndoable } from "@emberladder/diagnosis";
import { useTranslation } from "react-i18next";
import { LinkButton } from "#components/ui/button.tsx";
import { useDiagnosis } from "../diagnosis-context.tsx";

/** The last thing recorded, and a tap to take it back. It stays in the record, struck through. */
export function UndoLine() {
  const { t } = useTranslation();
  const { state, recordAndGoOn } = useDiagnosis();
  const last = lastUndoable(state);
  if (!last) return null;
  return (
    <p className="flex items-center justify-between gap-3 border-t-1 border-hair pt-1 text-field text-quiet">
      <span className="min-w-0">{t("undo.recorded", { what: t(`undo.what.${last.type}`) })}</span>
      <span className="shrink-0 whitespace-nowrap large-letters:shrink large-letters:whitespace-normal">
        <LinkButton onClick={() => void recordAndGoOn([command("event.undone", { of: last.id })])}>
          {t("undo.takeBack")}
        </LinkButton>
      </span>
    </p>
  );
}
