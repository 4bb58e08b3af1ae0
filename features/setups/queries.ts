import {
  infiniteQueryOptions,
  queryOptions,
  useMutation,
  useQueryClient,
} from '@tanstack/react-query';

import {
  setup,
  setupPage,
  type CreateSetupRequest,
  type DuplicateSetupRequest,
  type SetupQuery,
  type UpdateSetupRequest,
} from '@/shared/contracts/setups';
import { request, STALE } from '@/features/transport';

const at = (shopId: string, id?: string) => `/api/shops/${shopId}/setups${id ? `/${id}` : ''}`;

export type SetupFilter = Pick<SetupQuery, 'search' | 'operation' | 'state'>;

export const setupQueries = {
  /** Every page of every search below this key. */
  all: (shopId: string) => ['setups', shopId] as const,
  lists: (shopId: string) => [...setupQueries.all(shopId), 'list'] as const,
  list: (shopId: string, filter: SetupFilter) =>
    infiniteQueryOptions({
      queryKey: [...setupQueries.lists(shopId), filter],
      queryFn: ({ signal, pageParam }) => {
        const given = Object.entries({ ...filter, after: pageParam }).filter(([, value]) => value);
        return request(
          setupPage,
          `${at(shopId)}?${new URLSearchParams(Object.fromEntries(given))}`,
          {
            signal,
          },
        );
      },
      initialPageParam: '',
      getNextPageParam: (last) => last.next,
      staleTime: STALE.short,
    }),
  detail: (shopId: string, setupId: string) =>
    queryOptions({
      queryKey: [...setupQueries.all(shopId), 'detail', setupId],
      queryFn: ({ signal }) => request(setup, at(shopId, setupId), { signal }),
      staleTime: 0,
    }),
};

/** A new setup where `version` is absent, else an edit of that version. */
export function useSaveSetup(shopId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (save: { id: string; body: CreateSetupRequest | UpdateSetupRequest }) =>
      'version' in save.body
        ? request(setup, at(shopId, save.id), { method: 'PUT', body: save.body })
        : request(setup, at(shopId), { method: 'POST', body: save.body }),
    onSuccess: (saved) => {
      client.setQueryData(setupQueries.detail(shopId, saved.id).queryKey, saved);
      return client.invalidateQueries({ queryKey: setupQueries.lists(shopId) });
    },
  });
}

export function useDuplicateSetup(shopId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ from, body }: { from: string; body: DuplicateSetupRequest }) =>
      request(setup, `${at(shopId, from)}/duplicate`, { method: 'POST', body }),
    onSuccess: () => client.invalidateQueries({ queryKey: setupQueries.all(shopId) }),
  });
}

/** Takes a setup out of use; it stays readable. */
export function useRetireSetup(shopId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ id, version }: { id: string; version: number }) =>
      request(setup, `${at(shopId, id)}/retire`, { method: 'POST', body: { version } }),
    onSuccess: () => client.invalidateQueries({ queryKey: setupQueries.all(shopId) }),
  });
}
