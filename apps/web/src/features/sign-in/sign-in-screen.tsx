import { useTranslation } from "react-i18next";
import { Navigate, useLocation } from "react-router-dom";
import { paths } from "#lib/paths.ts";
import { useSession } from "#lib/session.tsx";
import { lazy, Suspense, useState } from "react";
import { PasswordStep } from "./password-step.tsx";
import { SignInFrame } from "./sign-in-frame.tsx";

// Most sign-ins need neither, so neither is in the first download.
const CodeStep = lazy(() => import("./code-step.tsx").then((module) => ({ default: module.CodeStep })));
const SetUpStep = lazy(() => import("./set-up-step.tsx").then((module) => ({ default: module.SetUpStep })));

/** Sign-in in up to three steps: password, two-step code, and for roles that need codes their set-up. */
export function SignInScreen() {
  const { t } = useTranslation();
  const { me } = useSession();
  const location = useLocation();
  // The session is complete once the codes are on, but the recovery codes are still to be read.
  const [readsCodes, setReadsCodes] = useState(false);
  const from = readFrom(location.state);
  if (me === undefined) return null;
  if (me && (me.twoStep === "set-up-needed" || readsCodes)) {
    return (
      <SignInFrame
        title={readsCodes ? t("desk:twoStep.recoveryTitle") : t("desk:signIn.setUpTitle")}
        line={readsCodes ? undefined : t("desk:signIn.setUpLine")}
      >
        <Suspense>
          <SetUpStep onCodes={() => setReadsCodes(true)} onDone={() => setReadsCodes(false)} />
        </Suspense>
      </SignInFrame>
    );
  }
  if (me?.twoStep === "needed") {
    return (
      <SignInFrame title={t("desk:signIn.codeTitle")} line={t("desk:signIn.codeLine")}>
        <Suspense>
          <CodeStep />
        </Suspense>
      </SignInFrame>
    );
  }
  if (me) return <Navigate to={from} replace />;
  return (
    <SignInFrame title={t("desk:signIn.title")}>
      <PasswordStep />
    </SignInFrame>
  );
}

/** Where the person wanted to go; only addresses of our own. */
function readFrom(state: unknown): string {
  const from = (state as { from?: unknown } | null)?.from;
  return typeof from === "string" && from.startsWith("/") && !from.startsWith("//") ? from : paths.calls;
}
