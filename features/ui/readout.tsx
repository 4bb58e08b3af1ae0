import type { ReactNode } from 'react';
import { Pressable, StyleSheet, Text, View } from 'react-native';

import { colors, radius, space, stroke, target, type } from './tokens';

interface ReadoutProps {
  /** What the figure is: "Wheel speed". */
  label: string;
  /** The number as shown; null while something it needs is missing. */
  value: string | null;
  unit?: string;
  /** The unit as spoken: "metres per second". */
  spokenUnit?: string;
  size?: 'small' | 'base' | 'large';
  /** Ground it stands on. */
  on?: 'page' | 'enamel';
  /** Opens the working. */
  onPress?: () => void;
}

const SIZES = { small: type.readoutSmall, base: type.readout, large: type.readoutLarge } as const;

/** A figure: its name, its number, its unit. One press opens how it was found. */
export function Readout({
  label,
  value,
  unit,
  spokenUnit,
  size = 'base',
  on = 'page',
  onPress,
}: ReadoutProps) {
  const number = { color: on === 'enamel' ? colors.onEnamel : colors.text };
  const soft = { color: on === 'enamel' ? colors.onEnamelSoft : colors.textSoft };
  const face = (
    <>
      <Text style={[type.small, soft]}>{label}</Text>
      <Text style={[SIZES[size], number]}>
        {value ?? '–'}
        {value !== null && unit ? (
          <Text style={[size === 'small' ? null : type.readoutSmall, styles.unit]}>
            {`\u00a0${unit}`}
          </Text>
        ) : null}
      </Text>
    </>
  );
  const spoken = `${label}: ${value === null ? 'not known yet' : `${value} ${spokenUnit ?? unit ?? ''}`.trim()}`;
  if (!onPress)
    return (
      <View role="group" aria-label={spoken} style={styles.readout}>
        {face}
      </View>
    );
  return (
    <Pressable
      role="button"
      aria-label={`${spoken}. Show the working`}
      onPress={onPress}
      style={({ pressed }) => [styles.readout, styles.press, pressed && styles.pressed]}
    >
      {face}
    </Pressable>
  );
}

/** A row of figures over a heavy rule, as engraved on a dial plate. */
export function ReadoutRow({ children, ruled }: { children: ReactNode; ruled?: boolean }) {
  return <View style={[styles.row, ruled && styles.ruled]}>{children}</View>;
}

const styles = StyleSheet.create({
  readout: {
    alignItems: 'flex-start',
    justifyContent: 'flex-end',
    flexShrink: 1,
    minHeight: target.base,
  },
  press: { borderRadius: radius.control },
  pressed: { opacity: 0.65 },
  unit: { fontWeight: '600' },
  row: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    alignItems: 'flex-end',
    columnGap: space[8],
    rowGap: space[3],
  },
  ruled: {
    paddingBottom: space[3],
    borderBottomWidth: stroke.heavy,
    borderBottomColor: colors.text,
  },
});
