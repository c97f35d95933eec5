import canonicalize from "canonicalize";
import { sha256Hex } from "@emberladder/diagnosis";
import { hotSurfaceInducedTree } from "@emberladder/trees";
import type { TreeDocument } from "@emberladder/trees";
import { v5 as uuidv5 } from "uuid";
import { trees, treeVersions } from "./schema/index.ts";
import type { Transaction } from "./client.ts";

/** Trees that every company starts with, in force until it publishes its own. */
export const shippedTrees: readonly TreeDocument[] = [hotSurfaceInducedTree];

/**
 * Gives a company the shipped trees as version 1, in force. Ids follow from the company and the tree, so that
 * doing it again changes nothing.
 */
export async function installShippedTrees(tx: Transaction, companyId: string, now: Date): Promise<void> {
  for (const document of shippedTrees) {
    const treeId = uuidv5(`tree/${document.id}`, companyId);
    const text = canonicalize(document);
    if (text === undefined) throw new Error(`The tree ${document.id} cannot be written as JSON.`);
    await tx
      .insert(trees)
      .values({ id: treeId, companyId, slug: document.id, name: document.title, createdAt: now })
      .onDuplicateKeyUpdate({ set: { name: document.title } });
    await tx
      .insert(treeVersions)
      .values({
        id: uuidv5(`tree/${document.id}/1`, companyId),
        companyId,
        treeId,
        version: 1,
        document: text,
        hash: sha256Hex(text),
        inForce: true,
        note: "Shipped with the product.",
        publishedAt: now,
      })
      .onDuplicateKeyUpdate({ set: { companyId } });
  }
}
