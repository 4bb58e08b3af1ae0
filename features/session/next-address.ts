import type { Session } from '@/shared/contracts/session';

/**
 * Where a person goes once signed in: the address they first asked for, else the Bench of their first shop.
 * Only addresses of this site are followed.
 */
export function afterSignIn(session: NonNullable<Session>, next: string | undefined): string {
  if (next && /^\/(?![/\\])/.test(next)) return next;
  const first = session.memberships[0];
  return first ? `/shops/${first.shopId}` : '/';
}
