import type { KeyboardEvent } from 'react';
import { Pressable, StyleSheet, View } from 'react-native';
import Svg, { Path } from 'react-native-svg';

import { describedBy, useFieldIds } from './field-ids';
import { Body, Small } from './text';
import { colors, space, stroke, target } from './tokens';
import { web } from './web';

interface CheckboxProps {
  name: string;
  /** The whole statement that is agreed to or noted. */
  label: string;
  checked: boolean;
  onChange: (checked: boolean) => void;
  hint?: string;
  error?: string;
  disabled?: boolean;
}

/** A statement that holds or does not. The whole row is the target. */
export function Checkbox({ name, label, checked, onChange, hint, error, disabled }: CheckboxProps) {
  const ids = useFieldIds(name);
  const toggle = () => onChange(!checked);
  return (
    <View>
      <Pressable
        id={ids.input}
        role="checkbox"
        aria-checked={checked}
        aria-labelledby={ids.label}
        disabled={disabled}
        onPress={toggle}
        style={({ pressed }) => [styles.row, (pressed || disabled) && styles.pressed]}
        {...web({
          'aria-describedby': describedBy(ids, hint, error),
          'aria-invalid': error ? true : undefined,
          onKeyDown: (event: KeyboardEvent) => {
            if (event.key !== ' ') return;
            event.preventDefault();
            toggle();
          },
        })}
      >
        <View style={[styles.box, checked && styles.boxOn, error ? styles.boxWrong : null]}>
          {checked ? (
            <Svg width={18} height={18} viewBox="0 0 18 18">
              <Path
                d="M3.5 9.5l3.7 3.7 7.3-8"
                fill="none"
                stroke={colors.onChosen}
                strokeWidth={2.4}
              />
            </Svg>
          ) : null}
        </View>
        <View style={styles.words}>
          <Body id={ids.label}>{label}</Body>
        </View>
      </Pressable>
      {error ? (
        <Small id={ids.error} tone="stop">
          {error}
        </Small>
      ) : null}
      {hint ? <Small id={ids.hint}>{hint}</Small> : null}
    </View>
  );
}

const styles = StyleSheet.create({
  row: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space[3],
    minHeight: target.base,
    paddingVertical: space[2],
  },
  pressed: { opacity: 0.65 },
  box: {
    width: 24,
    height: 24,
    borderWidth: stroke.heavy,
    borderColor: colors.outline,
    borderRadius: 4,
    backgroundColor: colors.field,
    alignItems: 'center',
    justifyContent: 'center',
  },
  boxOn: { backgroundColor: colors.chosen, borderColor: colors.chosen },
  boxWrong: { borderColor: colors.stop },
  words: { flexShrink: 1 },
});
