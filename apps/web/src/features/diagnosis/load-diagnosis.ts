import { pullEvents, readCall, readTreeVersion } from "@emberladder/contract";
import type { CallDetail } from "@emberladder/contract";
import { treeDocumentSchema } from "@emberladder/trees";
import type { TreeDocument } from "@emberladder/trees";
import { callApi } from "#lib/api-client.ts";
import { localStore } from "#lib/store/database.ts";
import { DiagnosisSession } from "#lib/store/diagnosis-session.ts";
import { readDocument, writeDocument } from "#lib/store/documents.ts";

export interface LoadedDiagnosis {
  session: DiagnosisSession;
  tree: TreeDocument | null;
  call: CallDetail | null;
}

/**
 * A diagnosis with what its screens need: events from this phone (pulled first where it has none), the tree
 * version it was opened with, and the call. Undefined where neither the phone nor the server has it.
 */
export async function loadDiagnosis(
  diagnosisId: string,
  personId: string,
): Promise<LoadedDiagnosis | undefined> {
  const here = await localStore.events.where("diagnosisId").equals(diagnosisId).count();
  if (here === 0) await pullFromServer(diagnosisId).catch(() => undefined);
  const session = await DiagnosisSession.open(diagnosisId, personId);
  const { opened } = session.getState();
  if (!opened) return undefined;
  const [tree, call] = await Promise.all([loadTree(opened.tree), loadCall(opened.callId)]);
  return { session, tree, call };
}

async function pullFromServer(diagnosisId: string): Promise<void> {
  const answer = await callApi(pullEvents, { body: { heads: { [diagnosisId]: 0 } } });
  await localStore.events.bulkPut(
    answer.events.map(({ companyId: _c, receivedAt: _r, chainHash: _h, ...event }) => event),
  );
  await localStore.notes.bulkPut(
    answer.notes.flatMap(({ erased: _e, text, ...note }) => (text === null ? [] : [{ ...note, text }])),
  );
}

async function loadTree(pinned: { id: string; version: number } | null): Promise<TreeDocument | null> {
  if (!pinned) return null;
  const key = `tree:${pinned.id}:${pinned.version}`;
  const kept = treeDocumentSchema.safeParse(await readDocument(key));
  if (kept.success) return kept.data;
  const answer = await callApi(readTreeVersion, {
    params: { treeId: pinned.id, version: String(pinned.version) },
  }).catch(() => undefined);
  const parsed = treeDocumentSchema.safeParse(answer?.document);
  if (!parsed.success) return null;
  await writeDocument(key, parsed.data);
  return parsed.data;
}

async function loadCall(callId: string): Promise<CallDetail | null> {
  const kept = (await readDocument(`call:${callId}`)) as CallDetail | undefined;
  if (kept) return kept;
  const call = await callApi(readCall, { params: { callId } }).catch(() => undefined);
  if (call) await writeDocument(`call:${callId}`, call);
  return call ?? null;
}
