import { QueryClientProvider } from "@tanstack/react-query";
import { RouterProvider } from "react-router-dom";
import { queryClient } from "#lib/query-client.ts";
import { SessionProvider } from "#lib/session.tsx";
import { router } from "./router.tsx";

/** The client: providers around the router. */
export function App() {
  return (
    <QueryClientProvider client={queryClient}>
      <SessionProvider>
        <RouterProvider router={router} />
      </SessionProvider>
    </QueryClientProvider>
  );
}
