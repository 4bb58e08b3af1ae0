import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';

import {
  grinder,
  grinderList,
  lathe,
  latheList,
  type CreateGrinderRequest,
  type CreateLatheRequest,
  type UpdateGrinderRequest,
  type UpdateLatheRequest,
} from '@/shared/contracts/machines';
import { request, STALE } from '@/features/transport';

const at = (shopId: string, kind: 'lathes' | 'grinders', id?: string) =>
  `/api/shops/${shopId}/${kind}${id ? `/${id}` : ''}`;

export const machineQueries = {
  lathes: (shopId: string) =>
    queryOptions({
      queryKey: ['lathes', shopId],
      queryFn: ({ signal }) => request(latheList, at(shopId, 'lathes'), { signal }),
      staleTime: STALE.minute,
    }),
  grinders: (shopId: string) =>
    queryOptions({
      queryKey: ['grinders', shopId],
      queryFn: ({ signal }) => request(grinderList, at(shopId, 'grinders'), { signal }),
      staleTime: STALE.minute,
    }),
};

/** A new lathe where `version` is absent, else an edit of that version. */
export function useSaveLathe(shopId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (save: { id: string; body: CreateLatheRequest | UpdateLatheRequest }) =>
      'version' in save.body
        ? request(lathe, at(shopId, 'lathes', save.id), { method: 'PUT', body: save.body })
        : request(lathe, at(shopId, 'lathes'), { method: 'POST', body: save.body }),
    onSuccess: () => client.invalidateQueries({ queryKey: machineQueries.lathes(shopId).queryKey }),
  });
}

/** A new grinder where `version` is absent, else an edit of that version. */
export function useSaveGrinder(shopId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (save: { id: string; body: CreateGrinderRequest | UpdateGrinderRequest }) =>
      'version' in save.body
        ? request(grinder, at(shopId, 'grinders', save.id), { method: 'PUT', body: save.body })
        : request(grinder, at(shopId, 'grinders'), { method: 'POST', body: save.body }),
    onSuccess: () =>
      client.invalidateQueries({ queryKey: machineQueries.grinders(shopId).queryKey }),
  });
}
