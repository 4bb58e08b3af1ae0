import { TabList, TabSlot, TabTrigger, Tabs } from 'expo-router/ui';
import type { TabTriggerSlotProps } from 'expo-router/ui';
import type { Href } from 'expo-router';
import { Pressable, StyleSheet, Text, View } from 'react-native';

import { Icon } from './icon';
import type { IconName } from './icon-paths';
import { colors, measure, space, target, type } from './tokens';
import { useLayout } from './use-layout';
import { web } from './web';

export interface FrameTab {
  /** The route's name in its layout. */
  name: string;
  href: Href;
  label: string;
  icon: IconName;
}

interface AppFrameProps {
  tabs: readonly FrameTab[];
  /** Over the rail on a wide screen. */
  brand?: string;
}

/** The places of the app: tabs at the bottom of a phone, a rail at the left of a wide screen. */
export function AppFrame({ tabs, brand = 'Ringtrue' }: AppFrameProps) {
  const { wide } = useLayout();
  return (
    <Tabs style={[styles.frame, wide && styles.frameWide]}>
      <View style={styles.main}>
        <TabSlot style={styles.slot} />
      </View>
      <TabList role="navigation" aria-label="Places" style={wide ? styles.rail : styles.bar}>
        {wide ? (
          <Text key="brand" style={[type.subheading, styles.brand]}>
            {brand}
          </Text>
        ) : null}
        {tabs.map((tab) => (
          <TabTrigger key={tab.name} name={tab.name} href={tab.href} asChild>
            <Place label={tab.label} icon={tab.icon} wide={wide} />
          </TabTrigger>
        ))}
      </TabList>
    </Tabs>
  );
}

type PlaceProps = Partial<TabTriggerSlotProps> & { label: string; icon: IconName; wide: boolean };

function Place({ label, icon, wide, isFocused = false, style: _, ...trigger }: PlaceProps) {
  return (
    <Pressable
      {...trigger}
      role="link"
      {...web({ 'aria-current': isFocused ? 'page' : undefined })}
      style={[wide ? styles.railPlace : styles.barPlace, isFocused && wide && styles.railHere]}
    >
      <View style={[wide ? styles.railMark : styles.barMark, isFocused && styles.here]} />
      <Icon name={icon} color={isFocused ? 'onEnamel' : 'onEnamelSoft'} />
      <Text
        style={[type.small, { color: isFocused ? colors.onEnamel : colors.onEnamelSoft }]}
        numberOfLines={1}
      >
        {label}
      </Text>
    </Pressable>
  );
}

const styles = StyleSheet.create({
  frame: { flex: 1, flexDirection: 'column', backgroundColor: colors.page },
  frameWide: { flexDirection: 'row-reverse' },
  main: { flex: 1, minWidth: 0 },
  // The slot grows with its content unless told otherwise, and the bar would scroll away with the page.
  slot: { flexShrink: 1, flexBasis: 0 },
  bar: {
    flexDirection: 'row',
    justifyContent: 'space-around',
    backgroundColor: colors.nav,
    minHeight: 60,
  },
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
  rail: {
    flexDirection: 'column',
    justifyContent: 'flex-start',
    width: measure.rail,
    backgroundColor: colors.nav,
    paddingTop: space[4],
  },
  brand: { color: colors.onEnamel, textAlign: 'center', paddingVertical: space[3] },
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
