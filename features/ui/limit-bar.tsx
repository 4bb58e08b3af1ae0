import { StyleSheet, Text, View } from 'react-native';

import { colors, space, type } from './tokens';

interface LimitBarProps {
  value: number;
  limit: number;
  /** Words under the bar's start and under the limit: "0 rpm", "limit 15 038". */
  startLabel: string;
  limitLabel: string;
}

/** A value drawn towards its one limit. The figures stand in words beside it. */
export function LimitBar({ value, limit, startLabel, limitLabel }: LimitBarProps) {
  const full = Math.max(value, limit) * 1.06;
  const over = value > limit;
  const share = (part: number) => `${(Math.max(part, 0) / full) * 100}%` as const;
  return (
    <View aria-hidden style={styles.frame}>
      <View style={styles.track}>
        <View
          style={[
            styles.bar,
            { width: share(value), backgroundColor: over ? colors.stop : colors.bar },
          ]}
        />
        <View style={[styles.limit, { left: share(limit) }]} />
      </View>
      <View style={styles.words}>
        <Text style={[type.small, styles.soft]}>{startLabel}</Text>
        <Text style={[type.small, styles.strong]}>{limitLabel}</Text>
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  frame: { gap: space[2], paddingTop: space[2] },
  track: { height: 14, backgroundColor: colors.well },
  bar: { height: 14 },
  limit: {
    position: 'absolute',
    top: -8,
    width: 2,
    height: 30,
    marginLeft: -1,
    backgroundColor: colors.text,
  },
  words: { flexDirection: 'row', justifyContent: 'space-between', gap: space[2] },
  soft: { color: colors.textSoft },
  strong: { color: colors.text },
});
