import { useEffect } from "react";
import { Navigate, Outlet, useLocation } from "react-router-dom";
import { paths } from "#lib/paths.ts";
import { useSession } from "#lib/session.tsx";

/**
 * Lets signed-in people through and sends the others to sign in, remembering where they wanted to go. A
 * session that still owes its two-step code goes to the sign-in screen too.
 */
export function RequireSession() {
  const { me } = useSession();
  const location = useLocation();
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
      },
    );
    return () => {
      left = true;
      stop?.();
    };
  }, [personId, deviceId]);
  if (me === undefined) return null;
  if (me === null || me.twoStep === "needed" || me.twoStep === "set-up-needed") {
    return <Navigate to={paths.signIn} replace state={{ from: location.pathname + location.search }} />;
  }
  return <Outlet />;
}
