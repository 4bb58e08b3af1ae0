import { Pressable, StyleSheet, Text, View } from 'react-native';

import { VerdictIcon } from './icon';
import type { VerdictShape } from './icon';
import { colors, radius, space, stroke, target, type } from './tokens';

/** The words of a verdict: "Needs 3 things", "Clear", "Check 2", "Stop". */
export function verdictWords(verdict: VerdictShape, count: number): string {
  switch (verdict) {
    case 'incomplete':
      return count === 1 ? 'Needs 1 thing' : `Needs ${count} things`;
    case 'clear':
      return 'Clear';
    case 'check':
      return `Check ${count}`;
    case 'stop':
      return 'Stop';
  }
}

interface VerdictBadgeProps {
  verdict: VerdictShape;
  /** How many needs, or findings of the verdict's own level. */
  count: number;
  /** Opens the findings. */
  onPress?: () => void;
  /** What pressing does, spoken after the verdict: "show the findings". */
  pressHint?: string;
  size?: 'base' | 'small';
}

/** The verdict in shape and word, on a white plate that reads on page and enamel alike. */
export function VerdictBadge({
  verdict,
  count,
  onPress,
  pressHint = 'show why',
  size = 'base',
}: VerdictBadgeProps) {
  const words = verdictWords(verdict, count);
  const face = (
    <View style={[styles.plate, size === 'small' && styles.small]}>
      <VerdictIcon verdict={verdict} size={size === 'small' ? 18 : 22} />
      <Text style={[size === 'small' ? type.label : type.strong, styles.words]}>{words}</Text>
    </View>
  );
  if (!onPress) return face;
  return (
    <Pressable
      role="button"
      aria-label={`${words}, ${pressHint}`}
      onPress={onPress}
      style={({ pressed }) => [styles.press, pressed && styles.pressed]}
    >
      {face}
    </Pressable>
  );
}

/** Speaks the verdict when it changes; stands once on a screen, seen by nobody. */
export function VerdictAnnouncer({ verdict, count }: { verdict: VerdictShape; count: number }) {
  return (
    <View role="status" aria-live="polite" style={styles.unseen}>
      <Text>{`Verdict: ${verdictWords(verdict, count)}`}</Text>
    </View>
  );
}

const styles = StyleSheet.create({
  plate: {
    flexDirection: 'row',
    alignItems: 'center',
    alignSelf: 'flex-start',
    gap: space[2],
    minHeight: 32,
    paddingLeft: space[2],
    paddingRight: space[3],
    paddingVertical: space[1],
    borderRadius: radius.pill,
    borderWidth: stroke.hairline,
    borderColor: colors.rule,
    backgroundColor: colors.field,
  },
  small: { minHeight: 28 },
  words: { color: colors.text },
  press: { minHeight: target.base, justifyContent: 'center', alignSelf: 'flex-start' },
  pressed: { opacity: 0.7 },
  unseen: { position: 'absolute', width: 1, height: 1, overflow: 'hidden', opacity: 0 },
});
