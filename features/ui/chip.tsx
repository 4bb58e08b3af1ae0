import { Pressable, StyleSheet, Text, View } from 'react-native';

import { Icon } from './icon';
import { colors, radius, space, stroke, target, type } from './tokens';
import { web } from './web';

interface ChipProps {
  /** What is shown when it is on: "Due". */
  label: string;
  on: boolean;
  onToggle: () => void;
}

/** A filter that is on or off. */
export function Chip({ label, on, onToggle }: ChipProps) {
  return (
    <Pressable
      role="button"
      onPress={onToggle}
      style={({ pressed }) => [styles.chip, on && styles.on, pressed && styles.pressed]}
      {...web({ 'aria-pressed': on })}
    >
      <Text style={[type.label, { color: on ? colors.onChosen : colors.action }]}>{label}</Text>
    </Pressable>
  );
}

interface FilterChipProps {
  /** What it asks for: "aluminium oxide". */
  label: string;
  /** Opens it to be changed. */
  onPress: () => void;
  onRemove: () => void;
}

/** A filter that is on: pressed it can be changed, and its cross takes it away. */
export function FilterChip({ label, onPress, onRemove }: FilterChipProps) {
  return (
    <View role="group" aria-label={label} style={[styles.pair, styles.on]}>
      <Pressable
        role="button"
        onPress={onPress}
        style={({ pressed }) => [styles.half, styles.words, pressed && styles.pressed]}
      >
        <Text style={[type.label, { color: colors.onChosen }]}>{label}</Text>
      </Pressable>
      <Pressable
        role="button"
        aria-label={`Remove the filter ${label}`}
        onPress={onRemove}
        style={({ pressed }) => [styles.half, styles.cross, pressed && styles.pressed]}
      >
        <Icon name="close" size={18} color="onChosen" />
      </Pressable>
    </View>
  );
}

const styles = StyleSheet.create({
  chip: {
    minHeight: target.base,
    justifyContent: 'center',
    paddingHorizontal: space[4],
    borderRadius: radius.pill,
    borderWidth: stroke.control,
    borderColor: colors.action,
  },
  pair: {
    flexDirection: 'row',
    maxWidth: '100%',
    borderRadius: radius.pill,
    borderWidth: stroke.control,
  },
  half: { minHeight: target.base, justifyContent: 'center', borderRadius: radius.pill },
  words: { paddingLeft: space[4], flexShrink: 1 },
  cross: { minWidth: target.base, alignItems: 'center' },
  on: { backgroundColor: colors.chosen, borderColor: colors.chosen },
  pressed: { opacity: 0.7 },
});
