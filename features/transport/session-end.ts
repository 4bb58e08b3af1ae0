import { useQueryClient, type QueryClient } from '@tanstack/react-query';

/** Under this key stands who is signed in; null sends a shop's pages to the sign-in page and back. */
export const SESSION_KEY = ['session'] as const;

export function endSession(client: QueryClient): void {
  client.setQueryData(SESSION_KEY, null);
}

/** For a form that learnt from a refusal that its person is signed out: leads to the sign-in page. */
export function useEndSession(): () => void {
  const client = useQueryClient();
  return () => endSession(client);
}
