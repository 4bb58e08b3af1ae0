import { Stack } from 'expo-router';

import { ShopGate } from '@/features/session';

export default function ShopLayout() {
  return (
    <ShopGate>
      <Stack screenOptions={{ headerShown: false, animation: 'none' }} />
    </ShopGate>
  );
}
