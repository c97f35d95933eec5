import { INVITE_DAYS, REPORT_LINK_DAYS, reportContentSchema, RESET_HOURS } from "@emberladder/contract";
import { LINK_LIFE_MS } from "#modules/auth/account-links.ts";
import { insertLink } from "#modules/auth/links/repository.ts";
import { hashSecret, makeToken } from "#modules/auth/secrets.ts";
import type { JobContext } from "#modules/jobs/job-context.ts";
import { findReport, findReportSubject, insertReportLink } from "#modules/reports/repository.ts";
import { formatDay, formatMoment } from "./format-moment.ts";
import { callAssignedMessage, inviteMessage, reportMessage, resetMessage } from "./messages.ts";
import { findCallForMail, findRecipient } from "./repository.ts";

type Payload = Readonly<Record<string, string>>;

/**
 * Writes and sends one message. The job names only ids: addresses are read and secret links made at the
 * moment of sending, so that neither waits in the table of jobs. A message that no longer has a purpose is
 * not sent.
 */
export async function sendJobMail(payload: Payload, context: JobContext): Promise<void> {
  switch (payload["template"]) {
    case "invite":
    case "reset":
      return sendAccountLink(payload["template"], payload["personId"] ?? "", context);
    case "call-assigned":
      return sendCallAssigned(payload, context);
    case "report":
      return sendReport(payload["reportId"] ?? "", context);
    default:
      throw new Error("A message needs a known template.");
  }
}

async function sendAccountLink(
  kind: "invite" | "reset",
  personId: string,
  context: JobContext,
): Promise<void> {
  const { database, environment, mailer } = context;
  const person = await findRecipient(database, personId);
  const isWanted =
    person && person.disabledAt === null && (person.passwordHash === null) === (kind === "invite");
  if (!isWanted) return;
  const now = new Date(context.clock());
  const token = makeToken(context.random);
  await insertLink(database, {
    tokenHash: hashSecret(token),
    kind,
    personId,
    createdAt: now,
    expiresAt: new Date(now.getTime() + LINK_LIFE_MS[kind]),
  });
  const facts = {
    name: person.name,
    companyName: person.companyName,
    link: `${environment.publicOrigin}/${kind}/${token}`,
  };
  const words =
    kind === "invite"
      ? inviteMessage({ ...facts, days: INVITE_DAYS })
      : resetMessage({ ...facts, hours: RESET_HOURS });
  await mailer.send({ to: person.email, ...words });
}

async function sendCallAssigned(
  payload: Payload,
  { database, environment, mailer }: JobContext,
): Promise<void> {
  const { personId = "", callId = "" } = payload;
  const person = await findRecipient(database, personId);
  const call = person && (await findCallForMail(database, person.companyId, callId));
  // Assigned on to somebody else before this was sent: that message is on its way too.
  if (!call || person.disabledAt !== null || call.assignedTo !== personId) return;
  await mailer.send({
    to: person.email,
    ...callAssignedMessage({
      name: person.name,
      companyName: person.companyName,
      callNumber: call.number,
      when: formatMoment(call.scheduledFor, call.timeZone ?? person.timeZone),
      customerFirstName: call.customerFirstName,
      address: `${call.address}, ${call.town}`,
      complaint: call.complaint,
      link: `${environment.publicOrigin}/calls/${callId}`,
    }),
  });
}

async function sendReport(reportId: string, context: JobContext): Promise<void> {
  const { database, environment, mailer } = context;
  const report = await findReport(database, reportId);
  const subject = report && (await findReportSubject(database, report.diagnosisId));
  if (!subject || subject.customerEmail === null) return;
  const content = reportContentSchema.parse(JSON.parse(report.content));
  const now = new Date(context.clock());
  const expiresAt = new Date(now.getTime() + REPORT_LINK_DAYS * 86_400_000);
  const token = makeToken(context.random);
  await insertReportLink(database, { tokenHash: hashSecret(token), reportId, expiresAt, createdAt: now });
  await mailer.send({
    to: subject.customerEmail,
    ...reportMessage({
      customerFirstName: content.customerFirstName,
      companyName: content.companyName,
      visited: content.visited,
      safe: content.safe.text,
      link: `${environment.publicOrigin}/r/${token}`,
      until: formatDay(expiresAt, subject.site.timeZone ?? subject.company.timeZone),
      isDemo: content.isDemo,
    }),
  });
}
