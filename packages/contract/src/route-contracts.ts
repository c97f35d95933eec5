import * as auth from "./routes/auth.ts";
import * as company from "./routes/company.ts";
import * as customers from "./routes/customers.ts";
import * as diagnoses from "./routes/diagnoses.ts";
import * as people from "./routes/people.ts";
import * as reports from "./routes/reports.ts";
import * as system from "./routes/system.ts";
import * as trees from "./routes/trees.ts";
import * as units from "./routes/units.ts";
import type { RouteContract } from "./route-contract.ts";

/**
 * Every route of the API by its operation name. The server refuses to start when one has no handler, the
 * OpenAPI document lists all, and the test matrix of rights walks them.
 */
export const routeContracts = {
  signIn: auth.signIn,
  signOut: auth.signOut,
  readMe: auth.readMe,
  setUpTwoStep: auth.setUpTwoStep,
  confirmTwoStep: auth.confirmTwoStep,
  verifyTwoStep: auth.verifyTwoStep,
  renewRecoveryCodes: auth.renewRecoveryCodes,
  turnOffTwoStep: auth.turnOffTwoStep,
  listSessions: auth.listSessions,
  endSession: auth.endSession,
  endOtherSessions: auth.endOtherSessions,
  listOwnDevices: auth.listOwnDevices,
  registerDevice: auth.registerDevice,
  changePassword: auth.changePassword,
  requestReset: auth.requestReset,
  resetPassword: auth.resetPassword,
  readInvite: auth.readInvite,
  acceptInvite: auth.acceptInvite,
  readCompany: company.readCompany,
  updateCompany: company.updateCompany,
  checkFirstRun: company.checkFirstRun,
  finishFirstRun: company.finishFirstRun,
  listPeople: people.listPeople,
  invitePerson: people.invitePerson,
  resendInvite: people.resendInvite,
  updatePerson: people.updatePerson,
  disablePerson: people.disablePerson,
  enablePerson: people.enablePerson,
  endPersonSessions: people.endPersonSessions,
  removePersonTwoStep: people.removePersonTwoStep,
  listPersonDevices: people.listPersonDevices,
  revokeDevice: people.revokeDevice,
  listCustomers: customers.listCustomers,
  createCustomer: customers.createCustomer,
  readCustomer: customers.readCustomer,
  updateCustomer: customers.updateCustomer,
  createSite: customers.createSite,
  updateSite: customers.updateSite,
  createUnit: units.createUnit,
  readUnit: units.readUnit,
  updateUnit: units.updateUnit,
  listCalls: units.listCalls,
  createCall: units.createCall,
  readCall: units.readCall,
  assignCall: units.assignCall,
  cancelCall: units.cancelCall,
  sendBatch: diagnoses.sendBatch,
  pullEvents: diagnoses.pullEvents,
  listDiagnoses: diagnoses.listDiagnoses,
  readDiagnosis: diagnoses.readDiagnosis,
  releaseDiagnosis: diagnoses.releaseDiagnosis,
  eraseNote: diagnoses.eraseNote,
  listTrees: trees.listTrees,
  readTreeVersion: trees.readTreeVersion,
  readReport: reports.readReport,
  readReportPdf: reports.readReportPdf,
  listJobs: system.listJobs,
  retryJob: system.retryJob,
  cancelJob: system.cancelJob,
  readLive: system.readLive,
  readReady: system.readReady,
  ping: system.ping,
  readOpenApi: system.readOpenApi,
  readApiPage: system.readApiPage,
  readApiPageStyle: system.readApiPageStyle,
  readMailBox: system.readMailBox,
  readMailMessage: system.readMailMessage,
} as const satisfies Record<string, RouteContract>;

export type RouteName = keyof typeof routeContracts;
export const ROUTE_NAMES = Object.keys(routeContracts) as RouteName[];
