import type { ReactNode } from 'react';
import { Pressable, StyleSheet, View } from 'react-native';

import { FieldFrame } from './field-frame';
import { describedBy, useFieldIds } from './field-ids';
import { Label, Small, Strong } from './text';
import { colors, space, stroke, target } from './tokens';
import { useRadioGroup } from './use-radio-group';
import { web } from './web';

/** The ring of a radio, with its disc when chosen. Decoration: the row carries the role. */
export function RadioMark({ chosen, locked = false }: { chosen: boolean; locked?: boolean }) {
  return (
    <View style={[styles.ring, locked && styles.ringLocked]}>
      {chosen ? <View style={[styles.disc, locked && styles.discLocked]} /> : null}
    </View>
  );
}

export interface RadioRowOption<Value extends string> {
  value: Value;
  label: string;
  /** A second line: sizes, where it hangs. */
  detail?: string;
  /** Why it cannot be chosen; such a row can still be read. */
  lockedBecause?: string;
  /** Stands at the right edge. */
  aside?: ReactNode;
}

interface RadioRowsProps<Value extends string> {
  name: string;
  label: string;
  options: readonly RadioRowOption<Value>[];
  value: Value | null;
  onChange: (value: Value) => void;
  hint?: string;
  error?: string;
}

/** Choices as full rows with room for a reason, one of them chosen. */
export function RadioRows<Value extends string>({
  name,
  label,
  options,
  value,
  onChange,
  hint,
  error,
}: RadioRowsProps<Value>) {
  const ids = useFieldIds(name);
  const radioProps = useRadioGroup(
    options.map((option) => ({ value: option.value, locked: Boolean(option.lockedBecause) })),
    value,
    onChange,
  );
  return (
    <FieldFrame ids={ids} label={label} hint={hint} error={error} labelsInput={false}>
      <View
        id={ids.input}
        role="radiogroup"
        aria-labelledby={ids.label}
        style={styles.group}
        {...web({ tabIndex: -1, 'aria-describedby': describedBy(ids, hint, error) })}
      >
        {options.map((option, index) => {
          const chosen = option.value === value;
          return (
            <Pressable
              key={option.value}
              {...radioProps(index)}
              style={({ pressed }) => [
                styles.row,
                index > 0 && styles.ruled,
                (chosen || pressed) && styles.rowChosen,
              ]}
            >
              <View style={[styles.mark, chosen && styles.markOn]} />
              <RadioMark chosen={chosen} locked={Boolean(option.lockedBecause)} />
              <View style={styles.words}>
                {chosen ? <Strong>{option.label}</Strong> : <Label>{option.label}</Label>}
                {option.detail ? <Small>{option.detail}</Small> : null}
                {option.lockedBecause ? <Small tone="stop">{option.lockedBecause}</Small> : null}
              </View>
              {option.aside}
            </Pressable>
          );
        })}
      </View>
    </FieldFrame>
  );
}

const styles = StyleSheet.create({
  ring: {
    width: 22,
    height: 22,
    borderRadius: 11,
    borderWidth: stroke.heavy,
    borderColor: colors.text,
    backgroundColor: colors.field,
    alignItems: 'center',
    justifyContent: 'center',
  },
  ringLocked: { borderColor: colors.stop },
  disc: { width: 12, height: 12, borderRadius: 6, backgroundColor: colors.text },
  discLocked: { backgroundColor: colors.stop },
  group: {
    borderWidth: stroke.hairline,
    borderColor: colors.rule,
    backgroundColor: colors.sheet,
  },
  row: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space[3],
    minHeight: target.base + 8,
    paddingVertical: space[2],
    paddingLeft: space[4],
    paddingRight: space[3],
  },
  ruled: { borderTopWidth: stroke.hairline, borderTopColor: colors.rule },
  rowChosen: { backgroundColor: colors.field },
  mark: { position: 'absolute', left: 0, top: 0, bottom: 0, width: stroke.index },
  markOn: { backgroundColor: colors.mark },
  words: { flexGrow: 1, flexShrink: 1, flexBasis: 0, minWidth: 0 },
});
