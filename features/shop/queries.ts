import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';

import { sessionQueries } from '@/features/session';
import { request, STALE } from '@/features/transport';
import { shop, shopMembers, type UpdateShopRequest } from '@/shared/contracts/shops';

export const shopQueries = {
  members: (shopId: string) =>
    queryOptions({
      queryKey: ['shop', shopId, 'members'],
      queryFn: ({ signal }) => request(shopMembers, `/api/shops/${shopId}/members`, { signal }),
      staleTime: STALE.minute,
    }),
};

export function useUpdateShop(shopId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: UpdateShopRequest) =>
      request(shop, `/api/shops/${shopId}`, { method: 'PATCH', body }),
    onSuccess: (saved) => {
      client.setQueryData(sessionQueries.shop(shopId).queryKey, saved);
      // The shop's name also stands in the list of one's shops.
      return client.invalidateQueries({ queryKey: sessionQueries.current().queryKey });
    },
  });
}
