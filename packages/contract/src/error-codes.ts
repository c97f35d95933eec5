/**
 * Every error the API can answer with: its status, and a title for people. This is the only table from code
 * to status. `detail` of a problem says more where the case allows it.
 */
export const ERRORS = {
  /** The body is not JSON, nests too deep, or names a key that could reach a prototype. */
  "malformed-body": { status: 400, title: "The request could not be read." },
  /** A field is missing, unknown, or outside its limits; `errors` names each. */
  "invalid-input": { status: 400, title: "Some of what was sent cannot be used." },
  /** No session, or it has ended. Whatever waits on a phone stays there. */
  "signed-out": { status: 401, title: "Sign in to go on." },
  /** Wrong e-mail or password, or the person is disabled: one answer for all three. */
  "sign-in-failed": { status: 401, title: "That e-mail and password do not match." },
  /** The session has not passed its two-step code yet. */
  "two-step-needed": { status: 403, title: "Enter your two-step code first." },
  /** A supervisor has to set up two-step codes before anything else. */
  "two-step-set-up-needed": { status: 403, title: "Set up two-step codes first." },
  /** The role does not have the permission. */
  "not-allowed": { status: 403, title: "Your role does not allow this." },
  /** A state-changing request came from another site. */
  "foreign-origin": { status: 403, title: "This request did not come from Emberladder's own pages." },
  /** No such thing in this company; also the answer for another company's things. */
  "not-found": { status: 404, title: "There is nothing here by that name." },
  /** Somebody else changed the same thing first; read it again. */
  "changed-meanwhile": { status: 409, title: "This was changed by somebody else meanwhile." },
  /** The e-mail belongs to an account already. */
  "email-taken": { status: 409, title: "That e-mail has an account already." },
  /** A company keeps at least one supervisor who can sign in. */
  "last-supervisor": { status: 409, title: "A company needs at least one supervisor." },
  /** The thing is in a state in which this cannot be done. */
  "wrong-state": { status: 409, title: "This cannot be done in its present state." },
  /** The first run was finished before. */
  "already-set-up": { status: 409, title: "This installation is set up already." },
  /** The link is used, old or unknown. */
  "link-expired": { status: 410, title: "This link is no longer valid." },
  "too-large": { status: 413, title: "That is more than one request may carry." },
  /** A body with another content type than application/json. */
  "wrong-content-type": { status: 415, title: "Send JSON." },
  /** The two-step or recovery code is wrong or was used before. */
  "wrong-code": { status: 422, title: "That code is not right. Wait for the next one and try again." },
  /** The present password, asked for again before a change, is wrong. */
  "wrong-password": { status: 422, title: "That is not your present password." },
  /** Too short, or on the list of passwords that are guessed first. */
  "weak-password": { status: 422, title: "Choose a harder password." },
  /** No real unit can have this combination; `errors` names the fields. */
  "profile-impossible": { status: 422, title: "No real unit has this combination." },
  /** Too many requests; `Retry-After` says when to go on. Nothing kept on the phone is lost. */
  "too-many-requests": { status: 429, title: "Too many requests. Wait a little." },
  /** A fault of ours. The request id leads to the log. */
  "server-fault": { status: 500, title: "The server could not do this." },
  /** The database is away; try again. */
  "database-away": { status: 503, title: "The record cannot be reached just now." },
} as const satisfies Record<string, { status: number; title: string }>;

export type ErrorCode = keyof typeof ERRORS;
export const ERROR_CODES = Object.keys(ERRORS) as [ErrorCode, ...ErrorCode[]];

/** Why one event of a batch was not taken, and whether sending it again can help. */
export const REJECTIONS = {
  /** The envelope or the body does not have its shape. */
  malformed: { retryable: false },
  /** The hash is not the hash of the event's own text. */
  "wrong-hash": { retryable: false },
  /** `prevHash` does not continue this device's last event in this diagnosis. */
  "broken-link": { retryable: false },
  /** The same id was received before with another content. */
  conflict: { retryable: false },
  /** The device's number was used before by another event. */
  "seq-conflict": { retryable: false },
  /** The diagnosis belongs to nobody in this company. */
  "unknown-diagnosis": { retryable: false },
  /** The diagnosis is not here, and this is not its opening on a call and unit of this company. */
  "not-opened": { retryable: true },
  /** The device is not registered for this person, or was revoked. Register it, then send again. */
  "unknown-device": { retryable: true },
  /** An earlier event of the same diagnosis was refused; this one waits for it. */
  "after-refused": { retryable: true },
} as const satisfies Record<string, { retryable: boolean }>;

export type RejectionCode = keyof typeof REJECTIONS;
export const REJECTION_CODES = Object.keys(REJECTIONS) as [RejectionCode, ...RejectionCode[]];
