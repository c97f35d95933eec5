import type { Me } from "@emberladder/contract";
import { useQueryClient } from "@tanstack/react-query";
import { lazy, Suspense, useEffect, useState } from "react";
import { answerSignIn, serveSignIn, useSignInAsked } from "#lib/sign-in-again.ts";

// Seldom needed, so it is not in the first download; without a signal nobody can be signed out.
const SignInAgainDialog = lazy(() =>
  import("#features/sign-in/sign-in-again-dialog.tsx").then((module) => ({
    default: module.SignInAgainDialog,
  })),
);

/**
 * Asks the person of an open page to sign in again where their session has ended: at once where it `isOver`, and
 * again whenever something is sent. Put off, the page stays as it is.
 */
export function HoldSession({
  person,
  isOver,
  owesCode,
}: {
  person: Me["person"];
  isOver: boolean;
  owesCode: boolean;
}) {
  const client = useQueryClient();
  const isAsked = useSignInAsked();
  const [isPutOff, setPutOff] = useState(false);
  useEffect(serveSignIn, []);
  if (!isOver && isPutOff) setPutOff(false);
  if (!isAsked && (!isOver || isPutOff)) return null;
  return (
    <Suspense>
      <SignInAgainDialog
        person={person}
        owesCode={owesCode}
        onSignedIn={() => {
          answerSignIn(true);
          void client.invalidateQueries({ predicate: (query) => query.queryKey[0] !== "me" });
        }}
        onClose={() => {
          setPutOff(true);
          answerSignIn(false);
        }}
      />
    </Suspense>
  );
}
