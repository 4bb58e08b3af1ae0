import {
  infiniteQueryOptions,
  keepPreviousData,
  queryOptions,
  useMutation,
  useQueryClient,
} from '@tanstack/react-query';

import { request, STALE } from '@/features/transport';
import {
  recordedEntry,
  wheelEntryPage,
  wheelLife,
  type RecordEntryRequest,
} from '@/shared/contracts/wheel-entries';
import {
  wheel,
  wheelPage,
  wheelPlaces,
  type CreateWheelRequest,
  type UpdateWheelRequest,
  type WheelQuery,
} from '@/shared/contracts/wheels';

/** What a list of wheels is asked for; what is left out narrows nothing. */
export type WheelSearch = Partial<Omit<WheelQuery, 'after' | 'limit'>>;

const at = (shopId: string, id?: string) => `/api/shops/${shopId}/wheels${id ? `/${id}` : ''}`;

/** As many entries as one page may hold: the life of most wheels at once. */
const ENTRIES = 100;

export const wheelQueries = {
  /** Every page of every search below this key. */
  all: (shopId: string) => ['wheels', shopId] as const,
  list: (shopId: string, search: WheelSearch) =>
    infiniteQueryOptions({
      queryKey: [...wheelQueries.all(shopId), 'list', search],
      queryFn: ({ signal, pageParam }) => {
        const given = Object.entries({ ...search, after: pageParam }).flatMap(([key, value]) =>
          value === undefined || value === '' ? [] : [[key, String(value)]],
        );
        return request(wheelPage, `${at(shopId)}?${new URLSearchParams(given)}`, { signal });
      },
      initialPageParam: '',
      getNextPageParam: (last) => last.next,
      // While a filter is changed the rows of before stay, and nothing jumps.
      placeholderData: keepPreviousData,
      staleTime: STALE.short,
    }),
  detail: (shopId: string, wheelId: string) =>
    queryOptions({
      queryKey: [...wheelQueries.all(shopId), 'detail', wheelId],
      queryFn: ({ signal }) => request(wheel, at(shopId, wheelId), { signal }),
      staleTime: STALE.short,
    }),
  life: (shopId: string, wheelId: string) =>
    queryOptions({
      queryKey: [...wheelQueries.all(shopId), 'life', wheelId],
      queryFn: ({ signal }) => request(wheelLife, `${at(shopId, wheelId)}/life`, { signal }),
      staleTime: STALE.short,
    }),
  entries: (shopId: string, wheelId: string) =>
    infiniteQueryOptions({
      queryKey: [...wheelQueries.all(shopId), 'entries', wheelId],
      queryFn: ({ signal, pageParam }) => {
        const query = new URLSearchParams({ limit: String(ENTRIES) });
        if (pageParam) query.set('after', pageParam);
        return request(wheelEntryPage, `${at(shopId, wheelId)}/entries?${query}`, { signal });
      },
      initialPageParam: '',
      getNextPageParam: (last) => last.next,
      staleTime: STALE.short,
    }),
  places: (shopId: string) =>
    queryOptions({
      queryKey: [...wheelQueries.all(shopId), 'places'],
      queryFn: ({ signal }) =>
        request(wheelPlaces, `/api/shops/${shopId}/wheel-places`, { signal }),
      staleTime: STALE.minute,
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

const ofShop = (shopId: string) => ({
  predicate: ({ queryKey }: { queryKey: readonly unknown[] }) => queryKey[1] === shopId,
});

/** Writes down a step of a wheel's life. Plans rest on wheels: whatever was fetched of the shop is old then. */
export function useRecordEntry(shopId: string, wheelId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: RecordEntryRequest) =>
      request(recordedEntry, `${at(shopId, wheelId)}/entries`, { method: 'POST', body }),
    onSuccess: () => client.invalidateQueries(ofShop(shopId)),
    // Refused because something else has happened to it: what is shown is old. Nobody waits for that.
    onError: () => void client.invalidateQueries(ofShop(shopId)),
  });
}
