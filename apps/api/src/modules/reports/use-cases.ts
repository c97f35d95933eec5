import { readFile } from "node:fs/promises";
import { join } from "node:path";
import { reportContentSchema } from "@emberladder/contract";
import { ApiError, found } from "#http/api-error.ts";
import type { RequestContext } from "#http/route.ts";
import { hashSecret } from "#modules/auth/secrets.ts";
import { findLinkedReport } from "./repository.ts";

/** Where the PDF of reports lie in the data folder. */
export const reportFolder = (dataDir: string): string => join(dataDir, "reports");

async function openLink({ database, now }: RequestContext, token: string) {
  const linked = await findLinkedReport(database, hashSecret(token), now);
  if (!linked) throw new ApiError("link-expired");
  return linked;
}

/** The customer's report by its private link. @throws ApiError `link-expired`. */
export async function readLinkedReport(context: RequestContext, token: string) {
  const { report, expiresAt } = await openLink(context, token);
  return {
    ...reportContentSchema.parse(JSON.parse(report.content)),
    madeAt: report.madeAt.toISOString(),
    linkHoldsUntil: expiresAt.toISOString(),
    hasPdf: report.pdfFile !== null,
  };
}

/** The same report as PDF. @throws ApiError `link-expired`, `not-found`. */
export async function readLinkedPdf(context: RequestContext, token: string) {
  const { report } = await openLink(context, token);
  const file = found(report.pdfFile);
  try {
    const content = await readFile(join(reportFolder(context.environment.dataDir), file));
    return { content: new Uint8Array(content), fileName: "furnace-report.pdf" };
  } catch {
    // The words are in the database; the file can be made again.
    throw new ApiError("not-found", {
      detail: "The printed form is missing. The report itself can be read.",
    });
  }
}
