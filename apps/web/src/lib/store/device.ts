import type { LocalStore } from "./database.ts";
import { localStore } from "./database.ts";

/** What this browser is called in the record; made once and kept with the store it counts for. */
export interface Device {
  id: string;
}

/** The id of this device. A store that was cleared starts a new device, so that its count stays gap-free. */
export async function readDevice(store: LocalStore = localStore): Promise<Device> {
  return store.transaction("rw", store.meta, async () => {
    const known = await store.meta.get("deviceId");
    if (known) return { id: known.value as string };
    const id = crypto.randomUUID();
    await store.meta.put({ key: "deviceId", value: id });
    return { id };
  });
}

/** A name for the list of devices, from what the browser says of itself. */
export function describeDevice(): string {
  const agent = navigator.userAgent;
  const system = ["Android", "iPhone", "iPad", "Windows", "Mac OS", "Linux"].find((name) => agent.includes(name));
  const browser = ["Firefox", "Edg", "Chrome", "Safari"].find((name) => agent.includes(name));
  return [system ?? "Device", browser === "Edg" ? "Edge" : browser].filter(Boolean).join(", ");
}
