import { TabList, TabSlot, TabTrigger, Tabs } from 'expo-router/ui';
import type { TabTriggerSlotProps } from 'expo-router/ui';
import { StyleSheet, View } from 'react-native';

import type { IconName } from './icon-paths';
import { Place, type PlaceLink } from './place';
import { colors } from './tokens';
import { useLayout } from './use-layout';

/** The places of the app with the bar at the bottom of a phone; a wide screen has the Rail instead. */
export function AppFrame({ tabs }: { tabs: readonly PlaceLink[] }) {
  const { wide } = useLayout();
  return (
    <Tabs style={styles.frame}>
      <View style={styles.main}>
        <TabSlot style={styles.slot} />
      </View>
      <TabList role="navigation" aria-label="Places" style={wide ? styles.none : styles.bar}>
        {tabs.map((tab) => (
          <TabTrigger key={tab.name} name={tab.name} href={tab.href} asChild>
            <Tab label={tab.label} icon={tab.icon} />
          </TabTrigger>
        ))}
      </TabList>
    </Tabs>
  );
}

type TabProps = Partial<TabTriggerSlotProps> & { label: string; icon: IconName };

const Tab = ({ isFocused = false, style: _, ...place }: TabProps) => (
  <Place {...place} here={isFocused} />
);

const styles = StyleSheet.create({
  frame: { flex: 1, flexDirection: 'column', backgroundColor: colors.page },
  main: { flex: 1, minWidth: 0 },
  // The slot grows with its content unless told otherwise, and the bar would scroll away with the page.
  slot: { flexShrink: 1, flexBasis: 0 },
  bar: {
    flexDirection: 'row',
    justifyContent: 'space-around',
    backgroundColor: colors.nav,
    minHeight: 60,
  },
  none: { display: 'none' },
});
