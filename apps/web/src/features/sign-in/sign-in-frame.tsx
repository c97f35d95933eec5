import type { ReactNode } from "react";
import { useTranslation } from "react-i18next";
import { SchemeSwitch } from "#components/ui/scheme-switch.tsx";
import { Wordmark } from "#components/ui/wordmark.tsx";
import { useTitle } from "#lib/use-title.ts";

const RUNGS = [...Array(14).keys()];

/** Frame of the screens before sign-in: a cold ladder at the side, the name, one heading, one form. */
export function SignInFrame({
  title,
  line,
  children,
}: {
  title: string;
  line?: ReactNode;
  children: ReactNode;
}) {
  const { t } = useTranslation();
  useTitle(title);
  return (
    <div className="flex min-h-dvh">
      <div
        aria-hidden="true"
        className="flex w-20 shrink-0 large-letters:hidden justify-center border-r border-hair bg-surface desk:w-64"
      >
        <div className="my-2 flex w-12 flex-col justify-evenly border-x-(length:--rail) border-ink desk:w-32">
          {RUNGS.map((rung) => (
            <span key={rung} className="-mx-0.5 border-t-2 border-rule" />
          ))}
        </div>
      </div>
      <main className="min-w-0 grow p-4 desk:flex desk:items-center desk:px-24">
        <div className="mx-auto flex max-w-110 flex-col gap-5 desk:mx-0 desk:w-110">
          <div className="flex flex-wrap items-start justify-between gap-3">
            <div>
              <Wordmark />
              <p className="text-field text-quiet">{t("desk:signIn.line")}</p>
            </div>
            <SchemeSwitch />
          </div>
          <div>
            <h1 className="text-question">{title}</h1>
            {line && <div className="mt-1 text-field text-quiet desk:text-desk">{line}</div>}
          </div>
          {children}
        </div>
      </main>
    </div>
  );
}
