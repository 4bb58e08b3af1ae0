import {
  infiniteQueryOptions,
  queryOptions,
  useMutation,
  useQueryClient,
} from '@tanstack/react-query';

import {
  wheel,
  wheelPage,
  type CreateWheelRequest,
  type UpdateWheelRequest,
} from '@/shared/contracts/wheels';
import { recordedEntry, type RecordEntryRequest } from '@/shared/contracts/wheel-entries';
import { request, STALE } from '@/features/transport';

const at = (shopId: string, id?: string) => `/api/shops/${shopId}/wheels${id ? `/${id}` : ''}`;

export const wheelQueries = {
  /** Every page of every search below this key. */
  all: (shopId: string) => ['wheels', shopId] as const,
  list: (shopId: string, search: string) =>
    infiniteQueryOptions({
      queryKey: [...wheelQueries.all(shopId), 'list', search],
      queryFn: ({ signal, pageParam }) => {
        const query = new URLSearchParams({
          ...(search ? { search } : {}),
          ...(pageParam ? { after: pageParam } : {}),
        });
        return request(wheelPage, `${at(shopId)}?${query}`, { signal });
      },
      initialPageParam: '',
      getNextPageParam: (last) => last.next,
      staleTime: STALE.short,
    }),
  detail: (shopId: string, wheelId: string) =>
    queryOptions({
      queryKey: [...wheelQueries.all(shopId), 'detail', wheelId],
      queryFn: ({ signal }) => request(wheel, at(shopId, wheelId), { signal }),
      staleTime: STALE.short,
    }),
};

/** A new wheel where `version` is absent, else an edit of that version. */
export function useSaveWheel(shopId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (save: { id: string; body: CreateWheelRequest | UpdateWheelRequest }) =>
      'version' in save.body
        ? request(wheel, at(shopId, save.id), { method: 'PUT', body: save.body })
        : request(wheel, at(shopId), { method: 'POST', body: save.body }),
    onSuccess: () => client.invalidateQueries({ queryKey: wheelQueries.all(shopId) }),
  });
}

/** Writes down a step of a wheel's life. */
export function useRecordEntry(shopId: string, wheelId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: RecordEntryRequest) =>
      request(recordedEntry, `${at(shopId, wheelId)}/entries`, { method: 'POST', body }),
    onSettled: () => client.invalidateQueries({ queryKey: wheelQueries.all(shopId) }),
  });
}
