const KEY = "emberladder.device";

/** The id to offer at the next sign-in: the one last used in this browser, if any. */
export function lastDeviceId(): string | undefined {
  return localStorage.getItem(KEY) ?? undefined;
}

/** Remembers the id to offer at the next sign-in. */
export function rememberLastDeviceId(deviceId: string): void {
  localStorage.setItem(KEY, deviceId);
}

/** A name for the list of devices, from what the browser says of itself. */
export function describeDevice(): string {
  const agent = navigator.userAgent;
  const system = ["Android", "iPhone", "iPad", "Windows", "Mac OS", "Linux"].find((name) =>
    agent.includes(name),
  );
  const browser = ["Firefox", "Edg", "Chrome", "Safari"].find((name) => agent.includes(name));
  return [system ?? "Device", browser === "Edg" ? "Edge" : browser].filter(Boolean).join(", ");
}
