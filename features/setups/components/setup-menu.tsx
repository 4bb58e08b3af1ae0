import { useRouter } from 'expo-router';
import { useState } from 'react';

import { TextField } from '@/features/forms';
import { useShop } from '@/features/session';
import { newId, problemOf, problemWords } from '@/features/transport';
import { Button } from '@/features/ui/button';
import { Stack } from '@/features/ui/card';
import { Notice } from '@/features/ui/notice';
import { Segmented } from '@/features/ui/segmented';
import { Sheet } from '@/features/ui/sheet';
import { TEXT_LIMITS } from '@/shared/domain/limits';

import { usePlanner } from '../planner-context';
import { useDuplicateSetup } from '../queries';

interface SetupMenuProps {
  open: boolean;
  onClose: () => void;
  setupId: string;
  /** A copy is made of what the server holds; a draft it has not seen cannot be copied yet. */
  stored: boolean;
}

/** What concerns the setup as a whole. */
export function SetupMenu({ open, onClose, setupId, stored }: SetupMenuProps) {
  const { shop, units, setUnits } = useShop();
  const { values } = usePlanner();
  const router = useRouter();
  const duplicate = useDuplicateSetup(shop.id);
  const [copyId] = useState(newId);
  const copy = () =>
    duplicate.mutate(
      {
        from: setupId,
        body: { id: copyId, name: `${values.name}, copy`.slice(0, TEXT_LIMITS.name) },
      },
      {
        onSuccess: (made) => {
          onClose();
          router.replace({
            pathname: '/shops/[shopId]/setups/[setupId]',
            params: { shopId: shop.id, setupId: made.id },
          });
        },
      },
    );
  return (
    <Sheet open={open} onClose={onClose} title="This setup">
      <Stack>
        <TextField name="name" label="Name" maxLength={TEXT_LIMITS.name} />
        <Segmented
          name="units"
          label="Units"
          options={[
            { value: 'mm', label: 'mm' },
            { value: 'inch', label: 'inch' },
          ]}
          value={units}
          onChange={setUnits}
          hint="Shows what is typed in the other units; nothing stored changes."
        />
        {duplicate.error ? (
          <Notice kind="error">{problemWords(problemOf(duplicate.error))}</Notice>
        ) : null}
        <Button
          label="Make a copy"
          icon="copy"
          busy={duplicate.isPending}
          disabled={!stored}
          onPress={copy}
        />
      </Stack>
    </Sheet>
  );
}
