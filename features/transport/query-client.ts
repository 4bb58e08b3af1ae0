import { QueryCache, QueryClient } from '@tanstack/react-query';

import { isRefusal, problemOf } from './problem';
import { endSession } from './session-end';
import { STALE } from './stale';

/** One client per page; a refusal is final, a broken line is tried twice more. */
export function createQueryClient(): QueryClient {
  const client: QueryClient = new QueryClient({
    // Nothing is being typed into what is only read; forms say it in their place instead.
    queryCache: new QueryCache({
      onError: (error) => {
        if (isRefusal(error, 'unauthenticated')) endSession(client);
      },
    }),
    defaultOptions: {
      queries: {
        staleTime: STALE.short,
        retry: (failures, error) => problemOf(error).kind !== 'refused' && failures < 2,
        refetchOnWindowFocus: true,
      },
      mutations: { retry: false, networkMode: 'always' },
    },
  });
  return client;
}
