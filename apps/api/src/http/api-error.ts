import { ERRORS } from "@emberladder/contract";
import type { ErrorCode, FieldError } from "@emberladder/contract";

/**
 * A foreseen refusal. Thrown anywhere below a route; one handler at the edge turns it into a problem
 * document. `detail` is for people and holds nothing secret.
 */
export class ApiError extends Error {
  readonly code: ErrorCode;
  readonly detail: string | undefined;
  readonly fields: FieldError[] | undefined;
  readonly retryAfterSeconds: number | undefined;

  constructor(
    code: ErrorCode,
    more: { detail?: string; fields?: FieldError[]; retryAfterSeconds?: number } = {},
  ) {
    super(ERRORS[code].title);
    this.name = "ApiError";
    this.code = code;
    this.detail = more.detail;
    this.fields = more.fields;
    this.retryAfterSeconds = more.retryAfterSeconds;
  }
}

/** Nothing by that name in this company; never says whether another company has it. */
export const notFound = (): ApiError => new ApiError("not-found");

/** The thing as found, or the refusal `not-found`. */
export function found<T>(thing: T | undefined | null): T {
  if (thing === undefined || thing === null) throw notFound();
  return thing;
}
