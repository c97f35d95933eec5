import { acceptInvite, readInvite } from "@emberladder/contract";
import { useQuery } from "@tanstack/react-query";
import { useState } from "react";
import { useTranslation } from "react-i18next";
import { useParams } from "react-router-dom";
import { Form } from "#components/forms/form.tsx";
import { PasswordField } from "#components/forms/password-field.tsx";
import { TextField } from "#components/forms/text-field.tsx";
import { ActLink } from "#components/ui/act.tsx";
import { Facts } from "#components/ui/facts.tsx";
import { LoadingNote, ProblemNote } from "#components/ui/list-states.tsx";
import { callApi } from "#lib/api-client.ts";
import { paths } from "#lib/paths.ts";
import { SignInFrame } from "./sign-in-frame.tsx";

const schema = acceptInvite.body.omit({ token: true });

/** Accepts an invitation: says what it is for, asks for the name and a password, then signs in. */
export function InviteScreen() {
  const { t } = useTranslation();
  const { token = "" } = useParams();
  const [isDone, setDone] = useState(false);
  const invite = useQuery({
    queryKey: ["invite", token],
    queryFn: () => callApi(readInvite, { body: { token } }),
    staleTime: Infinity,
  });
  if (isDone) {
    return (
      <SignInFrame title={t("desk:invite.doneTitle")} line={t("desk:invite.doneLine")}>
        <ActLink kind="solid" to={paths.signIn}>
          {t("desk:signIn.title")}
        </ActLink>
      </SignInFrame>
    );
  }
  if (invite.isPending) return <LoadingNote />;
  if (invite.isError) {
    return (
      <SignInFrame title={t("desk:invite.title")}>
        <ProblemNote problem={invite.error} onRetry={() => void invite.refetch()} />
      </SignInFrame>
    );
  }
  const { companyName, name, email, role } = invite.data;
  return (
    <SignInFrame title={t("desk:invite.welcome", { company: companyName })}>
      <Facts
        rows={[
          { name: t("desk:signIn.email"), value: email },
          { name: t("desk:team.role"), value: t(`desk:roles.${role}`) },
        ]}
      />
      <Form
        schema={schema}
        defaults={{ name, password: "" }}
        submitLabel={t("desk:invite.submit")}
        onSubmit={async (values) => {
          await callApi(acceptInvite, { body: { token, ...values } });
          setDone(true);
        }}
      >
        <TextField name="name" label={t("desk:team.name")} autoComplete="name" />
        <PasswordField
          name="password"
          label={t("desk:password.new")}
          hint={t("desk:password.hint")}
          autoComplete="new-password"
        />
      </Form>
    </SignInFrame>
  );
}
