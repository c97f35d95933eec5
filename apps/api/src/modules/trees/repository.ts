import { people, trees, treeVersions } from "@emberladder/db";
import type { Queryable } from "@emberladder/db";
import { and, asc, desc, eq } from "drizzle-orm";

/** The company's trees, each row one published version. */
export async function listVersionRows(db: Queryable, companyId: string) {
  return db
    .select({
      treeId: trees.id,
      slug: trees.slug,
      name: trees.name,
      version: treeVersions.version,
      publishedAt: treeVersions.publishedAt,
      publishedBy: people.name,
      note: treeVersions.note,
      inForce: treeVersions.inForce,
    })
    .from(trees)
    .leftJoin(treeVersions, eq(treeVersions.treeId, trees.id))
    .leftJoin(people, eq(people.id, treeVersions.publishedBy))
    .where(eq(trees.companyId, companyId))
    .orderBy(asc(trees.name), desc(treeVersions.version));
}

export async function findVersion(db: Queryable, companyId: string, treeId: string, version: number) {
  const [row] = await db
    .select({ tree: trees, version: treeVersions })
    .from(treeVersions)
    .innerJoin(trees, eq(trees.id, treeVersions.treeId))
    .where(
      and(
        eq(treeVersions.companyId, companyId),
        eq(treeVersions.treeId, treeId),
        eq(treeVersions.version, version),
      ),
    );
  return row;
}
