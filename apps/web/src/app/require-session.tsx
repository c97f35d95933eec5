import type { Me } from "@emberladder/contract";
import { useEffect, useState } from "react";
import { Navigate, Outlet, useLocation } from "react-router-dom";
import { useHalfTyped } from "#lib/half-typed.ts";
import { paths } from "#lib/paths.ts";
import { HeldSession, useSession } from "#lib/session.tsx";
import { useSignInAsked } from "#lib/sign-in-again.ts";
import { HoldSession } from "./hold-session.tsx";
import { keepFieldScreens } from "./keep-field-screens.ts";

/**
 * Lets signed-in people through and sends the others to sign in, remembering where they wanted to go. A
 * session that still owes its two-step code goes to the sign-in screen too. Nobody is sent away from a visit,
 * whose record is kept on this phone anyway, or from a form that is half filled in: there the person signs in
 * again over the page.
 */
export function RequireSession() {
  const { me } = useSession();
  const location = useLocation();
  const isHalfTyped = useHalfTyped();
  const isAsked = useSignInAsked();
  const [last, setLast] = useState<Me | null>(null);
  const isSignedIn = me !== undefined && me !== null && !owesTwoStep(me);
  if (isSignedIn && me !== last) setLast(me);
  const personId = me?.person.id;
  const deviceId = me?.deviceId;
  useEffect(() => {
    if (!personId || !deviceId) return undefined;
    let stop: (() => void) | undefined;
    let left = false;
    // The store and its sender come after the shell has painted.
    void Promise.all([import("#lib/store/sender.ts"), import("#lib/store/device.ts")]).then(
      async ([sender, device]) => {
        await device.rememberDevice(personId, deviceId);
        if (left) return;
        sender.startSender(personId);
        stop = sender.stopSender;
        void keepFieldScreens();
      },
    );
    return () => {
      left = true;
      stop?.();
    };
  }, [personId, deviceId]);
  const isOnVisit = location.pathname.startsWith("/diagnoses/");
  const mayStay = (isHalfTyped || isAsked || isOnVisit) && me?.twoStep !== "set-up-needed";
  const shown = isSignedIn ? me : mayStay ? last : null;
  if (shown) {
    return (
      <HeldSession me={shown}>
        <Outlet />
        <HoldSession
          person={shown.person}
          isOver={!isSignedIn && isHalfTyped}
          owesCode={me?.twoStep === "needed"}
        />
      </HeldSession>
    );
  }
  if (me === undefined) return null;
  return <Navigate to={paths.signIn} replace state={{ from: location.pathname + location.search }} />;
}

function owesTwoStep({ twoStep }: Me): boolean {
  return twoStep === "needed" || twoStep === "set-up-needed";
}
