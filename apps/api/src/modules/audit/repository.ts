import { auditLog } from "@emberladder/db";
import type { Queryable } from "@emberladder/db";

/** One line of the audit log. `details` holds ids and codes, never a secret. */
export interface AuditEntry {
  action: string;
  companyId?: string | null;
  actorId?: string | null;
  subjectId?: string | null;
  details?: Record<string, string | number | boolean>;
}

interface AuditSource {
  newId: () => string;
  requestId: string;
  now: Date;
}

/** Adds a line to the audit log; in a transaction it stands or falls with what it tells of. */
export async function writeAudit(db: Queryable, source: AuditSource, entry: AuditEntry): Promise<void> {
  await db.insert(auditLog).values({
    id: source.newId(),
    companyId: entry.companyId ?? null,
    actorId: entry.actorId ?? null,
    action: entry.action,
    subjectId: entry.subjectId ?? null,
    details: JSON.stringify(entry.details ?? {}),
    requestId: source.requestId,
    at: source.now,
  });
}
