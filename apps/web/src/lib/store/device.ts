import { localStore } from "./database.ts";
import type { LocalStore } from "./database.ts";

/** This browser as one person uses it: its id in the record, and the last number it used there. */
export interface Device {
  id: string;
  lastSeq: number;
}

const keyOf = (personId: string) => `device:${personId}`;

/** The device of a person on this browser; undefined before their first sign-in here. */
export async function readDevice(personId: string, store: LocalStore = localStore): Promise<Device | undefined> {
  return (await store.meta.get(keyOf(personId)))?.value as Device | undefined;
}

/** Keeps the device's last number; called inside the transaction that appends. */
export async function writeDevice(personId: string, device: Device, store: LocalStore = localStore): Promise<void> {
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

/** The id to offer at the next sign-in: the one last used in this browser, if any. */
export function lastDeviceId(): string | undefined {
  return localStorage.getItem("emberladder.device") ?? undefined;
}

/** Remembers the id to offer at the next sign-in. */
export function rememberLastDeviceId(deviceId: string): void {
  localStorage.setItem("emberladder.device", deviceId);
}

/** A name for the list of devices, from what the browser says of itself. */
export function describeDevice(): string {
  const agent = navigator.userAgent;
  const system = ["Android", "iPhone", "iPad", "Windows", "Mac OS", "Linux"].find((name) => agent.includes(name));
  const browser = ["Firefox", "Edg", "Chrome", "Safari"].find((name) => agent.includes(name));
  return [system ?? "Device", browser === "Edg" ? "Edge" : browser].filter(Boolean).join(", ");
}
