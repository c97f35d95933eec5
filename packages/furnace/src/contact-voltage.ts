/**
 * The In V / Out V rule of a 24 V contact, volts to C on each side. Both sides at 22 V or more is closed;
 * less than 22 V in says nothing about the device, because no path reaches it. Common practice.
 */
export const CLOSED_CONTACT_V = 22;

/** Out V under this, with the path there, is an open contact without doubt; between is a ghost or a bad contact. */
export const OPEN_CONTACT_V = 3;

export type ContactReading = "closed" | "open" | "no-path" | "none-fits";

/** What two readings to C say about a contact. `none-fits` asks for a low-impedance reading first. */
export function readContact(inV: number, outV: number): ContactReading {
  if (inV < CLOSED_CONTACT_V) return "no-path";
  if (outV >= CLOSED_CONTACT_V) return "closed";
  return outV < OPEN_CONTACT_V ? "open" : "none-fits";
}
