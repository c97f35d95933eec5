import type { Queryable } from "@emberladder/db";
import type { BodyOf } from "@emberladder/diagnosis";
import { treeDocumentSchema } from "@emberladder/trees";
import type { TreeDocument } from "@emberladder/trees";
import { findVersion } from "#modules/trees/repository.ts";

/** The version of a tree that a diagnosis walks, as its opening names it. */
export type TreePin = BodyOf<"diagnosis.opened">["tree"];

/** Versions read before. A published document never changes, so one is good for as long as the process lives. */
const MOST_TREES = 200;
const read = new Map<string, TreeDocument>();

/**
 * The document of a pinned version as it is stored; null where nothing is pinned, or where the company has no
 * such version with that hash.
 */
export async function readPinnedTree(
  db: Queryable,
  companyId: string,
  pin: TreePin,
): Promise<TreeDocument | null> {
  if (!pin) return null;
  const key = `${companyId} ${pin.id} ${pin.version} ${pin.hash}`;
  const known = read.get(key);
  if (known) return known;
  const found = await findVersion(db, companyId, pin.id, pin.version);
  if (!found || found.version.hash !== pin.hash) return null;
  const parsed = treeDocumentSchema.safeParse(JSON.parse(found.version.document));
  if (!parsed.success) return null;
  read.set(key, parsed.data);
  const oldest = read.size > MOST_TREES ? read.keys().next().value : undefined;
  if (oldest !== undefined) read.delete(oldest);
  return parsed.data;
}
