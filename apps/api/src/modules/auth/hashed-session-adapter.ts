import { createHash } from "node:crypto";
import { people, sessions } from "@emberladder/db";
import type { Database } from "@emberladder/db";
import { DrizzleMySQLAdapter } from "@lucia-auth/adapter-drizzle";
import type { Adapter, DatabaseSession, DatabaseUser } from "lucia";
import { prepareFindSession } from "./repository.ts";

/** The key under which a session's secret is kept: a copy of the table opens no session. */
export function hashSessionToken(token: string): string {
  return createHash("sha256").update(token).digest("hex");
}

/**
 * Lucia keeps a session under its secret as it is. This adapter stands between and hashes it, and keeps the
 * session's end where sign-in set it: the absolute limit is never moved by use.
 */
export class HashedSessionAdapter implements Adapter {
  readonly #inner: Adapter;
  readonly #findSession: ReturnType<typeof prepareFindSession>;

  constructor(database: Database) {
    this.#findSession = prepareFindSession(database);
    this.#inner = new DrizzleMySQLAdapter(database, sessions, people);
  }

  async getSessionAndUser(token: string): Promise<[DatabaseSession | null, DatabaseUser | null]> {
    const row = await this.#findSession(hashSessionToken(token));
    if (!row) return [null, null];
    const { personId, expiresAt, deviceId, createdAt, lastUsedAt, twoStepPassed, ...person } = row;
    return [
      {
        id: token,
        userId: personId,
        expiresAt,
        attributes: { deviceId, createdAt, lastUsedAt, twoStepPassed },
      },
      { id: personId, attributes: person },
    ];
  }

  async setSession(session: DatabaseSession): Promise<void> {
    const { endsAt = session.expiresAt, ...attributes } = session.attributes;
    await this.#inner.setSession({
      ...session,
      id: hashSessionToken(session.id),
      expiresAt: endsAt,
      attributes,
    });
  }

  async deleteSession(token: string): Promise<void> {
    await this.#inner.deleteSession(hashSessionToken(token));
  }

  async deleteUserSessions(personId: string): Promise<void> {
    await this.#inner.deleteUserSessions(personId);
  }

  async getUserSessions(personId: string): Promise<DatabaseSession[]> {
    return this.#inner.getUserSessions(personId);
  }

  async updateSessionExpiration(): Promise<void> {
    // The end of a session is fixed when it begins; the idle limit is judged by its last use.
  }

  async deleteExpiredSessions(): Promise<void> {
    await this.#inner.deleteExpiredSessions();
  }
}
