import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

import { useShop } from '@/features/session';
import { Rail } from '@/features/ui/rail';
import { space } from '@/features/ui/tokens';
import { useLayout } from '@/features/ui/use-layout';

import { shopPlaces } from '../places';
import { ShopSwitch } from './shop-switch';

/** Stands around every screen of a shop: on a wide screen the rail, with the way to another shop at its foot. */
export function ShopFrame({ children }: { children: ReactNode }) {
  const { shop, memberships } = useShop();
  const { wide } = useLayout();
  return (
    <View style={styles.frame}>
      {wide ? (
        <Rail
          places={shopPlaces(shop.id)}
          foot={
            memberships.length > 1 ? (
              <View style={styles.foot}>
                <ShopSwitch kind="onEnamel" />
              </View>
            ) : null
          }
        />
      ) : null}
      <View style={styles.screen}>{children}</View>
    </View>
  );
}

const styles = StyleSheet.create({
  frame: { flex: 1, flexDirection: 'row' },
  screen: { flex: 1, minWidth: 0 },
  foot: { paddingHorizontal: space[1] },
});
