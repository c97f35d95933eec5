import { readDuplicateKey } from "@emberladder/db";
import type { Queryable } from "@emberladder/db";
import { findDevice, insertDevice, updateDevice } from "./repository.ts";

/**
 * Binds a browser to a person as a device and returns its id. A browser that has its own id keeps it; one that
 * has none, whose id is another person's, or whose id was revoked gets a new one.
 */
export async function bindDevice(
  db: Queryable,
  request: {
    wanted?: string | undefined;
    name: string;
    personId: string;
    companyId: string;
    now: Date;
    newId: () => string;
  },
): Promise<string> {
  const { wanted, name, personId, companyId, now, newId } = request;
  const known = wanted === undefined ? undefined : await findDevice(db, wanted);
  if (known && known.personId === personId && known.revokedAt === null) {
    await updateDevice(db, known.id, { name, lastSeenAt: now });
    return known.id;
  }
  const id = wanted !== undefined && !known ? wanted : newId();
  const device = { companyId, personId, name, registeredAt: now, lastSeenAt: now };
  try {
    await insertDevice(db, { ...device, id });
    return id;
  } catch (error) {
    // Two sign-ins of one new browser side by side: the second takes a fresh id.
    if (readDuplicateKey(error) === undefined) throw error;
    const fresh = newId();
    await insertDevice(db, { ...device, id: fresh });
    return fresh;
  }
}
