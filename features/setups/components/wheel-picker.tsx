import { useInfiniteQuery } from '@tanstack/react-query';
import { useDeferredValue, useState } from 'react';

import { useShop } from '@/features/session';
import { problemOf, problemWords } from '@/features/transport';
import { wheelQueries } from '@/features/wheels';
import { Button } from '@/features/ui/button';
import { Stack } from '@/features/ui/card';
import { Field } from '@/features/ui/field';
import { Notice } from '@/features/ui/notice';
import { RadioRows } from '@/features/ui/radio-row';
import { Sheet } from '@/features/ui/sheet';
import { Skeleton } from '@/features/ui/skeleton';
import { Small } from '@/features/ui/text';
import type { Wheel } from '@/shared/contracts/wheels';
import { formatQuantity } from '@/shared/units/format';

interface WheelPickerProps {
  open: boolean;
  onClose: () => void;
  chosen: string | null;
  onChoose: (wheelId: string) => void;
  /** Takes a wheel that is not on the Rack. */
  onType: () => void;
}

/** The Rack as a list to choose from; wheels out of use can be read, not chosen. */
export function WheelPicker({ open, onClose, chosen, onChoose, onType }: WheelPickerProps) {
  return (
    <Sheet
      open={open}
      onClose={onClose}
      title="Choose the wheel"
      footer={
        <Button
          label="Type a wheel in"
          icon="edit"
          wide
          onPress={() => {
            onType();
            onClose();
          }}
        />
      }
    >
      {open ? (
        <RackList
          chosen={chosen}
          onChoose={(wheelId) => {
            onChoose(wheelId);
            onClose();
          }}
        />
      ) : null}
    </Sheet>
  );
}

function RackList({ chosen, onChoose }: Pick<WheelPickerProps, 'chosen' | 'onChoose'>) {
  const { shop, units } = useShop();
  const [search, setSearch] = useState('');
  const wheels = useInfiniteQuery(
    wheelQueries.list(shop.id, { search: useDeferredValue(search.trim()) }),
  );
  const found = wheels.data?.pages.flatMap((page) => page.items) ?? [];
  const size = (value: number) => formatQuantity({ value, unit: 'mm' }, units, { withUnit: false });
  const detail = ({ data }: Wheel) =>
    `${size(data.diameterNowMm)} × ${size(data.widthMm)} × ${formatQuantity({ value: data.holeMm, unit: 'mm' }, units)}`;
  return (
    <Stack>
      <Field name="wheel-search" label="Tag or marking" value={search} onChangeText={setSearch} />
      {wheels.error ? <Notice kind="error">{problemWords(problemOf(wheels.error))}</Notice> : null}
      {wheels.isPending ? <Skeleton label="Looking through the Rack" /> : null}
      {wheels.data && found.length === 0 ? (
        <Small>
          {search
            ? 'No wheel has this in its tag or marking.'
            : 'The Rack is empty. Type a wheel in.'}
        </Small>
      ) : null}
      {found.length > 0 ? (
        <RadioRows
          name="wheel-list"
          label="Wheels on the Rack"
          options={found.map((wheel) => ({
            value: wheel.id,
            label: [wheel.tag, wheel.data.marking].filter(Boolean).join(' · '),
            detail: detail(wheel),
            ...(lockedBecause(wheel) ? { lockedBecause: lockedBecause(wheel) } : {}),
          }))}
          value={chosen}
          onChange={onChoose}
        />
      ) : null}
      {wheels.hasNextPage ? (
        <Button
          label="Show more"
          busy={wheels.isFetchingNextPage}
          onPress={() => void wheels.fetchNextPage()}
        />
      ) : null}
    </Stack>
  );
}

function lockedBecause({ data }: Wheel): string | undefined {
  if (data.state === 'set aside') return `Set aside: ${data.setAsideReason ?? 'no reason given'}`;
  return data.state === 'scrapped' ? 'Scrapped' : undefined;
}
