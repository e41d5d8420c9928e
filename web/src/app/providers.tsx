import { QueryCache, QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { useState, type ReactNode } from 'react';
import { sessionQuery } from '../features/session/api/session.ts';
import { ApiError } from '../lib/api-error.ts';

function createQueryClient(): QueryClient {
  const client: QueryClient = new QueryClient({
    queryCache: new QueryCache({
      onError: (error, query) => {
        // A session that ended shows in whichever query comes next: the layout then leads to the sign-in page and back.
        if (error instanceof ApiError && error.code === 'not-signed-in' && query.queryKey[0] !== 'session') void client.invalidateQueries(sessionQuery);
      },
    }),
    defaultOptions: {
      queries: { staleTime: 10_000, retry: (failures, error) => !(error instanceof ApiError) && failures < 2 },
    },
  });
  return client;
}

export function Providers({ children }: { children: ReactNode }) {
  const [client] = useState(createQueryClient);
  return <QueryClientProvider client={client}>{children}</QueryClientProvider>;
}
