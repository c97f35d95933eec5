import type { Permission } from "@emberladder/contract";
import { useTranslation } from "react-i18next";
import { NavLink, Outlet } from "react-router-dom";
import { SchemeSwitch } from "#components/ui/scheme-switch.tsx";
import { Wordmark } from "#components/ui/wordmark.tsx";
import { paths } from "#lib/paths.ts";
import { useMe, useSession } from "#lib/session.tsx";
import { IN_DESK } from "../failed-screen.tsx";

const LINKS: { to: string; word: string; needs?: Permission }[] = [
  { to: paths.calls, word: "nav.calls" },
  { to: paths.review, word: "nav.review", needs: "diagnosis:review" },
  { to: paths.customers, word: "nav.customers", needs: "customer:read" },
  { to: paths.team, word: "nav.team", needs: "person:list" },
  { to: paths.account, word: "nav.account" },
];

/** The frame of all screens outside of a diagnosis: one line of words on top, no side menu. */
export function DeskLayout() {
  const { t } = useTranslation();
  const me = useMe();
  const { can } = useSession();
  return (
    <div className="flex min-h-dvh flex-col">
      <a
        href="#content"
        className="focus-inside sr-only focus:not-sr-only focus:absolute focus:z-10 focus:bg-surface focus:p-3"
      >
        {t("nav.skip")}
      </a>
      <header className="border-b-3 border-ink bg-surface">
        {me.company.mode === "demo" && (
          <p className="border-b border-hair px-4 text-label font-semibold desk:hidden">{t("nav.demo")}</p>
        )}
        <div className="flex min-h-12 items-center gap-x-3 px-4 large-letters:flex-wrap desk:gap-x-6 desk:px-6">
          <Wordmark isShortOnPhone />
          <nav
            aria-label={t("nav.label")}
            className="flex min-w-0 grow overflow-x-auto large-letters:order-1 large-letters:basis-full large-letters:flex-wrap desk:grow-0"
          >
            {LINKS.filter((link) => !link.needs || can(link.needs)).map((link) => (
              <NavLink
                key={link.to}
                to={link.to}
                className={({ isActive }) =>
                  `flex min-h-13 items-center px-3 text-field font-medium whitespace-nowrap text-ink no-underline outline-offset-[-3px] desk:min-h-12 desk:text-desk ${isActive ? "shadow-[inset_0_-6px_0_var(--ink)]" : ""}`
                }
              >
                {t(link.word)}
              </NavLink>
            ))}
          </nav>
          <div className="ml-auto flex items-center gap-3 py-1">
            {me.company.mode === "demo" && (
              <span className="hidden rounded border-2 border-ink px-2 text-small font-semibold whitespace-nowrap desk:inline">
                {t("nav.demo")}
              </span>
            )}
            <span className="hidden text-desk text-quiet desk:inline">{me.company.name}</span>
            <span className="hidden text-desk whitespace-nowrap text-quiet desk:inline">
              {me.person.name}
            </span>
            <SchemeSwitch />
          </div>
        </div>
      </header>
      <main id="content" tabIndex={-1} className="flex grow flex-col outline-none">
        <Outlet context={IN_DESK} />
      </main>
    </div>
  );
}
