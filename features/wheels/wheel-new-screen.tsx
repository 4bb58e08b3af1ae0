import { Redirect } from 'expo-router';

import { useShop } from '@/features/session';

import { WheelForm } from './wheel-form';

export function WheelNewScreen() {
  const { shop, may } = useShop();
  const rack = { pathname: '/shops/[shopId]/wheels', params: { shopId: shop.id } } as const;
  if (!may('wheel:edit')) return <Redirect href={rack} />;
  return <WheelForm wheel={null} backTo={rack} />;
}
