import type { Role } from "@emberladder/contract";
import type { Database } from "@emberladder/db";
import { Lucia, TimeSpan } from "lucia";
import type { Actor } from "#http/actor.ts";
import type { Dependencies } from "#http/dependencies.ts";
import { HashedSessionAdapter, hashSessionToken } from "./hashed-session-adapter.ts";
import { deleteSession, markSeen, touchSession } from "./repository.ts";
import { judgeSession, sessionLimitsOf } from "./session-limits.ts";

/** The one cookie of the product. `__Host-` binds it to this host, to TLS and to every path. */
export const SESSION_COOKIE = "__Host-emberladder";

interface SessionAttributes {
  /** Only while a session is made: the id by which its person names it. */
  publicId?: string;
  deviceId: string | null;
  createdAt: Date;
  lastUsedAt: Date;
  twoStepPassed: boolean;
  /** Only while a session is made: its absolute end. */
  endsAt?: Date;
}

interface PersonAttributes {
  companyId: string;
  name: string;
  email: string;
  role: Role;
  disabledAt: Date | null;
  totpConfirmedAt: Date | null;
}

declare module "lucia" {
  interface Register {
    Lucia: ReturnType<typeof createLucia>;
    DatabaseSessionAttributes: SessionAttributes;
    DatabaseUserAttributes: PersonAttributes;
  }
}

function createLucia(database: Database) {
  return new Lucia(new HashedSessionAdapter(database), {
    // Lucia's own sliding limit is out of use; `judgeSession` knows the limits of each role.
    sessionExpiresIn: new TimeSpan(30, "d"),
    sessionCookie: {
      name: SESSION_COOKIE,
      expires: true,
      attributes: { secure: true, sameSite: "lax", path: "/" },
    },
    getSessionAttributes: ({ deviceId, createdAt, lastUsedAt, twoStepPassed }) => ({
      deviceId,
      createdAt,
      lastUsedAt,
      twoStepPassed,
    }),
    getUserAttributes: ({ companyId, name, email, role, disabledAt, totpConfirmedAt }) => ({
      companyId,
      name,
      email,
      role,
      disabledAt,
      totpConfirmedAt,
    }),
  });
}

/** Begins, reads and ends sessions. Nothing outside this folder knows Lucia or the cookie. */
export interface SessionKeeper {
  /** The person behind a request's cookies; null without a session, past a limit, or when disabled. */
  readActor(cookieHeader: string, now: Date): Promise<Actor | null>;
  /** Begins a session with a new secret. The cookie is the value for `Set-Cookie`. */
  begin(session: {
    personId: string;
    role: Role;
    deviceId: string | null;
    twoStepPassed: boolean;
    now: Date;
  }): Promise<{ cookie: string; sessionHash: string }>;
  /** The `Set-Cookie` value that removes the cookie. */
  blankCookie(): string;
}

/** Makes the keeper of sessions over a database. */
export function createSessionKeeper({
  database,
  newId,
}: Pick<Dependencies, "database" | "newId">): SessionKeeper {
  const lucia = createLucia(database);
  return {
    readActor: async (cookieHeader, now) => {
      const token = lucia.readSessionCookie(cookieHeader);
      // Lucia's tokens are 40 characters of base32; anything else needs no look into the database.
      if (token === null || !/^[a-z2-7]{40}$/.test(token)) return null;
      const { session, user } = await lucia.validateSession(token);
      if (!session || !user) return null;
      const sessionHash = hashSessionToken(token);
      const verdict = judgeSession({ ...session, role: user.role }, now);
      if (verdict.isOver || user.disabledAt !== null) {
        await deleteSession(database, sessionHash);
        return null;
      }
      if (verdict.shouldTouch) await touchSession(database, { sessionHash, personId: user.id, now });
      return {
        personId: user.id,
        companyId: user.companyId,
        role: user.role,
        name: user.name,
        email: user.email,
        sessionHash,
        deviceId: session.deviceId,
        twoStepPassed: session.twoStepPassed,
        hasTwoStep: user.totpConfirmedAt !== null,
      };
    },
    begin: async ({ personId, role, deviceId, twoStepPassed, now }) => {
      const endsAt = new Date(now.getTime() + sessionLimitsOf(role).absoluteMs);
      const session = await lucia.createSession(personId, {
        publicId: newId(),
        deviceId,
        createdAt: now,
        lastUsedAt: now,
        twoStepPassed,
        endsAt,
      });
      // A password alone does not show who is here where a code is still owed.
      if (twoStepPassed) await markSeen(database, personId, now);
      const cookie = lucia.createSessionCookie(session.id);
      cookie.attributes.maxAge = Math.floor(sessionLimitsOf(role).absoluteMs / 1000);
      return { cookie: cookie.serialize(), sessionHash: hashSessionToken(session.id) };
    },
    blankCookie: () => lucia.createBlankSessionCookie().serialize(),
  };
}
