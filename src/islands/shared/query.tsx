import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { useState, type ReactNode } from 'react';
import { ApiProblem } from './problem';

/** The react-query provider that every island with server data wraps itself in: one client an island. */
export function Query({ children }: { children: ReactNode }) {
  const [client] = useState(queryClient);
  return <QueryClientProvider client={client}>{children}</QueryClientProvider>;
}

/** Only a lost line is worth asking again; a refusal stays a refusal. */
function queryClient(): QueryClient {
  return new QueryClient({
    defaultOptions: {
      queries: {
        staleTime: 30_000,
        retry: (count, error) =>
          count < 2 && error instanceof ApiProblem && (error.status === 0 || error.status === 503),
      },
      // a reading or a save is sent again by the person, with its own key
      mutations: { retry: false, networkMode: 'always' },
    },
  });
}
