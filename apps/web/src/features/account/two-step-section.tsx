import { renewRecoveryCodes, turnOffTwoStep, TWO_STEP_ROLES } from "@emberladder/contract";
import type { Me } from "@emberladder/contract";
import { useState } from "react";
import { useTranslation } from "react-i18next";
import { Form } from "#components/forms/form.tsx";
import { PasswordField } from "#components/forms/password-field.tsx";
import { TextField } from "#components/forms/text-field.tsx";
import { RecoveryCodes } from "#components/two-step/recovery-codes.tsx";
import { SetUpTwoStep } from "#components/two-step/set-up-two-step.tsx";
import { ActButton } from "#components/ui/act.tsx";
import { Section } from "#components/ui/page-head.tsx";
import { callApi } from "#lib/api-client.ts";
import { useMe, useSession } from "#lib/session.tsx";

type Doing = "nothing" | "set-up" | "renew" | "turn-off";

/** Two-step codes: on, off where the role allows it, and new recovery codes. */
export function TwoStepSection() {
  const { t } = useTranslation();
  const me = useMe();
  const { set } = useSession();
  const [doing, setDoing] = useState<Doing>("nothing");
  const [made, setMade] = useState<{ recoveryCodes: string[]; me: Me } | null>(null);
  const isOn = me.twoStep === "passed";
  const isRequired = TWO_STEP_ROLES.includes(me.person.role);
  const leave = (
    <ActButton kind="words" onClick={() => setDoing("nothing")}>
      {t("desk:form.leave")}
    </ActButton>
  );
  if (made) {
    const keep = () => {
      set(made.me);
      setMade(null);
      setDoing("nothing");
    };
    return (
      <Section title={t("desk:twoStep.recoveryTitle")}>
        <div className="max-w-110">
          <RecoveryCodes codes={made.recoveryCodes} onKept={keep} />
        </div>
      </Section>
    );
  }
  return (
    <Section
      title={t("desk:twoStep.title")}
      note={t(isOn ? (isRequired ? "desk:twoStep.onRequired" : "desk:twoStep.on") : "desk:twoStep.off")}
    >
      <div className="max-w-110">
        {doing === "nothing" && (
          <div className="flex flex-wrap gap-3">
            {!isOn && <ActButton onClick={() => setDoing("set-up")}>{t("desk:twoStep.setUp")}</ActButton>}
            {isOn && <ActButton onClick={() => setDoing("renew")}>{t("desk:twoStep.renew")}</ActButton>}
            {isOn && !isRequired && (
              <ActButton onClick={() => setDoing("turn-off")}>{t("desk:twoStep.turnOff")}</ActButton>
            )}
          </div>
        )}
        {doing === "set-up" && (
          <>
            <SetUpTwoStep onConfirmed={setMade} />
            {leave}
          </>
        )}
        {doing === "renew" && (
          <Form
            schema={renewRecoveryCodes.body}
            defaults={{ code: "" }}
            submitLabel={t("desk:twoStep.renew")}
            aside={leave}
            onSubmit={async (body) => setMade(await callApi(renewRecoveryCodes, { body }))}
          >
            <TextField
              name="code"
              label={t("desk:signIn.code")}
              hint={t("desk:twoStep.renewHint")}
              inputMode="numeric"
              autoComplete="one-time-code"
            />
          </Form>
        )}
        {doing === "turn-off" && (
          <Form
            schema={turnOffTwoStep.body}
            defaults={{ password: "", code: "" }}
            submitLabel={t("desk:twoStep.turnOff")}
            aside={leave}
            onSubmit={async (body) => {
              set(await callApi(turnOffTwoStep, { body }));
              setDoing("nothing");
            }}
          >
            <PasswordField
              name="password"
              label={t("desk:password.current")}
              autoComplete="current-password"
            />
            <TextField
              name="code"
              label={t("desk:signIn.code")}
              inputMode="numeric"
              autoComplete="one-time-code"
            />
          </Form>
        )}
      </div>
    </Section>
  );
}
