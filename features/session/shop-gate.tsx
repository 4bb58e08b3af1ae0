import { useQuery } from '@tanstack/react-query';
import { Redirect, useGlobalSearchParams, usePathname } from 'expo-router';
import { useState, type ReactNode } from 'react';

import { isRefusal, problemOf, problemWords } from '@/features/transport';
import { Button } from '@/features/ui/button';
import { EmptyState } from '@/features/ui/empty-state';
import { ButtonLink } from '@/features/ui/link';
import { Notice } from '@/features/ui/notice';
import { Screen } from '@/features/ui/screen';
import { Skeleton } from '@/features/ui/skeleton';

import { sessionQueries } from './queries';
import { ShopProvider } from './shop-context';

/**
 * Lets the members of the address's shop in. Everyone else sees the same skeleton until the session is known, then
 * the sign-in page, which leads back here.
 */
export function ShopGate({ children }: { children: ReactNode }) {
  const [open, setOpen] = useState(false);
  const { shopId, path } = useShopAddress(open);
  const session = useQuery(sessionQueries.current());
  const person = session.data;
  const shop = useQuery({ ...sessionQueries.shop(shopId), enabled: Boolean(person) });

  if (session.isPending) return <Waiting />;
  if (session.data === null) return <ToSignIn from={path} />;
  const failure = session.error ?? shop.error;
  if (failure && !shop.data) {
    if (isRefusal(failure, 'not-found')) return <NoSuchShop />;
    return (
      <Screen title="Ringtrue">
        <Notice
          kind="error"
          action={
            <Button
              label="Try again"
              onPress={() => void (session.error ? session.refetch() : shop.refetch())}
            />
          }
        >
          {problemWords(problemOf(failure))}
        </Notice>
      </Screen>
    );
  }
  if (!person || !shop.data) return <Waiting />;
  const role = person.memberships.find((membership) => membership.shopId === shopId)?.role;
  if (!role) return <NoSuchShop />;
  if (!open) setOpen(true);
  return (
    <ShopProvider key={shopId} shop={shop.data} person={person} role={role}>
      {children}
    </ShopProvider>
  );
}

/**
 * The shop and the path of the address. Pages that lie over the shop's screens name no shop, and until those screens
 * stand the router may forget what follows the shop: the last address that was known holds.
 */
function useShopAddress(screensStand: boolean) {
  const { shopId } = useGlobalSearchParams<{ shopId?: string }>();
  const path = usePathname();
  const [held, setHeld] = useState({ shopId: shopId ?? '', path });
  const known = shopId !== undefined && (screensStand || shopId !== held.shopId);
  if (!known || (shopId === held.shopId && path === held.path)) return held;
  const now = { shopId, path };
  setHeld(now);
  return now;
}

/** Holds the address that was asked for: with the shop's screens gone, the router forgets it. */
function ToSignIn({ from }: { from: string }) {
  const [next] = useState(from);
  return <Redirect href={{ pathname: '/sign-in', params: { next } }} />;
}

const Waiting = () => (
  <Screen title="Ringtrue">
    <Skeleton label="Loading your shop" />
  </Screen>
);

const NoSuchShop = () => (
  <Screen title="No such shop">
    <EmptyState
      title="There is no shop at this address"
      action={<ButtonLink label="To my shops" href="/" />}
    >
      The address may be mistyped, or you may not belong to this shop. Its lead can invite you.
    </EmptyState>
  </Screen>
);
