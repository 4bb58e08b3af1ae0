import { Stack } from 'expo-router';

import { ShopGate } from '@/features/session';
import { ShopFrame } from '@/features/shop';

export default function ShopLayout() {
  return (
    <ShopGate>
      <ShopFrame>
        <Stack screenOptions={{ headerShown: false, animation: 'none' }} />
      </ShopFrame>
    </ShopGate>
  );
}
