import { signOut } from "@emberladder/contract";
import { useQueryClient } from "@tanstack/react-query";
import { useTranslation } from "react-i18next";
import { ActButton, ActLink } from "#components/ui/act.tsx";
import { ActProblem } from "#components/ui/act-problem.tsx";
import { Facts } from "#components/ui/facts.tsx";
import { PageHead, Section } from "#components/ui/page-head.tsx";
import { callApi } from "#lib/api-client.ts";
import { leaveSession } from "#lib/enter-session.ts";
import { paths } from "#lib/paths.ts";
import { useMe, useSession } from "#lib/session.tsx";
import { useAct } from "#lib/use-act.ts";
import { AppearanceSection } from "./appearance-section.tsx";
import { DevicesSection } from "./devices-section.tsx";
import { PasswordSection } from "./password-section.tsx";
import { SessionsSection } from "./sessions-section.tsx";
import { TwoStepSection } from "./two-step-section.tsx";

/** What belongs to the person signed in: how they get in, from where, and how the screens look to them. */
export function AccountScreen() {
  const { t } = useTranslation();
  const { person, company } = useMe();
  const { can } = useSession();
  const client = useQueryClient();
  const act = useAct();
  const leave = async () => {
    await callApi(signOut);
    leaveSession(client);
  };
  return (
    <>
      <PageHead
        title={t("desk:account.title")}
        line={t("desk:account.line", { name: person.name, company: company.name })}
        acts={
          <>
            <ActLink to={paths.sync}>{t("desk:sync.title")}</ActLink>
            {can("company:read") && <ActLink to={paths.settings}>{t("desk:settings.title")}</ActLink>}
            <ActButton onClick={() => act.run(leave)}>{t("desk:account.signOut")}</ActButton>
          </>
        }
      />
      <ActProblem problem={act.problem} />
      <Section title={t("desk:account.who")}>
        <Facts
          rows={[
            { name: t("desk:team.name"), value: person.name },
            { name: t("desk:signIn.email"), value: person.email },
            { name: t("desk:team.role"), value: t(`desk:roles.${person.role}`) },
          ]}
        />
      </Section>
      <AppearanceSection />
      <PasswordSection />
      <TwoStepSection />
      <SessionsSection />
      <DevicesSection />
    </>
  );
}
