import type { Actor } from "#http/actor.ts";
import { found } from "#http/api-error.ts";
import type { RequestContext } from "#http/route.ts";
import { findVersion, listVersionRows } from "./repository.ts";

type Context = RequestContext<Actor>;
type VersionRow = Awaited<ReturnType<typeof listVersionRows>>[number];

/** The company's decision trees with their published versions, newest first. */
export async function listCompanyTrees({ database, actor }: Context) {
  const rows = await listVersionRows(database, actor.companyId);
  const ids = [...new Set(rows.map(({ treeId }) => treeId))];
  return ids.flatMap((id) => {
    const own = rows.filter(({ treeId }) => treeId === id);
    const [first] = own;
    if (!first) return [];
    const versions = own.flatMap(presentVersion);
    return [
      {
        id,
        slug: first.slug,
        name: first.name,
        versionInForce: versions.find(({ inForce }) => inForce)?.version ?? null,
        versions,
      },
    ];
  });
}

function presentVersion({ version, publishedAt, publishedBy, note, inForce }: VersionRow) {
  if (version === null || publishedAt === null) return [];
  return [{ version, publishedAt: publishedAt.toISOString(), publishedBy, note, inForce: inForce ?? false }];
}

/** One published version with its document. @throws ApiError `not-found`. */
export async function readTreeDocument({ database, actor }: Context, treeId: string, number: number) {
  const { tree, version } = found(await findVersion(database, actor.companyId, treeId, number));
  return {
    treeId: tree.id,
    slug: tree.slug,
    name: tree.name,
    version: version.version,
    publishedAt: version.publishedAt.toISOString(),
    hash: version.hash,
    document: JSON.parse(version.document) as Record<string, unknown>,
  };
}
