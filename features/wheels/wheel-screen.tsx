import { useQuery } from '@tanstack/react-query';
import { useLocalSearchParams } from 'expo-router';

import { PlanReader } from '@/features/plan';
import { useShop } from '@/features/session';
import { Screen } from '@/features/ui/screen';
import { useLayout } from '@/features/ui/use-layout';

import { WheelPage } from './components/wheel-page';
import { wheelPlace } from './place';
import { wheelQueries } from './queries';
import { WheelForm } from './wheel-form';

/** One wheel of the rack: read, and edited where the address asks for it and the person may. */
export function WheelScreen() {
  const { wheelId, edit } = useLocalSearchParams<{ wheelId: string; edit?: string }>();
  const { shop, units, may } = useShop();
  const { wide } = useLayout();
  const { data } = useQuery(wheelQueries.life(shop.id, wheelId));
  const wheel = data?.wheel;
  if (wheel && edit && may('wheel:edit'))
    return <WheelForm key={wheel.id} wheel={wheel} backTo={wheelPlace(shop.id, wheel.id, wide)} />;
  return (
    <PlanReader units={units}>
      <Screen
        title={wheel?.tag ?? 'Wheel'}
        over={shop.name}
        backTo={{ pathname: '/shops/[shopId]/wheels', params: { shopId: shop.id } }}
        width="form"
      >
        <WheelPage wheelId={wheelId} />
      </Screen>
    </PlanReader>
  );
}
