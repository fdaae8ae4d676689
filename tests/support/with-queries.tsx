import { QueryClient, QueryClientProvider } from "@tanstack/react-query";
import { configure } from "@testing-library/react";
import type { ReactNode } from "react";

/* Looking up a role in a table of hundreds of cells takes jsdom most of a second. */
configure({ asyncUtilTimeout: 6_000 });

/** A screen with a query cache of its own that asks once and gives up. */
export function WithQueries({ children }: { readonly children: ReactNode }) {
  const client = new QueryClient({
    defaultOptions: { queries: { retry: false }, mutations: { retry: false } },
  });
  return <QueryClientProvider client={client}>{children}</QueryClientProvider>;
}
