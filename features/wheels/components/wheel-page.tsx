import { useInfiniteQuery, useQuery } from '@tanstack/react-query';
import { useState } from 'react';

import { LoadProblem, MorePages, shopDay } from '@/features/records';
import { useShop } from '@/features/session';
import { isRefusal } from '@/features/transport';
import { Button } from '@/features/ui/button';
import { Stack } from '@/features/ui/card';
import { EmptyState } from '@/features/ui/empty-state';
import { ButtonLink } from '@/features/ui/link';
import { Skeleton } from '@/features/ui/skeleton';

import { wheelQueries } from '../queries';
import { EntryList } from './entry-list';
import { LifePicture } from './life-picture';
import { SetupsUsing } from './setups-using';
import { SpindleList } from './spindle-list';
import { WheelDetail, WheelRecord } from './wheel-detail';
import { WheelSteps } from './wheel-steps';

/** One wheel and what became of it. Stands in a PlanReader. */
export function WheelPage({ wheelId }: { wheelId: string }) {
  const { shop } = useShop();
  const query = useQuery(wheelQueries.life(shop.id, wheelId));
  const [whole, setWhole] = useState(false);
  const entries = useInfiniteQuery({
    ...wheelQueries.entries(shop.id, wheelId),
    enabled: whole,
  });
  const rack = { pathname: '/shops/[shopId]/wheels', params: { shopId: shop.id } } as const;
  if (!query.data) {
    if (query.isPending) return <Skeleton label="Loading the wheel" />;
    if (!isRefusal(query.error, 'not-found'))
      return <LoadProblem error={query.error} onRetry={query.refetch} />;
    return (
      <EmptyState title="No such wheel" action={<ButtonLink label="To the rack" href={rack} />}>
        The address may be mistyped, or the wheel belongs to another shop.
      </EmptyState>
    );
  }
  const pages = whole ? entries.data?.pages : undefined;
  const life = pages
    ? {
        ...query.data,
        entries: { items: pages.flatMap(({ items }) => items), next: pages.at(-1)?.next ?? null },
      }
    : query.data;
  return (
    <Stack gap={6}>
      <WheelDetail life={life} today={shopDay(shop.timeZone)} />
      <WheelSteps life={life} />
      <LifePicture life={life} entries={life.entries.items} />
      <SpindleList life={life} />
      <Stack>
        <EntryList life={life} />
        {pages ? (
          <MorePages query={entries} label="Show earlier entries" />
        ) : life.entries.next === null ? null : (
          <Button
            label="Show earlier entries"
            busy={whole && entries.isFetching}
            onPress={() => setWhole(true)}
          />
        )}
      </Stack>
      <SetupsUsing setups={life.setups} />
      <WheelRecord wheel={life.wheel} />
    </Stack>
  );
}
