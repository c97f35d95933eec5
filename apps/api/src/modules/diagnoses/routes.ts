import { defineRoute } from "#http/route.ts";
import type { Route } from "#http/route.ts";
import { eraseNoteOf, listForReview, readDiagnosisDetail, releaseReport } from "./use-cases.ts";

/** Diagnoses for those who read how they were reached. */
export const diagnosisRoutes: Route[] = [
  defineRoute("listDiagnoses", async ({ query }, context) => listForReview(context, query)),
  defineRoute("readDiagnosis", async ({ params }, context) =>
    readDiagnosisDetail(context, params.diagnosisId),
  ),
  defineRoute("releaseDiagnosis", async ({ params, body }, context) =>
    releaseReport(context, params.diagnosisId, body.comment),
  ),
  defineRoute("eraseNote", async ({ params, body }, context) => eraseNoteOf(context, params, body.reason)),
];
