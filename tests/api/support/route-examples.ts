import type { Role, RouteName } from "@emberladder/contract";
import { v7 as uuidv7 } from "uuid";
import { PASSWORD, testProfile } from "./company.ts";
import type { TestCompany } from "./company.ts";

/** What a company has that a route can name. */
export interface Things {
  company: TestCompany;
  diagnosisId: string;
  noteHash: string;
  jobId: string;
  treeId: string;
  sessionId: string;
}

/** Who may use a route, written down here apart from the product's own table of permissions. */
type Allowed = "public" | readonly Role[];

export interface RouteExample {
  allowed: Allowed;
  params?: (things: Things) => Record<string, string>;
  query?: Record<string, string>;
  body?: (things: Things) => unknown;
  /** The route names a company's thing, in its address or body: a foreign one has to be unknown. */
  namesThing?: boolean;
}

const EVERYONE: readonly Role[] = ["trainee", "technician", "senior", "supervisor"];
const TRADE: readonly Role[] = ["technician", "senior", "supervisor"];
const DESK: readonly Role[] = ["senior", "supervisor"];
const LEAD: readonly Role[] = ["supervisor"];

const token = "A".repeat(43);
const person = ({ company }: Things) => ({ personId: company.people.technician.id });
const customer = ({ company }: Things) => ({ customerId: company.customerId });
const call = ({ company }: Things) => ({ callId: company.callId });
const diagnosis = ({ diagnosisId }: Things) => ({ diagnosisId });
const job = ({ jobId }: Things) => ({ jobId });

