import { localStore } from "./database.ts";
import type { LocalStore } from "./database.ts";

/** This browser as one person uses it: its id in the record, and the last number it used there. */
export interface Device {
  id: string;
  lastSeq: number;
}

const keyOf = (personId: string) => `device:${personId}`;

/** The device of a person on this browser; undefined before their first sign-in here. */
export async function readDevice(
  personId: string,
  store: LocalStore = localStore,
): Promise<Device | undefined> {
  return (await store.meta.get(keyOf(personId)))?.value as Device | undefined;
}

/** Keeps the device's last number; called inside the transaction that appends. */
export async function writeDevice(
  personId: string,
  device: Device,
  store: LocalStore = localStore,
): Promise<void> {
  await store.meta.put({ key: keyOf(personId), value: device });
}

/**
 * Takes over the device id that the server gave at sign-in. A new id starts a new count, so that each
 * device's numbers stay free of gaps.
 */
export async function rememberDevice(personId: string, deviceId: string): Promise<void> {
  const known = await readDevice(personId);
  if (known?.id !== deviceId) await writeDevice(personId, { id: deviceId, lastSeq: 0 });
}
