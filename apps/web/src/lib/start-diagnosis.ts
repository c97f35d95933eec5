import { listTrees, readTreeVersion } from "@emberladder/contract";
import type { CallDetail } from "@emberladder/contract";
import { command, fold } from "@emberladder/diagnosis";
import { CATALOGUE_VERSION, MODEL_VERSION, mayApply, parseVariant } from "@emberladder/furnace";
import { treeDocumentSchema } from "@emberladder/trees";
import { v7 as uuidv7 } from "uuid";
import { callApi } from "./api-client.ts";
import { loadTradeWords } from "./i18n.ts";
import { appendEvents } from "./store/append-event.ts";
import { localStore } from "./store/database.ts";
import { readDocument, writeDocument } from "./store/documents.ts";

/** The tree in force for a unit, as a diagnosis pins it. */
interface PinnedTree {
  id: string;
  version: number;
  hash: string;
}

/**
 * Keeps on this phone what a diagnosis on this call will need without a signal: the call, the trees in force,
 * the trade's words. Called when the call is opened, so that starting does not wait.
 */
export async function prepareDiagnosis(call: CallDetail): Promise<void> {
  await writeDocument(`call:${call.id}`, call);
  await Promise.all([loadTradeWords(), keepTrees()]);
}

async function keepTrees(): Promise<void> {
  const { items } = await callApi(listTrees);
  const pins: PinnedTree[] = [];
  for (const tree of items) {
    if (tree.versionInForce === null) continue;
    const version = await callApi(readTreeVersion, {
      params: { treeId: tree.id, version: String(tree.versionInForce) },
    });
    await writeDocument(`tree:${tree.id}:${version.version}`, version.document);
    pins.push({ id: tree.id, version: version.version, hash: version.hash });
  }
  await writeDocument("trees-in-force", pins);
}

/** The kept tree that applies to a unit; null where the company has none for it. */
async function treeFor(call: CallDetail): Promise<PinnedTree | null> {
  const pins = ((await readDocument("trees-in-force")) as PinnedTree[] | undefined) ?? [];
  const { codes, options } = call.unit.profile;
  for (const pin of pins) {
    const parsed = treeDocumentSchema.safeParse(await readDocument(`tree:${pin.id}:${pin.version}`));
    if (parsed.success && mayApply(parseVariant(parsed.data.applies), codes, options)) return pin;
  }
  return null;
}

/**
 * Opens a diagnosis on a call, on this phone: the profile and the tree version are pinned in its first event.
 * Returns the id of the new diagnosis, or of the one that is open on this phone already.
 */
export async function startDiagnosis(input: { call: CallDetail; personId: string }): Promise<string> {
  const { call, personId } = input;
  const open = await openOnThisPhone(call.id);
  if (open) return open;
  await writeDocument(`call:${call.id}`, call);
  if (!(await readDocument("trees-in-force"))) await keepTrees().catch(() => undefined);
  const diagnosisId = uuidv7();
  await appendEvents({
    diagnosisId,
    authorId: personId,
    events: [
      command("diagnosis.opened", {
        callId: call.id,
        unitId: call.unit.id,
        profile: call.unit.profile,
        tree: await treeFor(call),
        catalogueVersion: CATALOGUE_VERSION,
        modelVersion: MODEL_VERSION,
      }),
    ],
  });
  const { requestSend } = await import("./store/sender.ts");
  requestSend();
  return diagnosisId;
}

async function openOnThisPhone(callId: string): Promise<string | undefined> {
  const opened = await localStore.events
    .filter((event) => event.type === "diagnosis.opened" && event.body["callId"] === callId)
    .toArray();
  for (const { diagnosisId } of opened) {
    const events = await localStore.events.where("diagnosisId").equals(diagnosisId).toArray();
    if (!fold(events.toSorted((a, b) => a.deviceSeq - b.deviceSeq)).closed) return diagnosisId;
  }
  return undefined;
}
