import { checkFirstRun, finishFirstRun } from "@emberladder/contract";
import { useQuery } from "@tanstack/react-query";
import { useState } from "react";
import { useTranslation } from "react-i18next";
import { useParams } from "react-router-dom";
import { CompanyFields } from "#components/forms/company-fields.tsx";
import { Form } from "#components/forms/form.tsx";
import { PasswordField } from "#components/forms/password-field.tsx";
import { TextField } from "#components/forms/text-field.tsx";
import { ActLink } from "#components/ui/act.tsx";
import { LoadingNote, ProblemNote } from "#components/ui/list-states.tsx";
import { Wordmark } from "#components/ui/wordmark.tsx";
import { callApi } from "#lib/api-client.ts";
import { paths } from "#lib/paths.ts";
import { useTitle } from "#lib/use-title.ts";
import type { ReactNode } from "react";

const schema = finishFirstRun.body.omit({ token: true });

/** Sets up an empty installation by the link it printed: the company, and its first supervisor. */
export function FirstRunScreen() {
  const { t } = useTranslation();
  const { token = "" } = useParams();
  const [isDone, setDone] = useState(false);
  const check = useQuery({
    queryKey: ["first-run", token],
    queryFn: () => callApi(checkFirstRun, { body: { token } }),
    staleTime: Infinity,
  });
  if (isDone) {
    return (
      <Frame title={t("desk:firstRun.doneTitle")} line={t("desk:firstRun.doneLine")}>
        <ActLink kind="solid" to={paths.signIn}>
          {t("desk:signIn.title")}
        </ActLink>
      </Frame>
    );
  }
  if (check.isPending) return <LoadingNote />;
  if (check.isError) {
    return (
      <Frame title={t("desk:firstRun.title")}>
        <ProblemNote problem={check.error} onRetry={() => void check.refetch()} />
      </Frame>
    );
  }
  return (
    <Frame title={t("desk:firstRun.title")} line={t("desk:firstRun.line")}>
      <Form
        schema={schema}
        defaults={{
          company: {
            name: "",
            timeZone: new Intl.DateTimeFormat().resolvedOptions().timeZone,
            altitudeRule: "4-above-2000",
            unitsShown: "inch-pound",
          },
          supervisor: { name: "", email: "", password: "" },
        }}
        submitLabel={t("desk:firstRun.submit")}
        onSubmit={async (values) => {
          await callApi(finishFirstRun, { body: { token, ...values } });
          setDone(true);
        }}
      >
        <h2 className="text-field font-semibold">{t("desk:firstRun.company")}</h2>
        <CompanyFields prefix="company." />
        <h2 className="mt-3 border-t-2 border-ink pt-4 text-field font-semibold">
          {t("desk:firstRun.supervisor")}
        </h2>
        <TextField name="supervisor.name" label={t("desk:team.name")} autoComplete="name" />
        <TextField
          name="supervisor.email"
          type="email"
          label={t("desk:signIn.email")}
          autoComplete="username"
          inputMode="email"
        />
        <PasswordField
          name="supervisor.password"
          label={t("desk:password.new")}
          hint={t("desk:password.supervisorHint")}
          autoComplete="new-password"
        />
      </Form>
    </Frame>
  );
}

function Frame({ title, line, children }: { title: string; line?: string; children: ReactNode }) {
  useTitle(title);
  return (
    <main className="mx-auto flex max-w-150 flex-col gap-5 p-4 desk:py-10">
      <Wordmark />
      <div>
        <h1 className="text-question">{title}</h1>
        {line && <p className="mt-1 text-field text-quiet desk:text-desk">{line}</p>}
      </div>
      {children}
    </main>
  );
}
