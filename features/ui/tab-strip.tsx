import { useId } from 'react';
import type { KeyboardEvent } from 'react';
import { Pressable, StyleSheet, Text, View } from 'react-native';

import { colors, space, stroke, target, type } from './tokens';
import { focusById, web } from './web';

export interface StripTab<Value extends string> {
  value: Value;
  label: string;
  /** Stands under the label: the part's own answer. */
  detail?: string;
}

interface TabStripProps<Value extends string> {
  /** Names the group: "Parts of the setup". */
  label: string;
  tabs: readonly StripTab<Value>[];
  value: Value;
  onChange: (value: Value) => void;
}

const STEPS: Record<string, number> = { ArrowRight: 1, ArrowLeft: -1 };

/** Parts of one thing, side by side on the enamel of the header; the brass mark stands under the open one. */
export function TabStrip<Value extends string>({
  label,
  tabs,
  value,
  onChange,
}: TabStripProps<Value>) {
  const strip = useId();
  const move = (from: number, event: KeyboardEvent) => {
    const step = STEPS[event.key];
    const next = step === undefined ? undefined : (from + step + tabs.length) % tabs.length;
    const tab = next === undefined ? undefined : tabs[next];
    if (!tab) return;
    event.preventDefault();
    onChange(tab.value);
    focusById(`${strip}-${next}`);
  };
  return (
    <View role="tablist" aria-label={label} style={styles.strip}>
      {tabs.map((tab, index) => {
        const here = tab.value === value;
        return (
          <Pressable
            key={tab.value}
            id={`${strip}-${index}`}
            role="tab"
            aria-selected={here}
            aria-label={tab.detail ? `${tab.label}: ${tab.detail}` : tab.label}
            onPress={() => onChange(tab.value)}
            style={[styles.tab, here && styles.here]}
            {...web({
              tabIndex: here ? 0 : -1,
              onKeyDown: (event: KeyboardEvent) => move(index, event),
            })}
          >
            <Text style={[type.subheading, styles.label]} numberOfLines={1}>
              {tab.label}
            </Text>
            {tab.detail === undefined ? null : (
              <Text style={[type.small, styles.detail]} numberOfLines={1}>
                {tab.detail}
              </Text>
            )}
          </Pressable>
        );
      })}
    </View>
  );
}

const styles = StyleSheet.create({
  strip: { flexDirection: 'row' },
  tab: {
    flexGrow: 1,
    flexShrink: 1,
    flexBasis: 0,
    minWidth: 0,
    minHeight: target.base,
    alignItems: 'center',
    justifyContent: 'center',
    paddingHorizontal: space[1],
    paddingVertical: space[1],
    borderBottomWidth: stroke.index,
    borderBottomColor: 'transparent',
  },
  here: { backgroundColor: colors.headerWell, borderBottomColor: colors.markOnEnamel },
  label: { color: colors.onEnamel },
  detail: { color: colors.onEnamelSoft },
});