/** One good request for every route. A route that is missing here does not compile. */
export const routeExamples: Record<RouteName, RouteExample> = {
  signIn: { allowed: "public", body: () => ({ email: "nobody@company.example", password: PASSWORD }) },
  signOut: { allowed: EVERYONE },
  readMe: { allowed: EVERYONE },
  setUpTwoStep: { allowed: EVERYONE, body: () => ({}) },
  confirmTwoStep: { allowed: EVERYONE, body: () => ({ code: "000000" }) },
  verifyTwoStep: { allowed: EVERYONE, body: () => ({ code: "000000" }) },
  renewRecoveryCodes: { allowed: EVERYONE, body: () => ({ code: "000000" }) },
  turnOffTwoStep: { allowed: EVERYONE, body: () => ({ password: "not the one", code: "000000" }) },
  listSessions: { allowed: EVERYONE },
  endSession: {
    allowed: EVERYONE,
    params: ({ sessionId }) => ({ sessionId }),
    namesThing: true,
  },
  endOtherSessions: { allowed: EVERYONE },
  listOwnDevices: { allowed: EVERYONE },
  registerDevice: { allowed: EVERYONE, body: () => ({ name: "Phone" }) },
  changePassword: {
    allowed: EVERYONE,
    body: () => ({ current: "not the one at all", next: "four other invented words" }),
  },
  requestReset: { allowed: "public", body: () => ({ email: "nobody@company.example" }) },
  resetPassword: { allowed: "public", body: () => ({ token, password: "four other invented words" }) },
  readInvite: { allowed: "public", body: () => ({ token }) },
  acceptInvite: {
    allowed: "public",
    body: () => ({ token, name: "Somebody", password: "four other invented words" }),
  },
  readCompany: { allowed: EVERYONE },
  updateCompany: { allowed: LEAD, body: () => ({ unitsShown: "si" }) },
  checkFirstRun: { allowed: "public", body: () => ({ token }) },
  finishFirstRun: {
    allowed: "public",
    body: () => ({
      token,
      company: {
        name: "Another company",
        timeZone: "America/Denver",
        altitudeRule: "4-above-2000",
        unitsShown: "si",
      },
      supervisor: { name: "Somebody", email: "first@company.example", password: "four other invented words" },
    }),
  },
  listPeople: { allowed: DESK },
  invitePerson: {
    allowed: LEAD,
    body: () => ({ name: "New person", email: `${uuidv7()}@company.example`, role: "trainee" }),
  },
  resendInvite: { allowed: LEAD, params: person, namesThing: true },
  updatePerson: { allowed: LEAD, params: person, body: () => ({ name: "Renamed" }), namesThing: true },
  disablePerson: { allowed: LEAD, params: person, namesThing: true },
  enablePerson: { allowed: LEAD, params: person, namesThing: true },
  endPersonSessions: { allowed: LEAD, params: person, namesThing: true },
  removePersonTwoStep: { allowed: LEAD, params: person, namesThing: true },
  listPersonDevices: { allowed: LEAD, params: person, namesThing: true },
  revokeDevice: {
    allowed: LEAD,
    params: ({ company }) => ({ deviceId: company.people.trainee.deviceId }),
    namesThing: true,
  },
  listCustomers: { allowed: DESK, query: { search: "Odalys" } },
  createCustomer: { allowed: DESK, body: () => ({ firstName: "New customer" }) },
  readCustomer: { allowed: DESK, params: customer, namesThing: true },
  updateCustomer: { allowed: DESK, params: customer, body: () => ({ phone: "555-0102" }), namesThing: true },
  createSite: {
    allowed: DESK,
    params: customer,
    body: () => ({ address: "1 New Street", town: "Harrow Falls" }),
    namesThing: true,
  },
  updateSite: {
    allowed: DESK,
    params: ({ company }) => ({ siteId: company.siteId }),
    body: () => ({ town: "Dry Fork" }),
    namesThing: true,
  },
  createUnit: {
    allowed: TRADE,
    body: ({ company }) => ({ siteId: company.siteId, name: "Second furnace", profile: testProfile }),
    namesThing: true,
  },
  readUnit: { allowed: EVERYONE, params: ({ company }) => ({ unitId: company.unitId }), namesThing: true },
  updateUnit: {
    allowed: TRADE,
    params: ({ company }) => ({ unitId: company.unitId }),
    body: () => ({ version: 1, name: "Renamed furnace" }),
    namesThing: true,
  },
  listCalls: { allowed: EVERYONE, query: { scope: "all" } },
  createCall: {
    allowed: TRADE,
    body: ({ company }) => ({
      unitId: company.unitId,
      complaint: "No heat again.",
      scheduledFor: "2026-01-12T15:00:00Z",
    }),
    namesThing: true,
  },
  readCall: { allowed: EVERYONE, params: call, namesThing: true },
  assignCall: { allowed: DESK, params: call, body: () => ({ personId: null, version: 1 }), namesThing: true },
  cancelCall: { allowed: DESK, params: call, body: () => ({ version: 1 }), namesThing: true },
  sendBatch: { allowed: EVERYONE, body: () => ({ events: [] }) },
  pullEvents: { allowed: EVERYONE, body: ({ diagnosisId }) => ({ heads: { [diagnosisId]: 0 } }) },
  listDiagnoses: { allowed: DESK },
  readDiagnosis: { allowed: EVERYONE, params: diagnosis, namesThing: true },
  releaseDiagnosis: {
    allowed: LEAD,
    params: diagnosis,
    body: () => ({ comment: "Looked at it." }),
    namesThing: true,
  },
  eraseNote: {
    allowed: LEAD,
    params: ({ diagnosisId, noteHash }) => ({ diagnosisId, hash: noteHash }),
    body: () => ({ reason: "Personal data" }),
    namesThing: true,
  },
  listTrees: { allowed: EVERYONE },
  readTreeVersion: {
    allowed: EVERYONE,
    params: ({ treeId }) => ({ treeId, version: "1" }),
    namesThing: true,
  },
  readReport: { allowed: "public", params: () => ({ token }) },
  readReportPdf: { allowed: "public", params: () => ({ token }) },
  listJobs: { allowed: LEAD },
  retryJob: { allowed: LEAD, params: job, namesThing: true },
  cancelJob: { allowed: LEAD, params: job, namesThing: true },
  readLive: { allowed: "public" },
  readReady: { allowed: "public" },
  ping: { allowed: "public" },
  readOpenApi: { allowed: "public" },
  readApiPage: { allowed: "public" },
  readApiPageStyle: { allowed: "public" },
  readMailBox: { allowed: "public" },
  readMailMessage: { allowed: "public", params: () => ({ messageId: "1-none" }) },
};
