import { useQuery } from '@tanstack/react-query';
import { useLocalSearchParams } from 'expo-router';

import { PlanReader } from '@/features/plan';
import { LoadProblem, shopDay } from '@/features/records';
import { useShop } from '@/features/session';
import { isRefusal } from '@/features/transport';
import { EmptyState } from '@/features/ui/empty-state';
import { ButtonLink } from '@/features/ui/link';
import { Screen } from '@/features/ui/screen';
import { Skeleton } from '@/features/ui/skeleton';

import { WheelDetail } from './components/wheel-detail';
import { wheelQueries } from './queries';
import { WheelForm } from './wheel-form';

/** One wheel of the rack: read, and edited where the address asks for it and the person may. */
export function WheelScreen() {
  const { wheelId, edit } = useLocalSearchParams<{ wheelId: string; edit?: string }>();
  const { shop, units, may } = useShop();
  const query = useQuery(wheelQueries.detail(shop.id, wheelId));
  const rack = { pathname: '/shops/[shopId]/wheels', params: { shopId: shop.id } } as const;
  const wheel = query.data;
  if (wheel && edit && may('wheel:edit'))
    return (
      <WheelForm
        key={wheel.id}
        wheel={wheel}
        backTo={{ ...rack, params: { ...rack.params, wheel: wheel.id } }}
      />
    );
  const content = () => {
    if (wheel) return <WheelDetail wheel={wheel} today={shopDay(shop.timeZone)} />;
    if (query.isPending) return <Skeleton label="Loading the wheel" />;
    if (!isRefusal(query.error, 'not-found'))
      return <LoadProblem error={query.error} onRetry={query.refetch} />;
    return (
      <EmptyState title="No such wheel" action={<ButtonLink label="To the rack" href={rack} />}>
        The address may be mistyped, or the wheel belongs to another shop.
      </EmptyState>
    );
  };
  return (
    <PlanReader units={units}>
      <Screen title={wheel?.tag ?? 'Wheel'} over={shop.name} backTo={rack} width="form">
        {content()}
      </Screen>
    </PlanReader>
  );
}
