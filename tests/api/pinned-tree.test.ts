import { installShippedTrees, inTransaction, treeVersions } from "@emberladder/db";
import type { Verdicts } from "@emberladder/contract";
import { treePosition } from "@emberladder/diagnosis";
import { evolveState, initialState } from "@emberladder/api/src/modules/sync/judge.ts";
import { hotSurfaceInducedTree } from "@emberladder/trees";
import { eq } from "drizzle-orm";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { makeCompany } from "./support/company.ts";
import { startRecord } from "./support/record.ts";
import { startTestServer } from "./support/test-server.ts";
import type { TestServer } from "./support/test-server.ts";

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer();
});
afterAll(async () => server.close());

/** A company with the shipped tree, and a record that pins it. */
const startPinned = async (override: { version?: number } = {}) => {
  const company = await makeCompany(server);
  await inTransaction(server.database, async (tx) => installShippedTrees(tx, company.id, new Date()));
  const [row] = await server.database
    .select()
    .from(treeVersions)
    .where(eq(treeVersions.companyId, company.id));
  const client = await company.clientOf("technician");
  const record = startRecord(company);
  const tree = { id: row?.treeId ?? "", version: row?.version ?? 0, hash: row?.hash ?? "", ...override };
  const open = record.open({ tree });
  return {
    record,
    open,
    first: treePosition(
      hotSurfaceInducedTree,
      evolveState(initialState, open, { serverSeq: 1, actorId: company.people.technician.id }),
    ).node,
    send: async (events: unknown[]) =>
      (await client.call("sendBatch", { body: { events } })).json<Verdicts>(),
  };
};
const rules = ({ flags }: Verdicts) => flags.map(({ rule }) => rule);

describe("a record that pins a tree", () => {
  it("is accepted and flagged where a step is named that the walk never came to", async () => {
    const { record, open, first, send } = await startPinned();
    const elsewhere = hotSurfaceInducedTree.nodes.find(({ id, kind }) => kind === "do" && id !== first?.id);
    const step = record.next("tree.step-done", { treeNode: elsewhere?.id });
    const verdicts = await send([open, step]);
    expect(verdicts.accepted.map(({ id }) => id)).toEqual([open.id, step.id]);
    expect(verdicts.flags).toMatchObject([
      { eventId: step.id, rule: "tree-step-unreachable", params: { step: elsewhere?.id, due: first?.id } },
    ]);
  });

  it("is not flagged for the step that was due, sent with the opening or in a batch of its own", async () => {
    for (const isTogether of [true, false]) {
      const { record, open, first, send } = await startPinned();
      const check = first && "check" in first ? first.check : "";
      const step = record.next("check.declined", { check, reason: "no-access", treeNode: first?.id });
      const all = isTogether ? rules(await send([open, step])) : rules(await send([open]));
      if (!isTogether) all.push(...rules(await send([step])));
      expect(all.filter((rule) => rule.startsWith("tree-"))).toEqual([]);
    }
  });

  it("is flagged where the company has no such version", async () => {
    const { open, send } = await startPinned({ version: 7 });
    expect(rules(await send([open]))).toEqual(["tree-unknown"]);
  });
});
