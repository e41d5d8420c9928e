import { MutationCache, QueryCache, QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { useState, type ReactNode } from 'react';
import { sessionQuery } from '../features/session/api/session.ts';
import { ApiError } from '../lib/api-error.ts';

/** What the service answers to a console whose session has ended: a call without a session is one without a key. */
const NOBODY = new Set(['not-signed-in', 'missing-key']);

function createQueryClient(): QueryClient {
  function noticeSessionEnd(error: Error) {
    // It shows in whichever call comes next; the layout then asks for the password over the page as it stands.
    if (error instanceof ApiError && NOBODY.has(error.code)) client.setQueryData(sessionQuery.queryKey, null);
  }
  const client = new QueryClient({
    queryCache: new QueryCache({ onError: noticeSessionEnd }),
    mutationCache: new MutationCache({ onError: noticeSessionEnd }),
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
