import { StyleSheet, View } from 'react-native';

import { useShop } from '@/features/session';
import { measure, space } from '@/features/ui/tokens';
import { useLayout } from '@/features/ui/use-layout';

import { ShopSwitch } from './shop-switch';

/** The way to another shop, at the foot of the rail. */
export function RailSwitch() {
  const { memberships } = useShop();
  const { wide } = useLayout();
  if (!wide || memberships.length < 2) return null;
  return (
    <View role="navigation" aria-label="Shops" style={styles.foot}>
      <ShopSwitch kind="onEnamel" />
    </View>
  );
}

const styles = StyleSheet.create({
  foot: {
    position: 'absolute',
    left: 0,
    bottom: space[4],
    width: measure.rail,
    paddingHorizontal: space[1],
  },
});
