import type { Href } from 'expo-router';
import type { ComponentProps } from 'react';
import { Pressable, StyleSheet, Text, View } from 'react-native';

import { Icon } from './icon';
import type { IconName } from './icon-paths';
import { colors, space, target, type } from './tokens';
import { web } from './web';

/** One of the places of the app, as a tab of the bar or a link of the rail. */
export interface PlaceLink {
  /** The route's name in its layout. */
  name: string;
  href: Href;
  label: string;
  icon: IconName;
}

interface PlaceProps extends Omit<ComponentProps<typeof Pressable>, 'style' | 'children'> {
  label: string;
  icon: IconName;
  /** Where the reader is now. */
  here: boolean;
  /** Stands in the rail of a wide screen, not in the bar of a phone. */
  rail?: boolean;
}

export function Place({ label, icon, here, rail = false, ...pressable }: PlaceProps) {
  return (
    <Pressable
      {...pressable}
      role="link"
      {...web({ 'aria-current': here ? 'page' : undefined })}
      style={StyleSheet.flatten([
        rail ? styles.railPlace : styles.barPlace,
        here && rail && styles.railHere,
      ])}
    >
      <View style={[rail ? styles.railMark : styles.barMark, here && styles.here]} />
      <Icon name={icon} color={here ? 'onEnamel' : 'onEnamelSoft'} />
      <Text
        style={[type.small, { color: here ? colors.onEnamel : colors.onEnamelSoft }]}
        numberOfLines={1}
      >
        {label}
      </Text>
    </Pressable>
  );
}

const styles = StyleSheet.create({
  barPlace: {
    flexGrow: 1,
    flexShrink: 1,
    flexBasis: 0,
    minWidth: 0,
    minHeight: 60,
    alignItems: 'center',
    justifyContent: 'center',
    gap: 2,
    paddingTop: space[1],
  },
  barMark: { position: 'absolute', top: 0, left: '14%', right: '14%', height: 4 },
  railPlace: {
    minHeight: target.machine,
    alignItems: 'center',
    justifyContent: 'center',
    gap: 2,
    paddingVertical: space[2],
  },
  railHere: { backgroundColor: colors.header },
  railMark: { position: 'absolute', left: 0, top: 0, bottom: 0, width: 4 },
  here: { backgroundColor: colors.markOnEnamel },
});
