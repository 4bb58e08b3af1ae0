import { View } from 'react-native';

import { useShop } from '@/features/session';
import { RailSwitch } from '@/features/shop';
import { AppFrame, type FrameTab } from '@/features/ui/app-frame';

export default function TabsLayout() {
  const { shop } = useShop();
  const params = { shopId: shop.id };
  const tabs: FrameTab[] = [
    { name: 'bench', href: { pathname: '/shops/[shopId]', params }, label: 'Bench', icon: 'bench' },
    {
      name: 'setups',
      href: { pathname: '/shops/[shopId]/setups', params },
      label: 'Setups',
      icon: 'setups',
    },
    {
      name: 'rack',
      href: { pathname: '/shops/[shopId]/wheels', params },
      label: 'Rack',
      icon: 'rack',
    },
    {
      name: 'board',
      href: { pathname: '/shops/[shopId]/board', params },
      label: 'Board',
      icon: 'board',
    },
    {
      name: 'shop',
      href: { pathname: '/shops/[shopId]/shop', params },
      label: 'Shop',
      icon: 'shop',
    },
  ];
  return (
    <View style={{ flex: 1 }}>
      <AppFrame tabs={tabs} />
      <RailSwitch />
    </View>
  );
}
