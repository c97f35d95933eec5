import { mkdir, rename, writeFile } from "node:fs/promises";
import { join } from "node:path";
import { inTransaction } from "@emberladder/db";
import { fold } from "@emberladder/diagnosis";
import type { JobContext } from "#modules/jobs/job-context.ts";
import { enqueueJob } from "#modules/jobs/repository.ts";
import { listEventsOf, readStoredEvent } from "#modules/sync/repository.ts";
import { buildReportContent } from "./build-report-content.ts";
import { renderReportPdf } from "./report-pdf.ts";
import { findReportSubject, insertReport } from "./repository.ts";
import { reportFolder } from "./use-cases.ts";

/**
 * Makes the customer's report of a diagnosis, its words and its PDF, and asks for the mail. Run again after a
 * failure it makes a new one; only what was finished is ever mailed.
 */
export async function renderReport(
  payload: Readonly<Record<string, string>>,
  context: JobContext,
): Promise<void> {
  const { database, environment, clock, newId } = context;
  const { diagnosisId = "" } = payload;
  const subject = await findReportSubject(database, diagnosisId);
  if (!subject) throw new Error("There is no such diagnosis.");
  const events = (await listEventsOf(database, diagnosisId)).map(readStoredEvent);
  const state = fold(events);
  // Taken back between asking and now.
  if (state.closed === null) return;
  const madeAt = new Date(clock());
  const content = buildReportContent(state, subject);
  await context.report(30);

  const reportId = newId();
  const pdfFile = `${reportId}.pdf`;
  const folder = reportFolder(environment.dataDir);
  await mkdir(folder, { recursive: true, mode: 0o700 });
  const path = join(folder, pdfFile);
  await writeFile(`${path}.part`, await renderReportPdf(content, madeAt), { mode: 0o600 });
  await rename(`${path}.part`, path);
  await context.report(80);

  const { companyId } = subject.diagnosis;
  await inTransaction(database, async (tx) => {
    await insertReport(tx, {
      id: reportId,
      companyId,
      diagnosisId,
      content: JSON.stringify(content),
      pdfFile,
      madeAt,
    });
    await enqueueJob(tx, {
      id: newId(),
      companyId,
      kind: "mail.send",
      payload: { template: "report", reportId },
      now: madeAt,
    });
  });
}
