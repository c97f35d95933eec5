import type { Me } from "@emberladder/contract";
import { useQueryClient } from "@tanstack/react-query";
import { useEffect, useId, useRef } from "react";
import { useTranslation } from "react-i18next";
import { Form } from "#components/forms/form.tsx";
import { PasswordField } from "#components/forms/password-field.tsx";
import { ActButton } from "#components/ui/act.tsx";
import { callApi } from "#lib/api-client.ts";
import { describeDevice, lastDeviceId } from "#lib/device-name.ts";
import { leaveSession } from "#lib/enter-session.ts";
import { signIn } from "#lib/shell-routes.ts";
import { CodeStep } from "./code-step.tsx";
import { signInSchema } from "./sign-in-schema.ts";

/**
 * Asks the same person for the password again, and the code where one is needed, over the page they were on:
 * what is typed there stays. Somebody else has to begin at the sign-in screen, and gives it up.
 */
export function SignInAgainDialog({
  person,
  owesCode,
  onSignedIn,
  onClose,
}: {
  person: Me["person"];
  /** The password is given; the two-step code is still owed. */
  owesCode: boolean;
  onSignedIn: (me: Me) => void;
  onClose: () => void;
}) {
  const { t } = useTranslation();
  const client = useQueryClient();
  const titleId = useId();
  const dialog = useRef<HTMLDialogElement>(null);
  useEffect(() => {
    const before = document.activeElement;
    dialog.current?.showModal();
    return () => {
      if (before instanceof HTMLElement) before.focus();
    };
  }, []);
  const takeOver = (me: Me) => {
    // Not forgotten as at a sign-in of somebody new: the page underneath goes on with what it read.
    client.setQueryData(["me"], me);
    if (me.twoStep !== "needed") onSignedIn(me);
  };
  return (
    <dialog
      ref={dialog}
      aria-labelledby={titleId}
      onClose={onClose}
      className="m-auto w-[min(30rem,calc(100vw-2rem))] rounded border-3 border-ink bg-surface p-5 text-ink shadow-float backdrop:bg-ink/50"
    >
      <h2 id={titleId} className="text-question">
        {t("desk:signIn.againTitle")}
      </h2>
      <p className="mt-1 mb-4 text-field text-quiet desk:text-desk">
        {t("desk:signIn.againNote", { name: person.name, email: person.email })}
      </p>
      {owesCode ? (
        <CodeStep onVerified={takeOver} />
      ) : (
        <>
          <Form
            schema={signInSchema}
            defaults={{ email: person.email, password: "" }}
            submitLabel={t("desk:signIn.submit")}
            isForSignIn
            onSubmit={async (values) => {
              const device = { id: lastDeviceId(), name: describeDevice() };
              takeOver(await callApi(signIn, { body: { ...values, device } }));
            }}
          >
            <PasswordField
              name="password"
              label={t("desk:signIn.password")}
              autoComplete="current-password"
            />
          </Form>
          <div className="mt-3 flex flex-wrap gap-x-6">
            <ActButton kind="words" onClick={() => leaveSession(client)}>
              {t("desk:signIn.somebodyElse")}
            </ActButton>
            <ActButton kind="words" onClick={() => dialog.current?.close()}>
              {t("desk:signIn.notNow")}
            </ActButton>
          </div>
        </>
      )}
    </dialog>
  );
}
