import { localStore } from "./database.ts";

/** Reads something kept from the server for work without a signal. */
export async function readDocument(key: string): Promise<unknown> {
  return (await localStore.documents.get(key))?.value;
}

/** Keeps something from the server for work without a signal. */
export async function writeDocument(key: string, value: unknown): Promise<void> {
  await localStore.documents.put({ key, value, storedAt: Date.now() });
}
