import { useRouter } from 'expo-router';
import { useState } from 'react';

import { useShop } from '@/features/session';
import { newId } from '@/features/transport';
import { Button } from '@/features/ui/button';
import { List, ListRow } from '@/features/ui/list-row';
import { Sheet } from '@/features/ui/sheet';
import { OPERATIONS, type Operation } from '@/shared/domain/setups';

import { OPERATION_WORDS } from '../words';

const OPERATION_DETAILS: Record<Operation, string> = {
  jaws: 'True the jaws of a chuck from the run-out of a bar',
  bore: 'A hole, true and to size',
  outside: 'A shaft or journal, true and to size',
  taper: 'A cone outside or inside, or a lathe centre',
};

/** Starts a setup: asks for the operation, and leads to the planner under a new address. */
export function NewSetup({ kind = 'primary' }: { kind?: 'primary' | 'secondary' }) {
  const { shop, may } = useShop();
  const router = useRouter();
  const [open, setOpen] = useState(false);
  if (!may('setup:draft')) return null;
  return (
    <>
      <Button kind={kind} icon="add" label="New setup" onPress={() => setOpen(true)} />
      <Sheet open={open} onClose={() => setOpen(false)} title="What is to be ground?">
        <List label="Operations">
          {OPERATIONS.map((operation) => (
            <ListRow
              key={operation}
              label={OPERATION_WORDS[operation]}
              detail={OPERATION_DETAILS[operation]}
              onPress={() => {
                setOpen(false);
                router.push({
                  pathname: '/shops/[shopId]/setups/[setupId]',
                  params: { shopId: shop.id, setupId: newId(), operation },
                });
              }}
            />
          ))}
        </List>
      </Sheet>
    </>
  );
}
