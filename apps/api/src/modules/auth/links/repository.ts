import { oneTimeTokens, people, companies } from "@emberladder/db";
import type { Queryable } from "@emberladder/db";
import { and, eq, gt, isNull } from "drizzle-orm";

export type LinkKind = "invite" | "reset" | "first-run";

export async function insertLink(
  db: Queryable,
  link: { tokenHash: string; kind: LinkKind; personId: string | null; expiresAt: Date; createdAt: Date },
): Promise<void> {
  await db.insert(oneTimeTokens).values(link);
}

const holds = (kind: LinkKind, tokenHash: string, now: Date) =>
  and(
    eq(oneTimeTokens.tokenHash, tokenHash),
    eq(oneTimeTokens.kind, kind),
    isNull(oneTimeTokens.usedAt),
    gt(oneTimeTokens.expiresAt, now),
  );

/** The person and company behind a link that still holds. */
export async function findLinkedPerson(db: Queryable, kind: LinkKind, tokenHash: string, now: Date) {
  const [row] = await db
    .select({
      personId: people.id,
      companyId: people.companyId,
      companyName: companies.name,
      name: people.name,
      email: people.email,
      role: people.role,
      disabledAt: people.disabledAt,
      passwordHash: people.passwordHash,
      totpConfirmedAt: people.totpConfirmedAt,
    })
    .from(oneTimeTokens)
    .innerJoin(people, eq(people.id, oneTimeTokens.personId))
    .innerJoin(companies, eq(companies.id, people.companyId))
    .where(holds(kind, tokenHash, now));
  return row;
}

/** Whether a link without a person still holds. */
export async function doesLinkHold(
  db: Queryable,
  kind: LinkKind,
  tokenHash: string,
  now: Date,
): Promise<boolean> {
  const rows = await db
    .select({ hash: oneTimeTokens.tokenHash })
    .from(oneTimeTokens)
    .where(holds(kind, tokenHash, now));
  return rows.length === 1;
}

/** Spends a link; false when somebody else did first, or it no longer holds. */
export async function spendLink(
  db: Queryable,
  kind: LinkKind,
  tokenHash: string,
  now: Date,
): Promise<boolean> {
  const [result] = await db
    .update(oneTimeTokens)
    .set({ usedAt: now })
    .where(holds(kind, tokenHash, now));
  return result.affectedRows === 1;
}

/** Spends every open link of a kind: of one person, or those without a person. */
export async function spendLinksOf(
  db: Queryable,
  kind: LinkKind,
  personId: string | null,
  now: Date,
): Promise<void> {
  await db
    .update(oneTimeTokens)
    .set({ usedAt: now })
    .where(
      and(
        eq(oneTimeTokens.kind, kind),
        personId === null ? isNull(oneTimeTokens.personId) : eq(oneTimeTokens.personId, personId),
        isNull(oneTimeTokens.usedAt),
      ),
    );
}
