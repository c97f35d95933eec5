import { useEffect, useId, useRef } from "react";
import type { ReactNode } from "react";
import { useTranslation } from "react-i18next";
import { ActButton } from "./act.tsx";

/** Asks once more before an act that shuts somebody out or gives something up. Esc and "Keep" do nothing. */
export function ConfirmDialog({
  title,
  children,
  confirmLabel,
  onConfirm,
  onClose,
}: {
  title: string;
  children?: ReactNode;
  confirmLabel: string;
  onConfirm: () => void;
  onClose: () => void;
}) {
  const { t } = useTranslation();
  const titleId = useId();
  const dialog = useRef<HTMLDialogElement>(null);
  useEffect(() => dialog.current?.showModal(), []);
  return (
    <dialog
      ref={dialog}
      aria-labelledby={titleId}
      onClose={onClose}
      className="m-auto w-[min(30rem,calc(100vw-2rem))] rounded border-3 border-ink bg-surface p-5 text-ink shadow-float backdrop:bg-ink/50"
    >
      <h2 id={titleId} className="text-question">
        {title}
      </h2>
      <div className="mt-2 text-field text-quiet desk:text-desk">{children}</div>
      <div className="mt-5 flex flex-wrap gap-4">
        <ActButton
          kind="solid"
          onClick={() => {
            dialog.current?.close();
            onConfirm();
          }}
        >
          {confirmLabel}
        </ActButton>
        <ActButton onClick={() => dialog.current?.close()}>{t("desk:form.keep")}</ActButton>
      </div>
    </dialog>
  );
}
