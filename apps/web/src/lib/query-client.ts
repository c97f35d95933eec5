import { QueryClient } from "@tanstack/react-query";
import { ApiProblem } from "./api-client.ts";

/** Reads only: what is recorded in the field goes through the local store, never through a mutation cache. */
export const queryClient = new QueryClient({
  defaultOptions: {
    queries: {
      staleTime: 15_000,
      refetchOnWindowFocus: true,
      retry: (failures, error) =>
        !(error instanceof ApiProblem && error.status >= 400 && error.status < 500) && failures < 2,
    },
  },
});
