import { useRouter } from 'expo-router';
import { useState } from 'react';

import { useShop } from '@/features/session';
import { Button } from '@/features/ui/button';
import { List, ListRow } from '@/features/ui/list-row';
import { Sheet } from '@/features/ui/sheet';

import { ROLE_WORDS } from '../words';

/** Leads to another of the person's shops; stands nowhere for people with one shop. */
export function ShopSwitch({ kind = 'secondary' }: { kind?: 'secondary' | 'onEnamel' }) {
  const { shop, memberships } = useShop();
  const router = useRouter();
  const [open, setOpen] = useState(false);
  if (memberships.length < 2) return null;
  return (
    <>
      <Button kind={kind} label="Switch shop" onPress={() => setOpen(true)} />
      <Sheet open={open} onClose={() => setOpen(false)} title="Your shops">
        <List label="Your shops">
          {memberships.map(({ shopId, shopName, role }) => (
            <ListRow
              key={shopId}
              label={shopName}
              current={shopId === shop.id}
              detail={ROLE_WORDS[role]}
              onPress={() => {
                setOpen(false);
                router.replace({ pathname: '/shops/[shopId]', params: { shopId } });
              }}
            />
          ))}
        </List>
      </Sheet>
    </>
  );
}
