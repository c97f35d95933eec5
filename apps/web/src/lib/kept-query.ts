import { useQuery } from "@tanstack/react-query";
import type { UseQueryResult } from "@tanstack/react-query";
import { ApiProblem } from "./api-client.ts";

/** An answer with where it comes from: `keptAt` is set where there was no signal and this phone had kept it. */
export interface Kept<T> {
  value: T;
  keptAt?: number;
}

/**
 * Reads from the server and keeps the answer on this phone; without a signal it gives what was kept, with the
 * time. Errors other than "no signal" stay errors. The key has to name the person where the answer depends on
 * who asks.
 */
export function useKeptQuery<T>(
  key: string,
  fetchIt: (signal: AbortSignal) => Promise<T>,
  options: { enabled?: boolean; refetchInterval?: number } = {},
): UseQueryResult<Kept<T>> {
  return useQuery<Kept<T>>({
    queryKey: ["kept", key],
    ...options,
    // Without a signal there is still something to give, so the query never pauses.
    networkMode: "always",
    retry: false,
    queryFn: async ({ signal }) => {
      try {
        const value = await fetchIt(signal);
        void keep(key, value);
        return { value };
      } catch (problem) {
        if (!(problem instanceof ApiProblem) || problem.code !== "offline") throw problem;
        const kept = await recall<T>(key);
        if (!kept) throw problem;
        return kept;
      }
    },
  });
}

// The store is fetched apart, so that the shell paints before it.
const loadDocuments = () => import("./store/documents.ts");

async function keep(key: string, value: unknown): Promise<void> {
  try {
    const { writeDocument } = await loadDocuments();
    await writeDocument(key, value);
    await writeDocument(`at:${key}`, Date.now());
  } catch {
    // A phone without storage still shows what the server says.
  }
}

async function recall<T>(key: string): Promise<Kept<T> | undefined> {
  const { readDocument } = await loadDocuments();
  const value = await readDocument(key);
  const keptAt = await readDocument(`at:${key}`);
  return value === undefined
    ? undefined
    : { value: value as T, keptAt: typeof keptAt === "number" ? keptAt : 0 };
}
