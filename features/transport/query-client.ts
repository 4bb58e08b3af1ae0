import { QueryClient } from '@tanstack/react-query';

import { problemOf } from './problem';
import { STALE } from './stale';

/** One client per signed-in page; a refusal is final, a broken line is tried twice more. */
export function createQueryClient(): QueryClient {
  return new QueryClient({
    defaultOptions: {
      queries: {
        staleTime: STALE.short,
        retry: (failures, error) => problemOf(error).kind !== 'refused' && failures < 2,
        refetchOnWindowFocus: true,
      },
      mutations: { retry: false, networkMode: 'always' },
    },
  });
}
