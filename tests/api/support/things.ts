import { jobs, sessions, trees, treeVersions } from "@emberladder/db";
import { noteHash, sha256Hex } from "@emberladder/diagnosis";
import { eq } from "drizzle-orm";
import { v7 as uuidv7 } from "uuid";
import { makeCompany } from "./company.ts";
import { startRecord } from "./record.ts";
import type { Things } from "./route-examples.ts";
import type { TestServer } from "./test-server.ts";

/** A company with one of everything that a route can name. */
export async function makeThings(server: TestServer): Promise<Things> {
  const company = await makeCompany(server);
  const technician = await company.clientOf("technician");
  const record = startRecord(company);
  const salt = "0123456789abcdef".repeat(2);
  const note = { diagnosisId: record.diagnosisId, salt, text: "A text.", hash: noteHash(salt, "A text.") };
  await technician.call("sendBatch", { body: { events: [record.open()], notes: [note] } });
  const now = new Date();
  const [jobId, treeId] = [uuidv7(), uuidv7()];
  await server.database.insert(jobs).values({
    id: jobId,
    companyId: company.id,
    kind: "mail.send",
    payload: {},
    state: "dead",
    attempts: 6,
    progress: 0,
    runAfter: now,
    createdAt: now,
  });
  await server.database
    .insert(trees)
    .values({ id: treeId, companyId: company.id, slug: "one", name: "One", createdAt: now });
  await server.database.insert(treeVersions).values({
    id: uuidv7(),
    companyId: company.id,
    treeId,
    version: 1,
    document: "{}",
    hash: sha256Hex("{}"),
    inForce: true,
    publishedAt: now,
  });
  const [session] = await server.database
    .select({ id: sessions.publicId })
    .from(sessions)
    .where(eq(sessions.userId, company.people.technician.id));
  return {
    company,
    diagnosisId: record.diagnosisId,
    noteHash: note.hash,
    jobId,
    treeId,
    sessionId: session?.id ?? uuidv7(),
  };
}
