import { useShop } from '@/features/session';
import { shopPlaces } from '@/features/shop';
import { AppFrame } from '@/features/ui/app-frame';

export default function TabsLayout() {
  const { shop } = useShop();
  return <AppFrame tabs={shopPlaces(shop.id)} />;
}
