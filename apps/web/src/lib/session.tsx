import { can } from "@emberladder/contract";
import type { Me, Permission } from "@emberladder/contract";
import { useQuery, useQueryClient } from "@tanstack/react-query";
import { createContext, useContext, useEffect, useMemo } from "react";
import type { ReactNode } from "react";
import { ApiProblem, callApi } from "./api-client.ts";
import { readMe } from "./shell-routes.ts";

const KEY = ["me"];
const STORED = "emberladder.me";

/** Who is signed in, as the screens need it. */
export interface Session {
  /** Undefined while it is being asked for; null when nobody is. */
  me: Me | null | undefined;
  /** The server was not reached; `me` is who was signed in here last. */
  offline: boolean;
  can: (permission: Permission) => boolean;
  set: (me: Me | null) => void;
}

const SessionContext = createContext<Session | null>(null);

function readStored(): Me | null {
  try {
    return JSON.parse(localStorage.getItem(STORED) ?? "null") as Me | null;
  } catch {
    return null;
  }
}

/**
 * Asks once who is signed in and keeps the answer, so that a phone without signal still knows whose record it
 * keeps. Being signed out here is not a sign-out on the server: the outbox stays.
 */
export function SessionProvider({ children }: { children: ReactNode }) {
  const client = useQueryClient();
  const { data, error, isPending } = useQuery({
    queryKey: KEY,
    queryFn: ({ signal }) =>
      callApi(readMe, { signal }).catch((problem: unknown) => {
        if (problem instanceof ApiProblem && problem.status === 401) return null;
        throw problem;
      }),
    staleTime: 60_000,
    retry: false,
  });
  const offline = error instanceof ApiProblem && error.code === "offline";
  const me = data === undefined ? (isPending ? undefined : readStored()) : data;
  useEffect(() => {
    if (data === undefined) return;
    if (data) localStorage.setItem(STORED, JSON.stringify(data));
    else localStorage.removeItem(STORED);
  }, [data]);
  const session = useMemo<Session>(
    () => ({
      me,
      offline,
      can: (permission) => (me ? can(me.person.role, permission) : false),
      set: (next) => client.setQueryData(KEY, next),
    }),
    [me, offline, client],
  );
  return <SessionContext.Provider value={session}>{children}</SessionContext.Provider>;
}

/**
 * Lets what is below go on as the person who was on the page, while their session has ended and they are asked to
 * sign in again: nothing they typed is lost. The server refuses whatever it is asked meanwhile.
 */
export function HeldSession({ me, children }: { me: Me; children: ReactNode }) {
  const session = useSession();
  const held = useMemo<Session>(
    () =>
      session.me === me ? session : { ...session, me, can: (permission) => can(me.person.role, permission) },
    [session, me],
  );
  return <SessionContext.Provider value={held}>{children}</SessionContext.Provider>;
}

/** The session; only below `SessionProvider`. */
export function useSession(): Session {
  const session = useContext(SessionContext);
  if (!session) throw new Error("useSession is used outside of SessionProvider.");
  return session;
}

/** The person signed in, on screens that are only reached signed in. */
export function useMe(): Me {
  const { me } = useSession();
  if (!me) throw new Error("useMe is used on a screen for signed-out people.");
  return me;
}
