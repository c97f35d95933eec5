import { cancelCall } from "@emberladder/contract";
import type { CallDetail } from "@emberladder/contract";
import { useQueryClient } from "@tanstack/react-query";
import { useState } from "react";
import { useTranslation } from "react-i18next";
import { ActProblem } from "#components/ui/act-problem.tsx";
import { ActButton } from "#components/ui/act.tsx";
import { ConfirmDialog } from "#components/ui/confirm-dialog.tsx";
import { callApi } from "#lib/api-client.ts";
import { useAct } from "#lib/use-act.ts";

/** Gives up a call on which nothing was begun, after asking once more. */
export function CancelCall({ call }: { call: CallDetail }) {
  const { t } = useTranslation();
  const client = useQueryClient();
  const act = useAct();
  const [asks, setAsks] = useState(false);
  const cancel = async () => {
    await callApi(cancelCall, { params: { callId: call.id }, body: { version: call.version } });
    await client.invalidateQueries({ queryKey: ["kept"] });
  };
  return (
    <div>
      <ActButton onClick={() => setAsks(true)}>{t("desk:call.cancel")}</ActButton>
      <ActProblem problem={act.problem} />
      {asks && (
        <ConfirmDialog
          title={t("desk:call.cancelTitle", { number: call.number })}
          confirmLabel={t("desk:call.cancelConfirm")}
          onConfirm={() => act.run(cancel)}
          onClose={() => setAsks(false)}
        >
          {t("desk:call.cancelNote")}
        </ConfirmDialog>
      )}
    </div>
  );
}
