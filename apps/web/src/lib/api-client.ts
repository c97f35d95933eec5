import { addressOf } from "@emberladder/contract";
import type { AnswerOf, BodyOf, RouteContract } from "@emberladder/contract";

/** What went wrong with a request, as the screens need to know it. */
export class ApiProblem extends Error {
  readonly status: number;
  /** Error code of the contract, or `offline` where the server was not reached. */
  readonly code: string;
  readonly detail: string | undefined;
  readonly fields: { path: string; message: string }[];
  constructor(
    status: number,
    code: string,
    title: string,
    detail?: string,
    fields: { path: string; message: string }[] = [],
  ) {
    super(title);
    this.name = "ApiProblem";
    this.status = status;
    this.code = code;
    this.detail = detail;
    this.fields = fields;
  }
}

/** Milliseconds after which a request counts as not answered: a captive portal or a dead cell stalls. */
const REQUEST_TIMEOUT_MS = 10_000;

interface CallInput<C extends RouteContract> {
  params?: Record<string, string>;
  query?: Record<string, string | number | boolean | undefined>;
  body?: BodyOf<C>;
  signal?: AbortSignal;
}

/**
 * Calls one route of the contract and returns its answer, of the type that the contract gives it. The server has
 * held the answer against the contract's schema; here it is taken as it is, so that the first screens need no
 * schemas.
 * @throws ApiProblem for every refusal, and with code `offline` where no answer of ours came back.
 */
export async function callApi<C extends RouteContract>(
  contract: C,
  input: CallInput<C> = {},
): Promise<AnswerOf<C>> {
  const query = new URLSearchParams(
    Object.entries(input.query ?? {}).flatMap(([key, value]) =>
      value === undefined ? [] : [[key, String(value)]],
    ),
  ).toString();
  const timeout = AbortSignal.timeout(REQUEST_TIMEOUT_MS);
  let response: Response;
  try {
    response = await fetch(addressOf(contract, input.params) + (query && `?${query}`), {
      method: contract.method.toUpperCase(),
      credentials: "same-origin",
      headers: {
        accept: "application/json",
        ...(input.body === undefined ? {} : { "content-type": "application/json" }),
      },
      body: input.body === undefined ? undefined : JSON.stringify(input.body),
      signal: input.signal ? AbortSignal.any([input.signal, timeout]) : timeout,
    });
  } catch (cause) {
    if (input.signal?.aborted) throw cause;
    throw new ApiProblem(0, "offline", "No signal.");
  }
  if (response.status === 204) return undefined as AnswerOf<C>;
  const type = response.headers.get("content-type") ?? "";
  if (!type.includes("json"))
    throw new ApiProblem(0, "offline", "Something between here and the server answered instead of it.");
  const body: unknown = await response.json();
  if (!response.ok) throw problemOf(response.status, body);
  return body as AnswerOf<C>;
}

function problemOf(status: number, body: unknown): ApiProblem {
  const problem = (body ?? {}) as {
    code?: string;
    title?: string;
    detail?: string;
    errors?: { pointer: string; detail: string }[];
  };
  return new ApiProblem(
    status,
    problem.code ?? "server-fault",
    problem.title ?? "",
    problem.detail,
    (problem.errors ?? []).map(({ pointer, detail }) => ({ path: pathOfPointer(pointer), message: detail })),
  );
}

/** A JSON pointer as the dotted name that forms use: `/profile/codes/draft` is `profile.codes.draft`. */
function pathOfPointer(pointer: string): string {
  return pointer
    .split("/")
    .slice(1)
    .map((key) => key.replaceAll("~1", "/").replaceAll("~0", "~"))
    .join(".");
}
