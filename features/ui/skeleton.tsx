import { StyleSheet, Text, View } from 'react-native';

import { colors, radius, space } from './tokens';

interface SkeletonProps {
  /** What is being fetched: "Loading the setup". */
  label: string;
  /** Bars to stand for lines. */
  lines?: number;
}

/** Still bars where words will stand. */
export function Skeleton({ label, lines = 4 }: SkeletonProps) {
  return (
    <View role="status" aria-busy style={styles.bars}>
      <Text style={styles.unseen}>{label}</Text>
      {Array.from({ length: lines }, (_, index) => (
        <View key={index} style={[styles.bar, { width: `${90 - ((index * 23) % 45)}%` }]} />
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  bars: { padding: space[4], gap: space[4] },
  bar: { height: 20, borderRadius: radius.control, backgroundColor: colors.well },
  unseen: { position: 'absolute', width: 1, height: 1, overflow: 'hidden', opacity: 0 },
});
