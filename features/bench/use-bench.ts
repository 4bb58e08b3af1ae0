import { useInfiniteQuery, useQuery } from '@tanstack/react-query';

import { machineQueries } from '@/features/machines';
import { shopDay } from '@/features/records';
import { useShop } from '@/features/session';
import { setupQueries } from '@/features/setups';
import { wheelQueries } from '@/features/wheels';

import { needingAttention, recentlyEdited, wheelsOut } from './attention';

/** What the bench shows, once everything it stands on is fetched; or why it is not. */
export function useBench() {
  const { shop, person } = useShop();
  const setups = useInfiniteQuery(setupQueries.list(shop.id, {}));
  const wheels = useInfiniteQuery(wheelQueries.list(shop.id, {}));
  const lathes = useQuery(machineQueries.lathes(shop.id));
  const grinders = useQuery(machineQueries.grinders(shop.id));
  const queries = [setups, wheels, lathes, grinders];
  const failed = queries.find(({ data, error }) => error && !data);
  if (failed)
    return {
      bench: null,
      error: failed.error,
      retry: () => queries.forEach((query) => void query.refetch()),
    };
  if (!setups.data || !wheels.data || !lathes.data || !grinders.data)
    return { bench: null, error: null, retry: () => undefined };
  const known = setups.data.pages.flatMap(({ items }) => items);
  const racked = wheels.data.pages.flatMap(({ items }) => items);
  const asking = needingAttention(known, person.name);
  return {
    bench: {
      counts: {
        lathes: lathes.data.items.length,
        grinders: grinders.data.items.length,
        wheels: racked.length,
        setups: known.length,
      },
      asking,
      recent: recentlyEdited(known, asking),
      out: wheelsOut(racked, shopDay(shop.timeZone)),
      /** False when there are more setups or wheels than were looked at. */
      whole: !setups.hasNextPage && !wheels.hasNextPage,
    },
    error: null,
    retry: () => undefined,
  };
}
