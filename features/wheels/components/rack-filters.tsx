import { useLocalSearchParams, useRouter } from 'expo-router';
import { useState } from 'react';

import { useShop } from '@/features/session';
import { Button } from '@/features/ui/button';
import { Row, Stack } from '@/features/ui/card';
import { Chip, FilterChip } from '@/features/ui/chip';
import { RadioRows } from '@/features/ui/radio-row';
import { Sheet } from '@/features/ui/sheet';
import { useLayout } from '@/features/ui/use-layout';

import type { WheelSearch } from '../queries';
import {
  FILTER_GROUPS,
  filterWords,
  GROUP_KEYS,
  GROUP_LABELS,
  SORTS,
  type FilterGroup,
  type SortName,
} from '../rack-filters';
import { FilterFields } from './filter-fields';

type Opened = FilterGroup | 'sort' | 'all' | null;

const cleared = (groups: readonly FilterGroup[]) =>
  Object.fromEntries(groups.flatMap((group) => GROUP_KEYS[group]).map((key) => [key, '']));

function titleOf(opened: Opened): string {
  if (opened === 'sort') return 'Sort';
  return opened === null || opened === 'all' ? 'Filters' : GROUP_LABELS[opened];
}

/** What narrows and orders the rack: chips on a wide screen, one sheet on a phone. It stands in the address. */
export function RackFilters({ search, today }: { search: WheelSearch; today: string }) {
  const { units } = useShop();
  const { wide } = useLayout();
  const router = useRouter();
  const address = useLocalSearchParams<Record<string, string>>();
  const [opened, setOpened] = useState<Opened>(null);
  const change = (parts: Record<string, string>) =>
    router.setParams(
      Object.fromEntries(Object.entries(parts).map(([key, value]) => [key, value || undefined])),
    );
  const clear = (group: FilterGroup) => change(cleared([group]));
  const words = (group: FilterGroup) => filterWords(group, search, { units, today });
  const active = FILTER_GROUPS.filter((group) => words(group) !== null);
  const sorted = SORTS.find(({ value }) => value === address.sort) ?? SORTS[0];
  const shown = wide ? FILTER_GROUPS : active;
  const groups = opened === 'all' ? FILTER_GROUPS : FILTER_GROUPS.filter((one) => one === opened);
  const title = titleOf(opened);
  return (
    <>
      <Row gap={2} align="center">
        {wide ? null : (
          <Button
            label={active.length === 0 ? 'Filters' : `Filters, ${active.length} on`}
            onPress={() => setOpened('all')}
          />
        )}
        {shown.map((group) => {
          const on = words(group);
          if (on !== null)
            return (
              <FilterChip
                key={group}
                label={on}
                onPress={() => (group === 'usable' ? clear(group) : setOpened(group))}
                onRemove={() => clear(group)}
              />
            );
          return (
            <Chip
              key={group}
              label={GROUP_LABELS[group]}
              on={false}
              onToggle={() => (group === 'usable' ? change({ usable: 'yes' }) : setOpened(group))}
            />
          );
        })}
        {active.length > 1 ? (
          <Button kind="quiet" label="Clear all" onPress={() => change(cleared(active))} />
        ) : null}
        <Button kind="quiet" label={`Sort: ${sorted.label}`} onPress={() => setOpened('sort')} />
      </Row>
      <Sheet
        open={opened !== null}
        onClose={() => setOpened(null)}
        title={title}
        shape={opened === 'all' ? 'panel' : 'box'}
        footer={
          <Button kind="primary" wide label="Show the wheels" onPress={() => setOpened(null)} />
        }
      >
        {opened === 'sort' ? (
          <RadioRows<SortName>
            name="rack-sort"
            label="Order of the wheels"
            value={sorted.value}
            onChange={(sort) => change({ sort: sort === 'tag' ? '' : sort })}
            options={SORTS}
          />
        ) : (
          <Stack>
            {groups.map((group) => (
              <FilterFields
                key={group}
                group={group}
                search={search}
                today={today}
                onChange={change}
              />
            ))}
          </Stack>
        )}
      </Sheet>
    </>
  );
}
