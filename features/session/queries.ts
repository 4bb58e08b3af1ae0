import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';

import { session, type SignInRequest, type SignUpRequest } from '@/shared/contracts/session';
import { shop } from '@/shared/contracts/shops';
import { request, requestNothing, SESSION_KEY, STALE } from '@/features/transport';

export const sessionQueries = {
  current: () =>
    queryOptions({
      queryKey: SESSION_KEY,
      queryFn: ({ signal }) => request(session, '/api/session', { signal }),
      staleTime: STALE.session,
    }),
  shop: (shopId: string) =>
    queryOptions({
      queryKey: ['shop', shopId],
      queryFn: ({ signal }) => request(shop, `/api/shops/${shopId}`, { signal }),
      staleTime: STALE.minute,
    }),
};

export function useSignIn() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: SignInRequest) => request(session, '/api/session', { method: 'POST', body }),
    onSuccess: (answer) => {
      client.clear();
      client.setQueryData(sessionQueries.current().queryKey, answer);
    },
  });
}

export function useSignUp() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: SignUpRequest) => request(session, '/api/sign-up', { method: 'POST', body }),
    onSuccess: (answer) => {
      client.clear();
      client.setQueryData(sessionQueries.current().queryKey, answer);
    },
  });
}

/** Signs out and loads the first page anew: nothing the server had told this page stays in its memory. */
export function useSignOut() {
  return useMutation({
    mutationFn: () => requestNothing('/api/session', { method: 'DELETE' }),
    onSuccess: () => window.location.replace('/'),
  });
}
