import { Pressable, StyleSheet, Text } from 'react-native';

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

const styles = StyleSheet.create({
  chip: {
    minHeight: target.base,
    justifyContent: 'center',
    paddingHorizontal: space[4],
    borderRadius: radius.pill,
    borderWidth: stroke.control,
    borderColor: colors.action,
  },
  on: { backgroundColor: colors.chosen, borderColor: colors.chosen },
  pressed: { opacity: 0.7 },
});
