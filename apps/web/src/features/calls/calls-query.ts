import type {
  AnswerOf,
  Call,
  CallDetail,
  CallStatus,
  listCalls as ListCalls,
  UnitDetail,
} from "@emberladder/contract";
import { ApiProblem, callApi } from "#lib/api-client.ts";
import { listCalls, readCall, readUnit } from "#lib/shell-routes.ts";
import { addDays } from "#lib/site-time.ts";

/** States of a call, in the order of its life. The contract has them beside its schemas, which come later. */
export const CALL_STATUSES = [
  "open",
  "under-way",
  "done",
  "cancelled",
] as const satisfies readonly CallStatus[];

/** What the list of calls shows, as its address says it. */
export interface CallFilter {
  scope: "mine" | "all";
  /** One day; without it today and later, with what is left over from before. */
  date: string | undefined;
  status: CallStatus | undefined;
  page: number;
}

/** A list of calls: what is left from earlier days, then the page that was asked for. */
export interface CallList {
  leftOver: Call[];
  page: AnswerOf<typeof ListCalls>;
}

const isDay = (text: string | null): text is string =>
  text !== null && /^\d{4}-\d{2}-\d{2}$/.test(text) && !Number.isNaN(Date.parse(text));

/** Reads the filter from the address; whatever is not understood there is left out. */
export function readCallFilter(search: URLSearchParams): CallFilter {
  const date = search.get("date");
  const page = Number(search.get("page") ?? 1);
  return {
    scope: search.get("scope") === "all" ? "all" : "mine",
    date: isDay(date) ? date : undefined,
    status: CALL_STATUSES.find((status) => status === search.get("status")),
    page: Number.isInteger(page) && page > 0 ? page : 1,
  };
}

/** Whether the list is the plain one: today and later, every status, first page. */
export function isPlain(filter: CallFilter): boolean {
  return filter.date === undefined && filter.status === undefined && filter.page === 1;
}

/** Fetches the calls of a filter; the plain list also has what is open or under way from earlier days. */
export async function fetchCalls(filter: CallFilter, today: string, signal: AbortSignal): Promise<CallList> {
  const { scope, date, status, page } = filter;
  const from = date === undefined && status === undefined ? today : undefined;
  const asked = callApi(listCalls, { query: { scope, date, from, status, page, pageSize: 50 }, signal });
  if (!isPlain(filter)) return { leftOver: [], page: await asked };
  const before = { scope, to: addDays(today, -1), pageSize: 50 };
  const [answer, open, underWay] = await Promise.all([
    asked,
    callApi(listCalls, { query: { ...before, status: "open" }, signal }),
    callApi(listCalls, { query: { ...before, status: "under-way" }, signal }),
  ]);
  const leftOver = [...open.items, ...underWay.items].toSorted((a, b) =>
    a.scheduledFor.localeCompare(b.scheduledFor),
  );
  return { leftOver, page: answer };
}

/** Calls kept whole on the phone at most, so that a morning's list opens in a basement. */
const KEPT_CALLS = 20;

/**
 * Keeps the calls of a list and their units whole on this phone, so that each opens without a signal. Best effort: what cannot be
 * fetched now is fetched when it is opened.
 */
export async function keepCalls(calls: readonly Call[]): Promise<void> {
  const { writeDocument } = await import("#lib/store/documents.ts");
  const wanted = calls
    .filter((call) => call.status === "open" || call.status === "under-way")
    .slice(0, KEPT_CALLS);
  const keep = async (key: string, value: CallDetail | UnitDetail) => {
    await writeDocument(key, value);
    await writeDocument(`at:${key}`, Date.now());
  };
  for (const call of wanted) {
    try {
      await keep(`call:${call.id}`, await callApi(readCall, { params: { callId: call.id } }));
      await keep(`unit:${call.unit.id}`, await callApi(readUnit, { params: { unitId: call.unit.id } }));
    } catch (problem) {
      if (problem instanceof ApiProblem && problem.code === "offline") return;
    }
  }
}
